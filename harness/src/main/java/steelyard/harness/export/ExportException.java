package steelyard.harness.export;

/** Says in one sentence why a problem was not written. */
public final class ExportException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence. */
  public ExportException(String sentence) {
    super(sentence);
  }

  /** Makes one from its sentence and what led to it. */
  public ExportException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
