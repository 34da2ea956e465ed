package steelyard.algorithms.sum;

/**
 * Adds the terms of an array.
 *
 * <p>All candidates agree where IEEE arithmetic decides the answer: terms with a NaN or with both
 * infinities sum to NaN, terms with one of the infinities sum to that infinity. A method whose own
 * arithmetic would turn an infinity into NaN gives the recursive sum then. The sign of a zero sum
 * is not fixed.
 */
@FunctionalInterface
public interface Summation {
  /**
   * Returns the sum of the terms.
   *
   * @param terms the terms, n of them, not modified; none sum to 0
   * @return the sum, as well as this candidate can compute it
   */
  double sum(double[] terms);
}
