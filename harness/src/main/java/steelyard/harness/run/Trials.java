package steelyard.harness.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import steelyard.algorithms.Candidate;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.UncertifiedException;
import steelyard.results.Observation;

/**
 * All candidates on one problem, one after the other. It can be continued by another thread where
 * an abandoned one left off; only one thread owns it at a time.
 */
final class Trials<K, D extends Data> {

  private final Assignment<K, D> assignment;
  private final List<Observation> rows = new ArrayList<>();
  private Optional<ProblemRows<K, D>> problemRows = Optional.empty();
  private boolean refused;

  Trials(Assignment<K, D> assignment) {
    this.assignment = assignment;
  }

  Assignment<K, D> assignment() {
    return assignment;
  }

  List<Observation> rows() {
    return rows;
  }

  /**
   * Tries the remaining candidates.
   *
   * @return false if the work was taken away, so that the calling thread must leave
   */
  boolean proceed(Guard guard) {
    if (problemRows.isEmpty() && !refused) {
      prepare();
    }
    while (!refused && rows.size() < assignment.candidates().size()) {
      Candidate<K> candidate = assignment.candidates().get(rows.size());
      ProblemRows<K, D> table = problemRows.orElseThrow();
      Attempt attempt;
      if (table.covers(candidate)) {
        guard.begin(assignment.timeout());
        attempt = Attempt.of(assignment.task(), candidate, table.problem().data());
        if (!guard.end()) {
          return false;
        }
      } else {
        attempt = Attempt.notApplicable();
      }
      rows.add(table.row(candidate, attempt));
    }
    return true;
  }

  /** Records that the call in progress did not return; called by the thread that took over. */
  void recordTimeout() {
    Candidate<K> candidate = assignment.candidates().get(rows.size());
    rows.add(
        problemRows
            .orElseThrow()
            .row(candidate, Attempt.timedOut(assignment.timeout().toMillis())));
  }

  private void prepare() {
    try {
      Problem<D> problem = assignment.problem();
      problemRows = Optional.of(new ProblemRows<>(assignment, problem));
    } catch (UncertifiedException uncertified) {
      refused = true;
      for (Candidate<K> candidate : assignment.candidates()) {
        rows.add(ProblemRows.uncertified(assignment, candidate, uncertified.getMessage()));
      }
    }
  }
}
