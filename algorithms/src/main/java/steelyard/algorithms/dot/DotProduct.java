package steelyard.algorithms.dot;

/** Computes the inner product of two vectors. */
@FunctionalInterface
public interface DotProduct {
  /**
   * Returns the inner product.
   *
   * @param x n entries, not modified
   * @param y n entries, not modified
   * @return the sum of x[i] y[i]; 0 for empty vectors
   */
  double dot(double[] x, double[] y);
}
