package steelyard.results.tradeoff;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import steelyard.results.Timing;

/**
 * Which time belongs to a candidate on a family and size. Time is usually measured on one
 * representative family of a task and size, whose time then stands for every family of that size.
 * If one of the wanted families was measured itself, its time is taken; of several, the longest.
 */
public final class TimeLookup {
  private final List<Timing> measured;

  /** Takes the timings that have a figure; the others say only why they have none. */
  public TimeLookup(List<Timing> timings) {
    measured = timings.stream().filter(t -> t.timeNs().isPresent()).toList();
  }

  /**
   * Finds the time of a candidate.
   *
   * @param families the wanted families; none for any
   */
  public Optional<Timing> find(String task, String candidate, int size, Set<String> families) {
    List<Timing> fitting =
        measured.stream()
            .filter(t -> t.task().equals(task) && t.size() == size)
            .filter(t -> t.candidate().equals(candidate))
            .toList();
    Optional<Timing> wanted =
        longest(fitting.stream().filter(t -> families.contains(t.family())).toList());
    return wanted.isPresent() ? wanted : longest(fitting);
  }

  private static Optional<Timing> longest(List<Timing> timings) {
    return timings.stream().max(Comparator.comparingDouble(t -> t.timeNs().orElseThrow()));
  }

  /** Returns the sizes of a task for which there is a time, ascending. */
  public List<Integer> sizes(String task) {
    return measured.stream()
        .filter(t -> t.task().equals(task))
        .map(Timing::size)
        .distinct()
        .sorted()
        .toList();
  }
}
