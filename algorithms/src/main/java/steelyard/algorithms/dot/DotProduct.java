package steelyard.algorithms.dot;

/**
 * Computes the inner product of two vectors.
 *
 * <p>All candidates agree where IEEE arithmetic decides the answer: a factor NaN, 0 times an
 * infinity, or infinite products of both signs give NaN, infinite products of one sign give that
 * infinity. A method whose own arithmetic would turn an infinity into NaN gives the recursive
 * product then. The sign of a zero is not fixed.
 */
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
