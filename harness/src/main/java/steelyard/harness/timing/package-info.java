/**
 * The timing phase: one JMH benchmark that times any candidate on any stored input, and the reading
 * of its result objects. Nothing is judged here.
 */
package steelyard.harness.timing;
