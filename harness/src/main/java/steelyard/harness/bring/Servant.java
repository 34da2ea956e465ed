package steelyard.harness.bring;

import java.util.List;
import steelyard.harness.run.Mishap;
import steelyard.problems.Data;

/**
 * Another process in which one candidate runs. One thread at a time uses it; when that thread is
 * interrupted while it waits, the process is destroyed.
 */
interface Servant extends AutoCloseable {

  /**
   * Waits until it is ready; the first caller alone does.
   *
   * @throws Mishap if it cannot be
   */
  void awaitReady();

  /**
   * Lets the candidate answer.
   *
   * @throws Mishap if there is no answer; {@link #isUsable} then says whether another can follow
   */
  double[] answer(List<Data.Part> parts);

  /** Says whether it can go on. */
  boolean isUsable();

  /** Tells a process that waits for a problem that there will be none; does not wait. */
  default void askToLeave() {}

  /** Ends the process and whatever it started; one that was asked to leave has a moment for it. */
  @Override
  void close();
}
