package steelyard.harness.input;

/** Says in one sentence what is wrong with a file of data, where, and what would be right. */
public final class InputException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence. */
  public InputException(String sentence) {
    super(sentence);
  }

  /** Makes one from its sentence and what led to it. */
  public InputException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
