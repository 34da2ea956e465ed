package steelyard.harness.plan;

import java.util.List;
import java.util.Optional;

/**
 * One {@code [[weigh]]} entry of a plan with nothing left to a default: candidates of a task on
 * problems of that task.
 *
 * @param task the id of the task
 * @param families what each family contributes
 * @param candidates the ids of the candidates
 * @param repeats problems for each family that generates them, condition and size
 * @param time the family on whose problems candidates are timed; empty: they are not timed
 * @param timeoutMs how long one call may take, in milliseconds
 */
public record Weighing(
    String task,
    List<FamilyShare> families,
    List<String> candidates,
    int repeats,
    Optional<String> time,
    int timeoutMs) {

  /** Copies the lists. */
  public Weighing {
    families = List.copyOf(families);
    candidates = List.copyOf(candidates);
  }

  /** Returns this weighing with those of more candidates that are of its task. */
  Weighing with(List<Addition> more) {
    List<String> ids =
        more.stream().filter(each -> each.task().equals(task)).map(Addition::id).toList();
    return new Weighing(task, families, PlanCells.union(candidates, ids), repeats, time, timeoutMs);
  }

  /** Returns the share of a family that takes part. */
  FamilyShare share(String family) {
    return families.stream().filter(s -> s.family().equals(family)).findFirst().orElseThrow();
  }

  /** Returns how many problems alike a share contributes: files hold but one. */
  int repeats(FamilyShare share) {
    return share.generated() ? repeats : 1;
  }

  /** Returns how many problems it asks for. */
  long problemCount() {
    return families.stream()
        .mapToLong(s -> (long) repeats(s) * s.sizes().size() * Math.max(1, s.conditions().size()))
        .sum();
  }
}
