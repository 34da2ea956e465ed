package steelyard.harness.input;

/**
 * A place in a file, for messages.
 *
 * @param file the file's name
 * @param line the line, counted from 1
 * @param column the character of the line, counted from 1
 */
record Place(String file, int line, int column) {

  InputException fail(String sentence) {
    return new InputException(this + ": " + sentence);
  }

  @Override
  public String toString() {
    return file + ":" + line + ":" + column;
  }
}
