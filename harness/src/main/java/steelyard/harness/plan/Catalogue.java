package steelyard.harness.plan;

import java.util.ArrayList;
import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Reach;

/**
 * What a plan may name.
 *
 * @param tasks the tasks, in the order in which they are listed
 */
public record Catalogue(List<TaskEntry> tasks) {

  /** Copies the list. */
  public Catalogue {
    tasks = List.copyOf(tasks);
  }

  /**
   * A task.
   *
   * @param id its id
   * @param families its families
   * @param candidates the ids of its candidates
   */
  public record TaskEntry(String id, List<FamilyEntry> families, List<String> candidates) {

    /** Copies the lists. */
    public TaskEntry {
      families = List.copyOf(families);
      candidates = List.copyOf(candidates);
    }

    TaskEntry with(List<Addition> additions) {
      List<String> all = new ArrayList<>(candidates);
      for (Addition addition : additions) {
        if (!addition.task().equals(id)) {
          continue;
        }
        if (all.contains(addition.id())) {
          throw new PlanException(
              "task '"
                  + id
                  + "' has a candidate '"
                  + addition.id()
                  + "' already: choose another id");
        }
        all.add(addition.id());
      }
      return new TaskEntry(id, families, all);
    }

    List<String> familyIds() {
      return families.stream().map(FamilyEntry::id).toList();
    }

    FamilyEntry family(String id) {
      return families.stream().filter(family -> family.id().equals(id)).findFirst().orElseThrow();
    }
  }

  /**
   * A family.
   *
   * @param id its id
   * @param reach the conditions and sizes that it can make
   */
  public record FamilyEntry(String id, Reach reach) {

    boolean makes(int size) {
      return size >= reach.minSize() && size <= reach.maxSize();
    }

    int nearestSize(int size) {
      return Math.max(reach.minSize(), Math.min(reach.maxSize(), size));
    }

    /** Says whether it reaches a condition at every one of these sizes. */
    boolean makes(double condition, List<Integer> sizes) {
      return condition >= 1 && sizes.stream().allMatch(n -> condition <= reach.maxConditionAt(n));
    }
  }

  /** Returns the catalogue of these tasks. */
  public static Catalogue of(List<? extends Task<?, ?>> tasks) {
    return new Catalogue(tasks.stream().map(Catalogue::entry).toList());
  }

  /**
   * Returns this catalogue with more candidates; those of other tasks are passed over.
   *
   * @throws PlanException if a task has two of the same id
   */
  public Catalogue with(List<Addition> additions) {
    return new Catalogue(tasks.stream().map(task -> task.with(additions)).toList());
  }

  List<String> taskIds() {
    return tasks.stream().map(TaskEntry::id).toList();
  }

  TaskEntry task(String id) {
    return tasks.stream().filter(task -> task.id().equals(id)).findFirst().orElseThrow();
  }

  private static <K, D extends Data> TaskEntry entry(Task<K, D> task) {
    return new TaskEntry(
        task.id(),
        task.families().stream().map(Catalogue::entry).toList(),
        task.candidates().stream().map(Candidate::id).toList());
  }

  private static FamilyEntry entry(Family<?> family) {
    return new FamilyEntry(family.profile().id(), family.reach());
  }
}
