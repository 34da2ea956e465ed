package steelyard.algorithms.dot;

/**
 * Eight interleaved recursive inner products, added pairwise at the end. Eight independent
 * additions in flight hide the latency of one.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 3.1 (any order of additions)</a>
 */
final class UnrolledDot implements DotProduct {

  private static final int LANES = 8;

  @Override
  public double dot(double[] x, double[] y) {
    double s0 = 0;
    double s1 = 0;
    double s2 = 0;
    double s3 = 0;
    double s4 = 0;
    double s5 = 0;
    double s6 = 0;
    double s7 = 0;
    int full = x.length - x.length % LANES;
    for (int i = 0; i < full; i += LANES) {
      s0 += x[i] * y[i];
      s1 += x[i + 1] * y[i + 1];
      s2 += x[i + 2] * y[i + 2];
      s3 += x[i + 3] * y[i + 3];
      s4 += x[i + 4] * y[i + 4];
      s5 += x[i + 5] * y[i + 5];
      s6 += x[i + 6] * y[i + 6];
      s7 += x[i + 7] * y[i + 7];
    }
    double rest = 0;
    for (int i = full; i < x.length; i++) {
      rest += x[i] * y[i];
    }
    return (((s0 + s1) + (s2 + s3)) + ((s4 + s5) + (s6 + s7))) + rest;
  }

  /** Returns the largest number of roundings that any of n products goes through. */
  static int roundings(int n) {
    int rest = n % LANES;
    if (n < LANES) {
      return n;
    }
    int lane = n / LANES + 3;
    return rest == 0 ? lane : 1 + Math.max(lane, rest);
  }
}
