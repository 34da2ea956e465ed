package steelyard.harness.timing;

import java.nio.file.Path;
import steelyard.harness.plan.TimingEffort;

/** Measures the running time of one candidate on one stored input. */
@FunctionalInterface
public interface Stopwatch {

  /**
   * Measures.
   *
   * @param task the task's id
   * @param candidate the candidate's id
   * @param data the file with the input
   * @param effort how much to measure
   * @throws TimingException if there is no figure, in a sentence
   */
  Score measure(String task, String candidate, Path data, TimingEffort effort)
      throws TimingException;
}
