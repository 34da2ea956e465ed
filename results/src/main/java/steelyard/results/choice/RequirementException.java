package steelyard.results.choice;

/**
 * A requirement cannot be decided on a run. The message is one sentence that says what would do.
 */
public final class RequirementException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes an exception. */
  public RequirementException(String sentence) {
    super(sentence);
  }
}
