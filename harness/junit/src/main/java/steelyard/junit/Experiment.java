package steelyard.junit;

import java.util.ArrayList;
import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.harness.run.AccuracyPhase;
import steelyard.harness.run.Assignment;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.results.Observation;
import steelyard.results.Status;

/**
 * Candidates tried on the problems of a scenario.
 *
 * @param task the task
 * @param candidates the candidates; the first is the one under test
 * @param scenario which problems
 */
record Experiment<K, D extends Data>(
    Task<K, D> task, List<Candidate<K>> candidates, Scenario<D> scenario) {

  /** The achieved condition number may miss its target by this factor. */
  private static final double CALIBRATION_FACTOR = 2;

  /**
   * Tries the problems one after the other. Once a call did not return in time no more are tried,
   * since each could take as long.
   */
  Outcome run() {
    List<Observation> counted = new ArrayList<>();
    int aboveCondition = 0;
    boolean stopped = false;
    for (ProblemList.Entry<D> entry : new ProblemList<>(task, scenario).entries()) {
      List<Observation> rows = tried(entry);
      if (rows.get(0).condition().orElse(0) > CALIBRATION_FACTOR * scenario.conditionUpTo()) {
        aboveCondition++;
        continue;
      }
      counted.addAll(rows);
      if (rows.stream().anyMatch(row -> row.status() == Status.TIMEOUT)) {
        stopped = true;
        break;
      }
    }
    return new Outcome(List.copyOf(counted), candidates.get(0).id(), aboveCondition, stopped);
  }

  private List<Observation> tried(ProblemList.Entry<D> entry) {
    return new AccuracyPhase(1, Progress.SILENT, new Interruption())
        .run(
            List.of(
                new Assignment<>(task, entry.family(), entry.id(), candidates, scenario.timeout())))
        .observations();
  }
}
