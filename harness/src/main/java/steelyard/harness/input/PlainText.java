package steelyard.harness.input;

/** Plain text: numbers separated by white space, any number to a line, and comments after '#'. */
final class PlainText {

  private static final char COMMENT = '#';

  private PlainText() {}

  /**
   * Reads a vector.
   *
   * @throws InputException if something in it is no finite number, or there is none at all
   */
  static Column read(Lines lines) {
    NumberList numbers = new NumberList();
    for (String line = lines.next(); line != null; line = lines.next()) {
      for (Tokens tokens = new Tokens(line, COMMENT); tokens.next(); ) {
        String token = tokens.text();
        Place place = lines.place(tokens.column());
        if (token.endsWith(",") || token.endsWith(";")) {
          throw place.fail(
              NumberText.quoted(token)
                  + " ends in a separator; plain text has white space alone between numbers, and a"
                  + " file with other separators must be named .csv");
        }
        numbers.add(token, place);
      }
    }
    if (numbers.size() == 0) {
      throw new InputException(lines.file() + " holds no number; it must hold at least one");
    }
    return numbers.column();
  }
}
