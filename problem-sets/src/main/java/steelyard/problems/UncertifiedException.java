package steelyard.problems;

/** Says in one sentence why no reference could be certified for a problem. */
public final class UncertifiedException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence. */
  public UncertifiedException(String sentence) {
    super(sentence);
  }
}
