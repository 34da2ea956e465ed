package steelyard.harness.execution;

import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import steelyard.algorithms.Candidate;
import steelyard.harness.plan.TimingCell;
import steelyard.harness.run.Assignment;
import steelyard.harness.timing.TimingJob;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.UncertifiedException;
import steelyard.results.Observation;
import steelyard.results.Status;

/**
 * Turns the timings that a plan asks for into jobs. A candidate that gave no answer in the accuracy
 * phase is not timed on that problem: its time would be that of a failure.
 */
final class TimingJobs {

  private static final int FIRST_REPEAT = 1;

  private final Workbench workbench;
  private final long seed;
  private final Map<String, Observation> observed = new HashMap<>();

  TimingJobs(Workbench workbench, List<Observation> observations, long seed) {
    this.workbench = workbench;
    this.seed = seed;
    for (Observation row : observations) {
      observed.put(key(row.problem(), row.candidate()), row);
    }
  }

  List<TimingJob<?, ?>> of(List<TimingCell> cells) {
    List<TimingJob<?, ?>> jobs = new ArrayList<>();
    for (TimingCell cell : cells) {
      ProblemId id =
          new ProblemId(
              cell.task(), cell.family(), cell.condition(), cell.size(), FIRST_REPEAT, seed);
      Assignment<?, ?> assignment = workbench.assignment(id, List.of(), Duration.ZERO);
      job(assignment, cell.candidates()).ifPresent(jobs::add);
    }
    return jobs;
  }

  private <K, D extends Data> Optional<TimingJob<K, D>> job(
      Assignment<K, D> assignment, List<String> candidateIds) {
    try {
      Problem<D> problem = assignment.problem();
      List<TimingJob.Entry> entries =
          assignment.task().candidates().stream()
              .filter(each -> candidateIds.contains(each.id()))
              .map(each -> entry(assignment.id(), problem, each))
              .toList();
      return Optional.of(
          new TimingJob<>(assignment.task(), assignment.id(), problem.data(), entries));
    } catch (UncertifiedException none) {
      return Optional.empty();
    }
  }

  private TimingJob.Entry entry(ProblemId id, Problem<?> problem, Candidate<?> candidate) {
    if (!candidate.scope().covers(problem.traits(), problem.size())) {
      return new TimingJob.Entry(candidate.id(), Optional.of("not applicable"));
    }
    Optional<String> failure =
        Optional.ofNullable(observed.get(key(id.toString(), candidate.id())))
            .map(Observation::status)
            .filter(Status::isFailure)
            .map(status -> "not timed: its status on this problem is " + status.text());
    return new TimingJob.Entry(candidate.id(), failure);
  }

  private static String key(String problem, String candidate) {
    return problem + " " + candidate;
  }
}
