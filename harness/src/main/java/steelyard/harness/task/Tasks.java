package steelyard.harness.task;

import java.util.List;
import java.util.Optional;

/** The tasks that ship with the harness. */
public final class Tasks {

  private static final List<Task<?, ?>> ALL =
      List.of(new SumTask(), new DotTask(), new SolveTask());

  private Tasks() {}

  /** Returns every task, in the order in which they are shown. */
  public static List<Task<?, ?>> all() {
    return ALL;
  }

  /** Returns the task with this id. */
  public static Optional<Task<?, ?>> find(String id) {
    return ALL.stream().filter(task -> task.id().equals(id)).findFirst();
  }
}
