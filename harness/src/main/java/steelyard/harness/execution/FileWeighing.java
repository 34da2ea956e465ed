package steelyard.harness.execution;

import java.util.List;
import java.util.Optional;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.FamilyShare;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.TimingEffort;
import steelyard.harness.plan.Weighing;
import steelyard.harness.task.Task;
import steelyard.problems.Family;
import steelyard.problems.ProblemId;

/**
 * How the one problem that a user brings along is weighed.
 *
 * @param candidates the ids of the candidates
 * @param additions those that come from outside
 * @param isTimed whether they are timed
 * @param timeoutMs the longest that one call may take, in milliseconds
 */
public record FileWeighing(
    List<String> candidates, List<Addition> additions, boolean isTimed, int timeoutMs) {
  private static final TimingEffort EFFORT = new TimingEffort(1, 3, 5, 100, List.of());

  /** Copies the lists. */
  public FileWeighing {
    candidates = List.copyOf(candidates);
    additions = List.copyOf(additions);
  }

  /** Returns the plan for the one problem that a family makes. */
  public Plan plan(Task<?, ?> task, Family<?> family) {
    String name = family.profile().id();
    Weighing weighing =
        new Weighing(
            task.id(),
            List.of(new FamilyShare(name, List.of(), List.of(family.reach().minSize()))),
            candidates,
            1,
            Optional.of(name),
            timeoutMs);
    Optional<TimingEffort> effort = isTimed ? Optional.of(EFFORT) : Optional.empty();
    return new Plan(name, ProblemId.DEFAULT_SEED, additions, effort, List.of(weighing), List.of());
  }
}
