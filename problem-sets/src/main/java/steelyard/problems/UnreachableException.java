package steelyard.problems;

/** Says in one sentence why a request lies outside what a family can make. */
public final class UnreachableException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence. */
  public UnreachableException(String sentence) {
    super(sentence);
  }
}
