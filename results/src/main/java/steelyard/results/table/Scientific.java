package steelyard.results.table;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.OptionalDouble;

/**
 * Numbers in scientific notation with a fixed number of significant digits, such as {@code
 * 1.23457e-16}. The text depends on the number alone: on no locale and on no version of the JDK.
 * The rounding is exact, half to even, of the double's exact value.
 */
public final class Scientific {
  /** The significant digits of a number in a table. */
  public static final int DIGITS = 6;

  private Scientific() {}

  /** Returns a number as the tables have it. */
  public static String text(double value) {
    return text(value, DIGITS);
  }

  /** Returns a number as the tables have it, or an empty text. */
  public static String textOrEmpty(OptionalDouble value) {
    return value.isPresent() ? text(value.getAsDouble()) : "";
  }

  /**
   * Returns a number with some significant digits: {@code 0} for either zero, {@code INF}, {@code
   * -INF} and {@code NaN} for what is not finite.
   *
   * @throws IllegalArgumentException for less than one digit
   */
  public static String text(double value, int digits) {
    if (digits < 1) {
      throw new IllegalArgumentException("A number needs at least one digit, not " + digits + ".");
    }
    if (Double.isNaN(value)) {
      return "NaN";
    }
    if (Double.isInfinite(value)) {
      return value > 0 ? "INF" : "-INF";
    }
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded =
        new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN));
    int exponent = rounded.precision() - rounded.scale() - 1;
    String figures = rounded.unscaledValue().abs().toString();
    figures = figures + "0".repeat(Math.max(0, digits - figures.length()));
    return (value < 0 ? "-" : "")
        + figures.charAt(0)
        + (digits > 1 ? "." + figures.substring(1, digits) : "")
        + exponentText(exponent);
  }

  private static String exponentText(int exponent) {
    int size = Math.abs(exponent);
    return (exponent < 0 ? "e-" : "e+") + (size < 10 ? "0" : "") + size;
  }

  /** Returns the double nearest to a text that {@link CellType#NUMBER} accepts. */
  static double parse(String text) {
    return switch (text) {
      case "INF" -> Double.POSITIVE_INFINITY;
      case "-INF" -> Double.NEGATIVE_INFINITY;
      default -> Double.parseDouble(text);
    };
  }
}
