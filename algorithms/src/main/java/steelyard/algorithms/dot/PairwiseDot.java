package steelyard.algorithms.dot;

/**
 * Pairwise inner product: that of the left half plus that of the right half, down to blocks of at
 * most {@value #BLOCK} products that are summed recursively.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 3.1 and (4.6)</a>
 */
final class PairwiseDot implements DotProduct {

  private static final int BLOCK = 32;

  @Override
  public double dot(double[] x, double[] y) {
    return dot(x, y, 0, x.length);
  }

  private static double dot(double[] x, double[] y, int from, int to) {
    int n = to - from;
    if (n > BLOCK) {
      int middle = from + n / 2;
      return dot(x, y, from, middle) + dot(x, y, middle, to);
    }
    double sum = 0;
    for (int i = from; i < to; i++) {
      sum += x[i] * y[i];
    }
    return sum;
  }

  /** Returns the largest number of roundings that any of n products goes through. */
  static int roundings(int n) {
    return n <= BLOCK ? n : 1 + roundings(n - n / 2);
  }
}
