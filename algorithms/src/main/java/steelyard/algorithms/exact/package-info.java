/**
 * Arithmetic without rounding errors that candidates of several tasks are made of: error-free
 * transformations and the long accumulator. Nothing here is a candidate by itself, and nothing
 * rounds before the end.
 */
package steelyard.algorithms.exact;
