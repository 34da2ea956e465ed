package steelyard.harness.timing;

/** Says in one sentence why there is no figure. */
public final class TimingException extends Exception {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence and cause. */
  public TimingException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
