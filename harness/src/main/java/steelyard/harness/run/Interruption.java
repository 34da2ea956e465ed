package steelyard.harness.run;

/** Asks a run to stop after what it is doing now, so that what is complete can be written. */
public final class Interruption {

  private volatile boolean requested;

  /** Asks the run to stop. */
  public void request() {
    requested = true;
  }

  /** Says whether the run was asked to stop. */
  public boolean requested() {
    return requested;
  }
}
