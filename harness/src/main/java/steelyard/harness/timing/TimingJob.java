package steelyard.harness.timing;

import java.util.List;
import java.util.Optional;
import steelyard.algorithms.Candidate;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.ProblemId;

/**
 * The candidates to be timed on one problem.
 *
 * @param <K> the task's interface
 * @param <D> the kind of input
 * @param task the task
 * @param id the problem's id
 * @param input the problem's input
 * @param candidates the candidates; the textbook one among them is what ratios compare to
 */
public record TimingJob<K, D extends Data>(
    Task<K, D> task, ProblemId id, D input, List<Entry> candidates) {

  /**
   * A candidate to be timed.
   *
   * @param candidate its id
   * @param obstacle why it cannot be timed here, if so
   */
  public record Entry(String candidate, Optional<String> obstacle) {}

  /** Returns the id of the textbook candidate. */
  public String textbook() {
    Candidate<K> first = task.candidates().get(0);
    return first.id();
  }
}
