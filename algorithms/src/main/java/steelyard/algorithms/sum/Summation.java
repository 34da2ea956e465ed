package steelyard.algorithms.sum;

/** Adds the terms of an array. */
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
