package steelyard.results.verdict;

/**
 * How much rounding a verdict allows for a problem of size n: modest multiples of what an analysis
 * of the errors would give, so that a verdict tells kinds of algorithms apart and not constants.
 */
public final class Allowances {
  /** The factor of n in {@link #c}. */
  public static final double C_FACTOR = 10;

  /** The factor of the square root of n in {@link #d}. */
  public static final double D_FACTOR = 10;

  private Allowances() {}

  /** Returns C(n) = 10 n, allowed for the errors of a stable algorithm, in units of u. */
  public static double c(int size) {
    return C_FACTOR * size;
  }

  /** Returns D(n) = 10 √n, allowed for the growth of one level of precision, in units of u. */
  public static double d(int size) {
    return D_FACTOR * Math.sqrt(size);
  }

  /** Returns which share of a limit an error is: at most 1 exactly where the error is within it. */
  static double share(double error, double limit) {
    if (error <= limit) {
      return Double.isInfinite(limit) ? 0 : Math.min(1, error / limit);
    }
    return Math.max(Math.nextUp(1.0), error / limit);
  }

  /** Returns the unit roundoff u = 2⁻ᵖ of a precision of p bits: 2⁻⁵³ for binary64. */
  public static double unitRoundoff(int precisionBits) {
    return Math.scalb(1.0, -precisionBits);
  }
}
