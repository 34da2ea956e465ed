package steelyard.problems.solve;

import java.math.BigDecimal;
import java.math.MathContext;

/** Writes a double in sentences: a few digits, the same on every JDK and in every locale. */
final class Scientific {
  private static final MathContext DIGITS = new MathContext(4);

  private Scientific() {}

  static String of(double value) {
    if (!Double.isFinite(value)) {
      return Double.isNaN(value) ? "NaN" : value > 0 ? "infinity" : "-infinity";
    }
    return new BigDecimal(value).round(DIGITS).stripTrailingZeros().toString();
  }
}
