/**
 * A problem's input bit for bit: its digest, its copy, its form in a file and the text of a double.
 * Nothing here knows a task, a candidate or an error.
 */
package steelyard.harness.data;
