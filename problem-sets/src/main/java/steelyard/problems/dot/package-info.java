/**
 * Problems of the task {@code dot}: pairs of vectors, their exact dot product, and families of
 * pairs. What several tasks share (exact arithmetic, judging a scalar, choosing what cancels) lives
 * elsewhere.
 */
package steelyard.problems.dot;
