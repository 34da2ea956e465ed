package steelyard.algorithms.sum;

/**
 * Klein's second-order Kahan-Babuska summation: the corrections of the sum are themselves summed
 * with corrections. The least of the three is added first.
 *
 * @see <a href="https://doi.org/10.1007/s00607-005-0139-x">Klein, A generalized Kahan-Babuska
 *     summation algorithm, Computing 76 (2006) 279-293</a>
 */
final class KleinSum implements Summation {

  @Override
  public double sum(double[] terms) {
    double sum = 0;
    double first = 0;
    double second = 0;
    for (double term : terms) {
      double next = sum + term;
      double error = branchingError(sum, term, next);
      sum = next;
      double nextFirst = first + error;
      second += branchingError(first, error, nextFirst);
      first = nextFirst;
    }
    return RecursiveSum.unlessFinite(sum + (first + second), terms);
  }

  private static double branchingError(double a, double b, double sum) {
    return Math.abs(a) >= Math.abs(b) ? (a - sum) + b : (b - sum) + a;
  }
}
