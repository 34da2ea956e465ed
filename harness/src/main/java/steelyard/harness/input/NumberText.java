package steelyard.harness.input;

import java.util.Locale;
import java.util.regex.Pattern;
import steelyard.results.table.GuardedText;

/**
 * Reads one number from its text: decimal with a point, or a hexadecimal floating-point constant as
 * C99 has it ({@code 0x1.8p3}). What is no finite number is refused with what would be right.
 */
final class NumberText {

  private static final Pattern DECIMAL =
      Pattern.compile("[+-]?(?:[0-9]++(?:\\.[0-9]*+)?|\\.[0-9]++)(?:[eE][+-]?[0-9]++)?");
  private static final Pattern HEXADECIMAL =
      Pattern.compile(
          "[+-]?0[xX](?:[0-9a-fA-F]++(?:\\.[0-9a-fA-F]*+)?|\\.[0-9a-fA-F]++)(?:[pP][+-]?[0-9]++)?");
  private static final Pattern NOT_FINITE =
      Pattern.compile("[+-]?(?:nan(?:\\(\\w*\\))?|inf|infinity|\u221E)");
  private static final Pattern DECIMAL_COMMA =
      Pattern.compile("[+-]?[0-9]*,[0-9]+(?:e[+-]?[0-9]+)?");
  private static final Pattern FORTRAN_EXPONENT =
      Pattern.compile("[+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)d[+-]?[0-9]+");

  private static final int MAX_QUOTED = 40;

  /** The exact decimal expansion of a double never has as many characters. */
  private static final int MAX_LENGTH = 4096;

  private NumberText() {}

  /** Says whether a text is meant as a number, even one that would be refused. */
  static boolean looksNumeric(String text) {
    String lower = text.toLowerCase(Locale.ROOT);
    return isNumber(text)
        || NOT_FINITE.matcher(lower).matches()
        || DECIMAL_COMMA.matcher(lower).matches()
        || FORTRAN_EXPONENT.matcher(lower).matches();
  }

  /**
   * Returns the double nearest to the number.
   *
   * @throws InputException if the text is none, or too large for a double
   */
  static double parse(String text, Place place) {
    if (text.length() > MAX_LENGTH) {
      throw place.fail(
          quoted(text)
              + " has "
              + text.length()
              + " characters, of at most "
              + MAX_LENGTH
              + " that a number may have");
    }
    if (!isNumber(text)) {
      throw place.fail(refusal(text));
    }
    double value = Double.parseDouble(isHexadecimal(text) ? withExponent(text) : text);
    if (Double.isInfinite(value)) {
      throw place.fail(
          quoted(text) + " is beyond the largest double, which is about 1.797e308 in magnitude");
    }
    return value;
  }

  static boolean isHexadecimal(String text) {
    return HEXADECIMAL.matcher(text).matches();
  }

  /** Returns a text as a sentence quotes it. */
  static String quoted(String text) {
    return "'"
        + GuardedText.visible(
            text.length() <= MAX_QUOTED ? text : text.substring(0, MAX_QUOTED) + "...")
        + "'";
  }

  private static boolean isNumber(String text) {
    return DECIMAL.matcher(text).matches() || isHexadecimal(text);
  }

  /** C99 lets the exponent be left out; Java does not. */
  private static String withExponent(String text) {
    return text.indexOf('p') < 0 && text.indexOf('P') < 0 ? text + "p0" : text;
  }

  private static String refusal(String text) {
    String lower = text.toLowerCase(Locale.ROOT);
    if (text.isEmpty()) {
      return "there is nothing where a number must stand";
    }
    if (NOT_FINITE.matcher(lower).matches()) {
      return quoted(text) + " is not finite; every number of a problem must be";
    }
    if (DECIMAL_COMMA.matcher(lower).matches()) {
      return quoted(text)
          + " has a decimal comma; write a decimal point: '"
          + text.replace(',', '.')
          + "'";
    }
    if (FORTRAN_EXPONENT.matcher(lower).matches()) {
      return quoted(text)
          + " has the exponent letter d; write e: '"
          + lower.replace('d', 'e')
          + "'";
    }
    return quoted(text) + " is no number; write it such as 12.5, -3e-7 or 0x1.8p3";
  }
}
