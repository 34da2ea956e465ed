/**
 * Executes a plan: spreads it out over the tasks, runs the accuracy phase and then the timing
 * phase, and returns rows. It reads no options and writes no files.
 */
package steelyard.harness.execution;
