package steelyard.harness.execution;

import java.time.Duration;
import java.util.Collection;
import java.util.List;
import java.util.function.Function;
import steelyard.algorithms.Candidate;
import steelyard.harness.plan.PlanException;
import steelyard.harness.run.Assignment;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.results.text.NearestName;

/** Finds what is named by id: tasks, families, candidates, problems. */
public final class Workbench {

  private final List<Task<?, ?>> tasks;

  /** Makes one for these tasks. */
  public Workbench(List<Task<?, ?>> tasks) {
    this.tasks = List.copyOf(tasks);
  }

  /**
   * Returns the task with this id.
   *
   * @throws PlanException if there is none
   */
  public Task<?, ?> task(String id) {
    return find("task", id, tasks, Task::id);
  }

  /**
   * Returns the family with this id.
   *
   * @throws PlanException if the task has none
   */
  public <D extends Data> Family<D> family(Task<?, D> task, String id) {
    return find(
        "family of task '" + task.id() + "'", id, task.families(), each -> each.profile().id());
  }

  /**
   * Makes the problem with this id; see {@link Family#generate} for what else is thrown.
   *
   * @throws PlanException if there is no such task or family
   */
  public Problem<?> problem(ProblemId id) {
    return assignment(id, List.of(), Duration.ZERO).problem();
  }

  Assignment<?, ?> assignment(ProblemId id, List<String> candidates, Duration timeout) {
    return assignment(task(id.task()), id, candidates, timeout);
  }

  private <K, D extends Data> Assignment<K, D> assignment(
      Task<K, D> task, ProblemId id, List<String> candidateIds, Duration timeout) {
    List<Candidate<K>> candidates =
        task.candidates().stream().filter(each -> candidateIds.contains(each.id())).toList();
    return new Assignment<>(task, family(task, id.family()), id, candidates, timeout);
  }

  private static <T> T find(
      String kind, String id, Collection<? extends T> all, Function<? super T, String> name) {
    for (T each : all) {
      if (name.apply(each).equals(id)) {
        return each;
      }
    }
    List<String> known = all.stream().<String>map(name).toList();
    throw new PlanException(
        "there is no " + kind + " named '" + id + "'; " + NearestName.hint(id, known));
  }
}
