package steelyard.problems.solve.certificate;

/**
 * What bounds computed in plain double arithmetic allow for its roundings, u = 2^-53.
 *
 * @param gamma how many u each of n operations may cost; 1, and a little for gamma_n = n u / (1 - n
 *     u)
 * @param inflation the same for the evaluation of the bounds themselves
 * @param underflow the absolute error of a product that underflows
 */
record Allowances(double gamma, double inflation, double underflow) {

  /**
   * Those for which the arguments of this package hold.
   *
   * <p>Any sum of n nonnegative products of computed factors, in any order, carries a factor (1 +
   * d)^k with |d| &lt;= u and |k| up to 2n + 8. By Higham's Lemma 3.1, (1 - u)^-2k &lt;= 1 + 2ku/(1
   * - 2ku), and 4 (n + 4) u / (1 - 4 (n + 4) u) &lt; 8 (n + 4) u for n below 2^40; twice that is
   * allowed. The product of two doubles that underflows is wrong by at most 2^-1075; 2^-1022 is
   * allowed.
   */
  static final Allowances PROVEN = new Allowances(1.0000001, 16, Double.MIN_NORMAL);

  private static final double UNIT_ROUNDOFF = 0x1p-53;

  /** Returns an upper bound on gamma_n = n u / (1 - n u), the relative error of n operations. */
  double gamma(int n) {
    return gamma * n * UNIT_ROUNDOFF;
  }

  /**
   * Returns a factor that makes a computed sum of n nonnegative products an upper bound on the
   * exact one, apart from underflow.
   */
  double inflation(int n) {
    return 1 + inflation * (n + 4) * UNIT_ROUNDOFF;
  }

  /** Returns the factor that makes such a sum a lower bound in the same way. */
  double deflation(int n) {
    return 1 - inflation * (n + 4) * UNIT_ROUNDOFF;
  }
}
