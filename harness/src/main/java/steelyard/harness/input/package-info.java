/**
 * Readers of a user's own files: text in, arrays of finite doubles out, with a count of the values
 * that a double does not hold exactly. No reader knows a task; what a task takes is matched with
 * files in one place, and nothing here runs a candidate or writes a file.
 */
package steelyard.harness.input;
