package steelyard.harness.run;

import java.time.Duration;
import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;

/**
 * One problem to be made, and the candidates to be tried on it.
 *
 * @param <K> the task's interface
 * @param <D> the kind of input
 * @param task the task
 * @param family the family that makes the problem
 * @param id the problem's id, which fixes its data
 * @param candidates the candidates, in the order of their rows
 * @param timeout the longest that one call may take
 */
public record Assignment<K, D extends Data>(
    Task<K, D> task,
    Family<D> family,
    ProblemId id,
    List<Candidate<K>> candidates,
    Duration timeout) {

  /** Makes the problem; see {@link Family#generate} for what is thrown. */
  public Problem<D> problem() {
    return family.generate(id.request(), id.randomness());
  }
}
