package steelyard.algorithms.dot;

import steelyard.algorithms.exact.ErrorFree;

/**
 * Dot2: the recursive inner product with the exact errors of each product and each addition
 * accumulated apart; as accurate as if computed in twice the working precision and then rounded.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump, Oishi, Accurate sum and dot
 *     product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, Algorithm 5.3 and Proposition 5.5</a>
 */
final class Dot2 implements DotProduct {

  @Override
  public double dot(double[] x, double[] y) {
    double sum = 0;
    double correction = 0;
    for (int i = 0; i < x.length; i++) {
      double product = x[i] * y[i];
      double next = sum + product;
      correction += ErrorFree.ofSum(sum, product, next) + ErrorFree.ofProduct(x[i], y[i], product);
      sum = next;
    }
    return RecursiveDot.unlessFinite(sum + correction, x, y);
  }
}
