package steelyard.harness.input;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Locale;

/** Tells whether the text of a number and the double that was read from it are the same number. */
final class Exactness {

  private static final int DIGITS_OF_LONG = 18;
  private static final int POWERS_OF_FIVE = 27;
  private static final int SIGNIFICAND_BITS = 53;
  private static final long[] FIVE = new long[POWERS_OF_FIVE + 1];

  static {
    FIVE[0] = 1;
    for (int i = 1; i < FIVE.length; i++) {
      FIVE[i] = 5 * FIVE[i - 1];
    }
  }

  private Exactness() {}

  /**
   * Compares.
   *
   * @param text the text, which {@link NumberText#parse} accepts
   * @param value the double that it returned
   */
  static boolean isExact(String text, double value) {
    if (value == 0) {
      return isZero(text);
    }
    return NumberText.isHexadecimal(text)
        ? isExactHexadecimal(text, value)
        : isExactDecimal(new BigDecimal(text), value);
  }

  private static boolean isZero(String text) {
    int start = NumberText.isHexadecimal(text) ? text.toLowerCase(Locale.ROOT).indexOf('x') + 1 : 0;
    for (int i = start; i < text.length(); i++) {
      char c = Character.toLowerCase(text.charAt(i));
      if (c == 'p' || (start == 0 && c == 'e')) {
        return true;
      }
      if (Character.digit(c, 16) > 0) {
        return false;
      }
    }
    return true;
  }

  /**
   * A decimal m / 10ˢ is a multiple of a power of two only if 5ˢ divides m. For short decimals this
   * is a division of longs, where the decimal expansion of a double may have hundreds of digits.
   */
  private static boolean isExactDecimal(BigDecimal decimal, double value) {
    int scale = decimal.scale();
    if (decimal.precision() > DIGITS_OF_LONG || scale < 0 || scale > POWERS_OF_FIVE) {
      return decimal.compareTo(new BigDecimal(value)) == 0;
    }
    long unscaled = decimal.unscaledValue().longValue();
    if (unscaled % FIVE[scale] != 0) {
      return false;
    }
    long odd = Math.abs(unscaled / FIVE[scale]);
    return odd >>> Long.numberOfTrailingZeros(odd) < 1L << SIGNIFICAND_BITS;
  }

  private static boolean isExactHexadecimal(String text, double value) {
    String lower = text.toLowerCase(Locale.ROOT);
    int exponentAt = lower.indexOf('p');
    String digits =
        lower.substring(lower.indexOf('x') + 1, exponentAt < 0 ? lower.length() : exponentAt);
    int point = digits.indexOf('.');
    long exponent =
        exponentAt < 0 ? 0 : new BigInteger(lower.substring(exponentAt + 1)).longValueExact();
    exponent -= point < 0 ? 0 : 4L * (digits.length() - point - 1);
    BigInteger significand = new BigInteger(digits.replace(".", ""), 16);
    int zeros = significand.getLowestSetBit();
    int valueExponent =
        Math.max(Math.getExponent(value), Double.MIN_EXPONENT) - (SIGNIFICAND_BITS - 1);
    long valueSignificand = (long) Math.scalb(Math.abs(value), -valueExponent);
    int valueZeros = Long.numberOfTrailingZeros(valueSignificand);
    return exponent + zeros == valueExponent + valueZeros
        && significand
            .shiftRight(zeros)
            .equals(BigInteger.valueOf(valueSignificand >>> valueZeros));
  }
}
