package steelyard.harness.data;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** The decimal text of numbers, the same on every JDK and in every locale. */
public final class DoubleText {

  /** Significant digits that tell every binary64 number from every other. */
  private static final int DISTINGUISHING_DIGITS = 17;

  private static final int LARGEST_PLAIN_EXPONENT = 3;

  private DoubleText() {}

  /**
   * Returns the value rounded to as few significant digits as read back as the same double, such as
   * {@code 1}, {@code 0.5} or {@code 1.25e-14}; {@code -0.0}, {@code NaN}, {@code Infinity} or
   * {@code -Infinity} where it is one of those.
   */
  public static String shortest(double value) {
    if (isSpecial(value)) {
      return special(value);
    }
    BigDecimal exact = new BigDecimal(value);
    int digits = 1;
    while (rounded(exact, digits).doubleValue() != value) {
      digits++;
    }
    BigDecimal decimal = rounded(exact, digits).stripTrailingZeros();
    int exponent = exponent(decimal);
    return exponent >= -LARGEST_PLAIN_EXPONENT && exponent <= LARGEST_PLAIN_EXPONENT
        ? decimal.toPlainString()
        : scientific(decimal, decimal.precision());
  }

  /**
   * Returns the value with 17 significant digits, such as {@code 1.0000000000000001e-1}, which read
   * back as the same double.
   */
  public static String full(double value) {
    return isSpecial(value)
        ? special(value)
        : scientific(new BigDecimal(value), DISTINGUISHING_DIGITS);
  }

  /** Returns a number rounded to so many significant digits, all of them printed; zero is 0. */
  public static String scientific(BigDecimal value, int digits) {
    if (value.signum() == 0) {
      return "0";
    }
    BigDecimal rounded = rounded(value, digits);
    StringBuilder text = new StringBuilder(rounded.unscaledValue().abs().toString());
    int exponent = text.length() - 1 - rounded.scale();
    while (text.length() < digits) {
      text.append('0');
    }
    text.setLength(digits);
    if (digits > 1) {
      text.insert(1, '.');
    }
    return (value.signum() < 0 ? "-" : "") + text + "e" + exponent;
  }

  private static boolean isSpecial(double value) {
    return value == 0 || !Double.isFinite(value);
  }

  private static String special(double value) {
    if (Double.isNaN(value)) {
      return "NaN";
    }
    String sign = Double.doubleToRawLongBits(value) < 0 ? "-" : "";
    return value == 0 ? (sign.isEmpty() ? "0" : "-0.0") : sign + "Infinity";
  }

  private static BigDecimal rounded(BigDecimal value, int digits) {
    return value.round(new MathContext(digits, RoundingMode.HALF_EVEN));
  }

  private static int exponent(BigDecimal value) {
    return value.precision() - 1 - value.scale();
  }
}
