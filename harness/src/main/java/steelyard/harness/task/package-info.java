/**
 * The bindings: one small class for each task, which applies the task's interface to the task's
 * input. No measuring, no files.
 */
package steelyard.harness.task;
