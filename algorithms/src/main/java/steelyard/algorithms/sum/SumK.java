package steelyard.algorithms.sum;

import steelyard.algorithms.exact.ErrorFree;

/**
 * SumK: the terms are replaced K - 1 times by partial sums' rounding errors and their last partial
 * sum, which keeps the sum exactly, and then summed recursively; as accurate as if computed in
 * K-fold working precision and then rounded.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump, Oishi, Accurate sum and dot
 *     product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, Algorithms 4.3 and 4.8, Proposition
 *     4.10</a>
 */
public final class SumK implements Summation {

  private final int fold;

  /**
   * Makes a K-fold summation.
   *
   * @param fold K, at least 2
   * @throws IllegalArgumentException if K is less than 2
   */
  public SumK(int fold) {
    if (fold < 2) {
      throw new IllegalArgumentException("SumK needs K of at least 2, not " + fold);
    }
    this.fold = fold;
  }

  @Override
  public double sum(double[] terms) {
    return RecursiveSum.unlessFinite(sumInPlace(terms.clone()), terms);
  }

  /**
   * Returns the sum, using the terms' own array as working space. A sum that is not finite comes
   * out as NaN or infinite, whatever it should be.
   *
   * @param terms the terms, overwritten with others of the same sum
   */
  public double sumInPlace(double[] terms) {
    for (int k = 1; k < fold; k++) {
      for (int i = 1; i < terms.length; i++) {
        double partial = terms[i - 1] + terms[i];
        terms[i - 1] = ErrorFree.ofSum(terms[i - 1], terms[i], partial);
        terms[i] = partial;
      }
    }
    return RecursiveSum.of(terms);
  }
}
