package steelyard.harness.input;

/** The words of a Matrix Market file, line by line, without comments and blank lines. */
final class MarketWords {

  private static final char COMMENT = '%';

  private final Lines lines;
  private Tokens tokens = new Tokens("", COMMENT);
  private boolean ended;

  MarketWords(Lines lines) {
    this.lines = lines;
  }

  /** Returns the next word, which must stand on the same line as the one before. */
  String word(String what) {
    if (!tokens.next()) {
      throw here().fail(what + " is missing here");
    }
    return tokens.text();
  }

  /** Returns the next word, on the same line or on a later one. */
  String wordOnAnyLine(String what) {
    while (!tokens.next()) {
      nextLine(what);
    }
    return tokens.text();
  }

  /** Returns the first word of the next line that has any. */
  String wordOnNewLine(String what) {
    endOfLine();
    return wordOnAnyLine(what);
  }

  /** Refuses what is left of the line. */
  void endOfLine() {
    if (tokens.next()) {
      throw here().fail(NumberText.quoted(tokens.text()) + " is one word too many on this line");
    }
  }

  /** Refuses what is left of the file. */
  void endOfFile() {
    do {
      if (tokens.next()) {
        throw here().fail("the matrix is complete, but there is more; the file must end here");
      }
    } while (advance());
  }

  /** Returns a word as a whole number. */
  int whole(String word, String what, int min, int max) {
    boolean isShort = word.matches("\\+?[0-9]{1,10}");
    long value = isShort ? Long.parseLong(word) : -1;
    if (value < min || value > max) {
      throw here()
          .fail(
              what
                  + " must be a whole number from "
                  + min
                  + " to "
                  + max
                  + ", found "
                  + NumberText.quoted(word));
    }
    return (int) value;
  }

  /** Returns where the last word stands. */
  Place here() {
    return lines.place(tokens.column());
  }

  private void nextLine(String what) {
    if (!advance()) {
      throw here().fail("the file ends here, where " + what + " must follow");
    }
  }

  private boolean advance() {
    String line = ended ? null : lines.next();
    ended = line == null;
    if (!ended) {
      tokens = new Tokens(line, COMMENT);
    }
    return !ended;
  }
}
