package steelyard.algorithms.solve;

/** Solves a square system of linear equations. */
@FunctionalInterface
public interface LinearSolver {
  /**
   * Returns the solution x of a x = b.
   *
   * @param a n rows of n entries, not modified
   * @param b n entries, not modified
   * @return n entries
   * @throws ArithmeticException if the candidate finds the matrix singular, or not of the kind that
   *     it is for
   */
  double[] solve(double[][] a, double[] b);
}
