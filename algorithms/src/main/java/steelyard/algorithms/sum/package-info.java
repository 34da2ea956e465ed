/**
 * Candidates that add the terms of an array. What a sum's error is, and which arrays are hard, is
 * decided elsewhere.
 */
package steelyard.algorithms.sum;
