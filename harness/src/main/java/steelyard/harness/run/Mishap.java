package steelyard.harness.run;

import steelyard.results.Status;

/**
 * Thrown by a kernel that runs elsewhere, to say what became of the call there.
 *
 * <p>It has no stack trace: where it was thrown from is of no account.
 */
public final class Mishap extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final Status status;

  /**
   * Makes one.
   *
   * @param status what became of the call; not {@link Status#OK}
   * @param detail why, in a few words
   */
  public Mishap(Status status, String detail) {
    super(detail, null, false, false);
    this.status = status;
  }

  /** Returns what became of the call. */
  public Status status() {
    return status;
  }
}
