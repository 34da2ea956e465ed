package steelyard.algorithms.sum;

/**
 * Blocked summation: recursive sums of blocks of {@value #BLOCK} terms, themselves summed
 * recursively.
 *
 * @see <a href="https://doi.org/10.1137/19M1257780">Blanchard, Higham, Mary, A class of fast and
 *     accurate summation algorithms, SIAM J. Sci. Comput. 42 (2020) A1541-A1557</a>
 */
final class BlockedSum implements Summation {

  private static final int BLOCK = 128;

  @Override
  public double sum(double[] terms) {
    double sum = 0;
    int from = 0;
    while (from < terms.length) {
      int to = from + Math.min(BLOCK, terms.length - from);
      double block = 0;
      for (int i = from; i < to; i++) {
        block += terms[i];
      }
      sum += block;
      from = to;
    }
    return sum;
  }

  /** Returns the largest number of additions that any of n terms goes through. */
  static int height(int n) {
    if (n <= BLOCK) {
      return Math.max(n - 1, 0);
    }
    int blocks = (n - 1) / BLOCK + 1;
    return BLOCK - 1 + blocks - 1;
  }
}
