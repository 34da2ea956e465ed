package steelyard.algorithms.dot;

import steelyard.algorithms.exact.ErrorFree;
import steelyard.algorithms.sum.SumK;

/**
 * DotK: the errors of all products and additions and the recursive inner product itself, 2n terms
 * with the exact sum, go through (K-1)-fold summation; as accurate as if computed in K-fold working
 * precision and then rounded.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump, Oishi, Accurate sum and dot
 *     product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, Algorithm 5.10 and Proposition 5.11</a>
 */
final class DotK implements DotProduct {

  private final SumK summation;

  /**
   * Makes a K-fold inner product.
   *
   * @param fold K, at least 3
   */
  DotK(int fold) {
    this.summation = new SumK(fold - 1);
  }

  @Override
  public double dot(double[] x, double[] y) {
    int n = x.length;
    double[] parts = new double[2 * n + 1];
    double sum = 0;
    for (int i = 0; i < n; i++) {
      double product = x[i] * y[i];
      double next = sum + product;
      parts[i] = ErrorFree.ofProduct(x[i], y[i], product);
      parts[n + i] = ErrorFree.ofSum(sum, product, next);
      sum = next;
    }
    parts[2 * n] = sum;
    return RecursiveDot.unlessFinite(summation.sumInPlace(parts), x, y);
  }
}
