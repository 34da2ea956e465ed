package steelyard.algorithms.sum;

/**
 * Kahan's compensated summation: the rounding error of each addition is put into the next term.
 *
 * <p>Its published bound, |error| at most (2u + O(n u^2)) times the sum of magnitudes, has no
 * explicit second-order constant.
 *
 * @see <a href="https://doi.org/10.1145/363707.363723">Kahan, Further remarks on reducing
 *     truncation errors, Comm. ACM 8 (1965) 40</a>
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, Algorithm 4.2</a>
 */
final class KahanSum implements Summation {

  @Override
  public double sum(double[] terms) {
    double sum = 0;
    double correction = 0;
    for (double term : terms) {
      double corrected = term + correction;
      double next = sum + corrected;
      correction = (sum - next) + corrected;
      sum = next;
    }
    return RecursiveSum.unlessFinite(sum, terms);
  }
}
