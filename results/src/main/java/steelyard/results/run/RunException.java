package steelyard.results.run;

/**
 * A run cannot be written or read. The message is one sentence: what, where, what would be right.
 */
public final class RunException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes an exception. */
  public RunException(String sentence) {
    super(sentence);
  }

  /** Makes an exception with what caused it. */
  public RunException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
