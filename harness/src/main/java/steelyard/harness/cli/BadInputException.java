package steelyard.harness.cli;

/** Says in one sentence what is wrong with what the user gave, where, and what would be right. */
final class BadInputException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  BadInputException(String sentence) {
    super(sentence);
  }
}
