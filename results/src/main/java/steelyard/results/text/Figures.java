package steelyard.results.text;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.OptionalDouble;
import steelyard.results.table.Scientific;

/** Numbers for a reader: few digits, the same text on every JDK and in every locale. */
public final class Figures {
  /** What stands where there is no figure. */
  public static final String NONE = "-";

  private static final int DIGITS = 2;

  private Figures() {}

  /** Returns an error or a condition number with two significant digits. */
  public static String error(OptionalDouble value) {
    return value.isPresent() ? error(value.getAsDouble()) : NONE;
  }

  /** Returns an error or a condition number with two significant digits. */
  public static String error(double value) {
    return Scientific.text(value, DIGITS);
  }

  /** Returns a ratio as {@link #plain(double)} does. */
  public static String plain(OptionalDouble value) {
    return value.isPresent() ? plain(value.getAsDouble()) : NONE;
  }

  /**
   * Returns a number in plain notation with three significant digits, or with all digits before the
   * point where they are more; outside 0.001 to a million in scientific notation.
   */
  public static String plain(double value) {
    double size = Math.abs(value);
    if (!(size >= 1e-3 && size < 1e6)) {
      return Scientific.text(value, DIGITS);
    }
    BigDecimal exact = new BigDecimal(value);
    int exponent = exact.precision() - exact.scale() - 1;
    return exact.setScale(Math.max(0, DIGITS - exponent), RoundingMode.HALF_EVEN).toPlainString();
  }

  /** Returns a number with its interval, such as {@code 1.30 [1.28, 1.33]}. */
  public static String interval(OptionalDouble value, OptionalDouble low, OptionalDouble high) {
    if (value.isEmpty()) {
      return NONE;
    }
    String text = plain(value.getAsDouble());
    return low.isEmpty() || high.isEmpty()
        ? text
        : text + " [" + plain(low.getAsDouble()) + ", " + plain(high.getAsDouble()) + "]";
  }
}
