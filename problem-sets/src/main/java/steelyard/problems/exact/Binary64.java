package steelyard.problems.exact;

/**
 * The constants of the format of a {@code double} that {@link Double} does not name.
 *
 * @see <a href="https://doi.org/10.1109/IEEESTD.2019.8766229">IEEE Standard for Floating-Point
 *     Arithmetic, IEEE 754-2019, Table 3.5</a>
 */
public final class Binary64 {
  /** The number of significant bits, 53. */
  public static final int PRECISION = 53;

  /** The unit roundoff u = 2^-53, the largest relative error of one rounding to nearest. */
  public static final double UNIT_ROUNDOFF = 0x1p-53;

  /** The exponent of the smallest positive double, 2^-1074. */
  public static final int LEAST_EXPONENT = -1074;

  /** The exponent of the least power of two beyond the finite doubles, 2^1024. */
  public static final int OVERFLOW_EXPONENT = 1024;

  private Binary64() {}
}
