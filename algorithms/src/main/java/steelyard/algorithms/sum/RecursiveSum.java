package steelyard.algorithms.sum;

/**
 * Recursive summation: one term after the other, in the given order.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 4.1</a>
 */
final class RecursiveSum implements Summation {

  @Override
  public double sum(double[] terms) {
    return of(terms);
  }

  static double of(double[] terms) {
    double sum = 0;
    for (double term : terms) {
      sum += term;
    }
    return sum;
  }

  /**
   * Returns a computed sum if it is finite, and otherwise the recursive sum. Corrections are NaN as
   * soon as a term or a partial sum is infinite; recursive summation then still tells an infinity
   * from a NaN, at no cost to finite sums.
   */
  static double unlessFinite(double computed, double[] terms) {
    return Double.isFinite(computed) ? computed : of(terms);
  }
}
