package steelyard.problems.solve.certificate;

/** Bounds on sums of nonnegative terms, computed in plain double arithmetic. */
final class RowSums {

  /** Covers every underflow in a sum of nonnegative products, per term: far above 2^-1074. */
  static final double UNDERFLOW = Double.MIN_NORMAL;

  private RowSums() {}

  /**
   * Returns a factor that exceeds (1 + 2^-53)^k (1 - 2^-53)^-k for a k up to 2n + 8: any sum of n
   * nonnegative products of computed factors, in any order, times it is an upper bound on the exact
   * one, apart from underflow. By Higham's Lemma 3.1, (1 - u)^-2k &lt;= 1 + 2ku/(1 - 2ku), and 4 (n
   * + 4) u / (1 - 4 (n + 4) u) &lt; 8 (n + 4) u for n below 2^40; the bound is twice that.
   */
  static double inflation(int n) {
    return 1 + 16.0 * (n + 4) * 0x1p-53;
  }

  /** Returns the factor that makes such a sum a lower bound in the same way. */
  static double deflation(int n) {
    return 1 - 16.0 * (n + 4) * 0x1p-53;
  }

  /** Returns gamma_n = n u / (1 - n u) or a little more, u = 2^-53. */
  static double gamma(int n) {
    return 1.0000001 * n * 0x1p-53;
  }
}
