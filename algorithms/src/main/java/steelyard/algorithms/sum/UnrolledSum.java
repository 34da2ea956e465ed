package steelyard.algorithms.sum;

/**
 * Eight interleaved recursive sums, added pairwise at the end. Eight independent additions in
 * flight hide the latency of one.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 4.1 (any order of additions)</a>
 */
final class UnrolledSum implements Summation {

  private static final int LANES = 8;

  @Override
  public double sum(double[] terms) {
    double s0 = 0;
    double s1 = 0;
    double s2 = 0;
    double s3 = 0;
    double s4 = 0;
    double s5 = 0;
    double s6 = 0;
    double s7 = 0;
    int full = terms.length - terms.length % LANES;
    for (int i = 0; i < full; i += LANES) {
      s0 += terms[i];
      s1 += terms[i + 1];
      s2 += terms[i + 2];
      s3 += terms[i + 3];
      s4 += terms[i + 4];
      s5 += terms[i + 5];
      s6 += terms[i + 6];
      s7 += terms[i + 7];
    }
    double rest = 0;
    for (int i = full; i < terms.length; i++) {
      rest += terms[i];
    }
    return (((s0 + s1) + (s2 + s3)) + ((s4 + s5) + (s6 + s7))) + rest;
  }

  /** Returns the largest number of additions that any of n terms goes through. */
  static int height(int n) {
    int rest = n % LANES;
    if (n < LANES) {
      return Math.max(n - 1, 0);
    }
    int lane = n / LANES - 1 + 3;
    return rest == 0 ? lane : 1 + Math.max(lane, rest - 1);
  }
}
