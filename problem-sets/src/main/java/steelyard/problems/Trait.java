package steelyard.problems;

/**
 * The traits of inputs that several tasks share. Each is verified of the stored data, never assumed
 * from the family, and each is sufficient for what its name says, not necessary.
 */
public final class Trait {
  /**
   * No intermediate result of a usual algorithm, in any order, can overflow: every input is below
   * 2^980 in magnitude, and so is the sum of the absolute values of the terms (or products). This
   * leaves room for splitting a factor (times 2^27 + 1) and for extraction constants.
   */
  public static final String NO_INTERMEDIATE_OVERFLOW = "no-intermediate-overflow";

  /**
   * Nothing is lost below the least double: every nonzero term is a normal double, and for products
   * each of nonzero factors is at least 2^-968 in magnitude, so that its rounding error is a
   * double.
   */
  public static final String NO_UNDERFLOW = "no-underflow";

  /** No two terms (or products) have opposite signs, so that nothing cancels. */
  public static final String SAME_SIGN = "same-sign";

  /** The exponent of the limit of {@link #NO_INTERMEDIATE_OVERFLOW}. */
  public static final int OVERFLOW_HEADROOM_EXPONENT = 980;

  private Trait() {}
}
