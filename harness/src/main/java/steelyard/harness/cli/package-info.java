/**
 * The command line: one class for each command, which reads options, calls the rest of the house
 * and prints. No measuring and no deciding here.
 */
package steelyard.harness.cli;
