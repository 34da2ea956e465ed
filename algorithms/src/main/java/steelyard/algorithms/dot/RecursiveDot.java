package steelyard.algorithms.dot;

/**
 * The textbook inner product: one rounded product after the other is added, in the given order.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 3.1</a>
 */
final class RecursiveDot implements DotProduct {

  @Override
  public double dot(double[] x, double[] y) {
    return of(x, y);
  }

  static double of(double[] x, double[] y) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += x[i] * y[i];
    }
    return sum;
  }

  /**
   * Returns a computed inner product if it is finite, and otherwise the recursive one. Corrections
   * are NaN as soon as a product or a partial sum is infinite; the recursive product then still
   * tells an infinity from a NaN, at no cost to finite results.
   */
  static double unlessFinite(double computed, double[] x, double[] y) {
    return Double.isFinite(computed) ? computed : of(x, y);
  }
}
