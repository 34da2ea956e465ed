package steelyard.problems;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * The text of a condition number with at most six significant digits, such as {@code 1e12} or
 * {@code 2.5e3}. It is made from the decimal value alone, because {@link Double#toString} differs
 * between versions of Java.
 */
final class ConditionText {
  private static final MathContext SIX_DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);

  private ConditionText() {}

  /** Returns the nearest value that has a text of its own. */
  static double canonical(double condition) {
    return decimal(condition).doubleValue();
  }

  /** Returns the text; what is no finite positive number is named as Java names it. */
  static String of(double condition) {
    if (!(condition > 0 && condition <= Double.MAX_VALUE)) {
      return String.valueOf(condition);
    }
    BigDecimal decimal = decimal(condition);
    String digits = decimal.unscaledValue().toString();
    int exponent = decimal.precision() - decimal.scale() - 1;
    String significand =
        digits.length() == 1 ? digits : digits.charAt(0) + "." + digits.substring(1);
    return exponent == 0 ? significand : significand + "e" + exponent;
  }

  private static BigDecimal decimal(double condition) {
    return new BigDecimal(condition).round(SIX_DIGITS).stripTrailingZeros();
  }
}
