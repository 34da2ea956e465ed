package steelyard.junit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.ProblemId;
import steelyard.problems.Reach;

/** Spreads a scenario out into problems: each family, size, decade of condition numbers, repeat. */
final class ProblemList<D extends Data> {

  private static final int DECADE = 10;

  private final Task<?, D> task;
  private final Scenario<D> scenario;

  ProblemList(Task<?, D> task, Scenario<D> scenario) {
    this.task = task;
    this.scenario = scenario;
  }

  /** A problem, and the family that makes it. */
  record Entry<D extends Data>(Family<D> family, ProblemId id) {}

  /**
   * Returns the problems.
   *
   * @throws IllegalArgumentException if a family that the test names cannot make a size that the
   *     test names
   */
  List<Entry<D>> entries() {
    List<Entry<D>> entries = new ArrayList<>();
    for (Family<D> family : scenario.families()) {
      for (int size : sizes(family)) {
        for (OptionalDouble condition : conditions(family.reach(), size)) {
          for (int repeat = 1; repeat <= scenario.repeats(); repeat++) {
            entries.add(new Entry<>(family, id(family, condition, size, repeat)));
          }
        }
      }
    }
    return entries;
  }

  private ProblemId id(Family<D> family, OptionalDouble condition, int size, int repeat) {
    return new ProblemId(
        task.id(), family.profile().id(), condition, size, repeat, scenario.seed());
  }

  private List<Integer> sizes(Family<D> family) {
    Reach reach = family.reach();
    List<Integer> wanted = scenario.sizesFor(task);
    if (scenario.named() && scenario.sizes().isPresent()) {
      for (int size : wanted) {
        if (size < reach.minSize() || size > reach.maxSize()) {
          throw new IllegalArgumentException(
              "family '%s' of task '%s' makes sizes from %s to %s, but size %s is wanted"
                  .formatted(
                      family.profile().id(), task.id(), reach.minSize(), reach.maxSize(), size));
        }
      }
    }
    return wanted.stream()
        .map(size -> Math.max(reach.minSize(), Math.min(reach.maxSize(), size)))
        .distinct()
        .toList();
  }

  private List<OptionalDouble> conditions(Reach reach, int size) {
    if (!reach.controlled()) {
      return List.of(OptionalDouble.empty());
    }
    double largest = Math.min(scenario.conditionUpTo(), reach.maxConditionAt(size));
    List<OptionalDouble> conditions = new ArrayList<>();
    for (double each = 1; each < largest; each *= DECADE) {
      conditions.add(OptionalDouble.of(each));
    }
    if (largest == scenario.conditionUpTo()) {
      conditions.add(OptionalDouble.of(largest));
    }
    return conditions;
  }
}
