package steelyard.algorithms.sum;

/**
 * Pairwise summation: the sum of the left half plus the sum of the right half, down to blocks of at
 * most {@value #BLOCK} terms that are summed recursively. The blocks make the recursion as cheap as
 * a plain loop and cost at most {@code BLOCK - 1 - log2 BLOCK} more additions per term.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, (4.6)</a>
 * @see "Linz, Accurate floating-point summation, Comm. ACM 13 (1970) 361-362"
 */
final class PairwiseSum implements Summation {

  private static final int BLOCK = 32;

  @Override
  public double sum(double[] terms) {
    return sum(terms, 0, terms.length);
  }

  private static double sum(double[] terms, int from, int to) {
    int n = to - from;
    if (n > BLOCK) {
      int middle = from + n / 2;
      return sum(terms, from, middle) + sum(terms, middle, to);
    }
    double sum = 0;
    for (int i = from; i < to; i++) {
      sum += terms[i];
    }
    return sum;
  }

  /** Returns the largest number of additions that any of n terms goes through. */
  static int height(int n) {
    if (n <= BLOCK) {
      return Math.max(n - 1, 0);
    }
    return 1 + height(n - n / 2);
  }
}
