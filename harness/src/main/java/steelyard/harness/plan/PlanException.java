package steelyard.harness.plan;

/** Says in one sentence what is wrong with a plan, where, and what would be right. */
public final class PlanException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Makes one from its sentence. */
  public PlanException(String sentence) {
    super(sentence);
  }

  /** Makes one from its sentence and what led to it. */
  public PlanException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}
