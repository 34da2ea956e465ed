/**
 * Problems of the task {@code sum}: terms, their exact sum, and families of terms. What several
 * tasks share (exact arithmetic, judging a scalar, choosing what cancels) lives elsewhere.
 */
package steelyard.problems.sum;
