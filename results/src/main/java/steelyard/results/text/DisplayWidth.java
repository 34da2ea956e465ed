package steelyard.results.text;

/**
 * How many columns of a terminal a text takes, as far as that can be known without the terminal.
 */
final class DisplayWidth {
  private DisplayWidth() {}

  /** Returns the columns of a text without control characters. */
  static int of(String text) {
    return text.codePoints().map(DisplayWidth::of).sum();
  }

  /** Returns the columns of a character: none for a mark upon another, two for a wide one. */
  static int of(int codePoint) {
    int type = Character.getType(codePoint);
    if (type == Character.NON_SPACING_MARK
        || type == Character.ENCLOSING_MARK
        || type == Character.FORMAT) {
      return 0;
    }
    return isWide(codePoint) ? 2 : 1;
  }

  private static boolean isWide(int c) {
    return (c >= 0x1100 && c <= 0x115F)
        || (c >= 0x2E80 && c <= 0xA4CF)
        || (c >= 0xAC00 && c <= 0xD7A3)
        || (c >= 0xF900 && c <= 0xFAFF)
        || (c >= 0xFF00 && c <= 0xFF60)
        || (c >= 0xFFE0 && c <= 0xFFE6)
        || (c >= 0x1F300 && c <= 0x1FAFF)
        || (c >= 0x20000 && c <= 0x3FFFD);
  }
}
