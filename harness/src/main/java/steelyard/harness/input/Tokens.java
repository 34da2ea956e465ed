package steelyard.harness.input;

/** The words of a line that white space separates, with their places. */
final class Tokens {

  private final String line;
  private final int end;
  private int start;
  private int next;

  /**
   * Splits a line.
   *
   * @param comment the character from which on the line does not count
   */
  Tokens(String line, char comment) {
    this.line = line;
    int at = line.indexOf(comment);
    end = at < 0 ? line.length() : at;
  }

  /** Goes to the next word, if there is one. */
  boolean next() {
    start = next;
    while (start < end && Character.isWhitespace(line.charAt(start))) {
      start++;
    }
    next = start;
    while (next < end && !Character.isWhitespace(line.charAt(next))) {
      next++;
    }
    return start < next;
  }

  String text() {
    return line.substring(start, next);
  }

  /** Returns where the word stands, counted from 1; after the last word, where the line ends. */
  int column() {
    return start + 1;
  }
}
