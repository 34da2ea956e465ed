/**
 * Candidates that solve a square system of linear equations. What a solution's error is, and which
 * systems are hard, is decided elsewhere.
 */
package steelyard.algorithms.solve;
