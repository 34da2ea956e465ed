package steelyard.harness.timing;

/**
 * Says in one sentence that another timing run holds the machine, so that no figure would be true.
 */
public final class MachineBusyException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence and cause. */
  public MachineBusyException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
