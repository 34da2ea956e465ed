/**
 * Candidates that compute the inner product of two arrays. What its error is, and which arrays are
 * hard, is decided elsewhere.
 */
package steelyard.algorithms.dot;
