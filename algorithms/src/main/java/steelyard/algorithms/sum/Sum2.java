package steelyard.algorithms.sum;

import steelyard.algorithms.exact.ErrorFree;

/**
 * Sum2: recursive summation with the exact error of each addition accumulated apart, without a
 * branch; as accurate as if computed in twice the working precision and then rounded.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump, Oishi, Accurate sum and dot
 *     product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, Algorithm 4.4 and Proposition 4.5</a>
 */
final class Sum2 implements Summation {

  @Override
  public double sum(double[] terms) {
    double sum = 0;
    double correction = 0;
    for (double term : terms) {
      double next = sum + term;
      correction += ErrorFree.ofSum(sum, term, next);
      sum = next;
    }
    return RecursiveSum.unlessFinite(sum + correction, terms);
  }
}
