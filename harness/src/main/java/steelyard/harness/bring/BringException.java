package steelyard.harness.bring;

/** What is to be a candidate cannot be one; the message is one sentence that says why. */
public final class BringException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one. */
  public BringException(String message) {
    super(message);
  }

  /** Makes one with its cause. */
  public BringException(String message, Throwable cause) {
    super(message, cause);
  }
}
