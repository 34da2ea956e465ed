package steelyard.results.table;

/**
 * Text in a form that neither a spreadsheet nor a terminal acts upon, and that can be undone.
 *
 * <p>Control characters, line separators, characters that reverse the direction of writing, and
 * halves of surrogate pairs become a backslash and a letter or four hexadecimal digits, so that one
 * row is one line; a backslash is doubled. A text that starts like a spreadsheet formula ({@code =
 * + - @}, also in full width), or with an apostrophe, then gets an apostrophe in front.
 */
public final class GuardedText {
  private static final String FORMULA_STARTS = "=+-@'\uFF1D\uFF0B\uFF0D\uFF20";
  private static final int EXCERPT = 60;

  private GuardedText() {}

  /** Returns the harmless form. */
  static String guard(String text) {
    String escaped = visible(text);
    return !escaped.isEmpty() && FORMULA_STARTS.indexOf(escaped.charAt(0)) >= 0
        ? "'" + escaped
        : escaped;
  }

  /** Returns the beginning of a text, fit for a sentence. */
  static String excerpt(String text) {
    return visible(text.length() <= EXCERPT ? text : text.substring(0, EXCERPT) + "...");
  }

  /** Returns a text that a terminal shows and does not act upon. */
  public static String visible(String text) {
    StringBuilder out = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (Character.isHighSurrogate(c)
          && i + 1 < text.length()
          && Character.isLowSurrogate(text.charAt(i + 1))) {
        out.append(c).append(text.charAt(++i));
      } else {
        appendEscaped(out, c);
      }
    }
    return out.toString();
  }

  private static void appendEscaped(StringBuilder out, char c) {
    switch (c) {
      case '\\' -> out.append("\\\\");
      case '\n' -> out.append("\\n");
      case '\r' -> out.append("\\r");
      case '\t' -> out.append("\\t");
      default -> {
        if (isUnsafe(c)) {
          out.append("\\u");
          for (int shift = 12; shift >= 0; shift -= 4) {
            out.append(Character.forDigit(c >> shift & 0xF, 16));
          }
        } else {
          out.append(c);
        }
      }
    }
  }

  private static boolean isUnsafe(char c) {
    return Character.isISOControl(c)
        || Character.isSurrogate(c)
        || c == '\uFEFF'
        || (c >= '\u2028' && c <= '\u202E')
        || (c >= '\u2066' && c <= '\u2069');
  }

  /**
   * Returns the text of which this is the harmless form.
   *
   * @throws IllegalArgumentException if a backslash starts nothing that {@link #guard} writes
   */
  static String unguard(String guarded) {
    String escaped = guarded.startsWith("'") ? guarded.substring(1) : guarded;
    if (escaped.indexOf('\\') < 0) {
      return escaped;
    }
    StringBuilder out = new StringBuilder(escaped.length());
    int i = 0;
    while (i < escaped.length()) {
      char c = escaped.charAt(i++);
      if (c != '\\') {
        out.append(c);
        continue;
      }
      char kind = i < escaped.length() ? escaped.charAt(i++) : ' ';
      out.append(unescape(kind, escaped, i));
      i += kind == 'u' ? 4 : 0;
    }
    return out.toString();
  }

  private static char unescape(char kind, String text, int next) {
    return switch (kind) {
      case '\\' -> '\\';
      case 'n' -> '\n';
      case 'r' -> '\r';
      case 't' -> '\t';
      case 'u' -> {
        String digits = text.substring(next, Math.min(text.length(), next + 4));
        if (!digits.matches("[0-9a-f]{4}")) {
          throw new IllegalArgumentException("\\u is not followed by four digits");
        }
        yield (char) Integer.parseInt(digits, 16);
      }
      default -> throw new IllegalArgumentException("a backslash is not doubled");
    };
  }
}
