package steelyard.results.text;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import steelyard.results.Timing;
import steelyard.results.tradeoff.TimeLookup;

/** The times of one task at the largest size that was timed, in one unit. */
final class TaskTimes {
  private final String task;
  private final Optional<Integer> size;
  private final TimeLookup lookup;
  private final boolean perElement;
  private final TimeScale scale;
  private final String textbook;

  private TaskTimes(String task, List<Timing> timings) {
    this.task = task;
    lookup = new TimeLookup(timings);
    List<Integer> sizes = lookup.sizes(task);
    size = sizes.isEmpty() ? Optional.empty() : Optional.of(sizes.get(sizes.size() - 1));
    List<Timing> shown =
        timings.stream()
            .filter(t -> t.task().equals(task) && t.timeNs().isPresent())
            .filter(t -> size.filter(s -> s == t.size()).isPresent())
            .toList();
    perElement =
        shown.stream()
            .anyMatch(
                t -> t.timePerElementNs().isPresent() && !t.timePerElementNs().equals(t.timeNs()));
    scale =
        TimeScale.forShortest(
            shown.stream().flatMapToDouble(t -> shown(t, t.timeNs()).stream()).min().orElse(1));
    textbook = shown.stream().map(Timing::textbook).findFirst().orElse("");
  }

  static TaskTimes of(String task, List<Timing> timings) {
    return new TaskTimes(task, timings);
  }

  /** Returns the end of a title, such as {@code ns per element at n = 1000, textbook is naive}. */
  String title() {
    if (size.isEmpty()) {
      return "no time was measured";
    }
    return "time at n = "
        + size.get()
        + (textbook.isEmpty() ? "" : ", the textbook candidate is " + textbook);
  }

  /** Returns the heading of the times. */
  String heading() {
    return size.isEmpty() ? "time" : scale.unit() + (perElement ? " per element" : " per call");
  }

  /** Returns a candidate's time with its interval. */
  String time(String candidate) {
    return find(candidate)
        .map(
            t ->
                scale.interval(
                    shown(t, t.timeNs()), shown(t, t.timeLowNs()), shown(t, t.timeHighNs())))
        .orElse(Figures.NONE);
  }

  /** Returns a candidate's time over that of the textbook candidate. */
  String ratio(String candidate) {
    return Figures.plain(find(candidate).map(Timing::ratio).orElse(OptionalDouble.empty()));
  }

  private Optional<Timing> find(String candidate) {
    return size.flatMap(s -> lookup.find(task, candidate, s, Set.of()));
  }

  /** Returns a time of one call, or the same per element where that is what the table shows. */
  private OptionalDouble shown(Timing timing, OptionalDouble ns) {
    if (!perElement || timing.timePerElementNs().isEmpty() || ns.isEmpty()) {
      return ns;
    }
    double elements = timing.timeNs().orElseThrow() / timing.timePerElementNs().getAsDouble();
    return OptionalDouble.of(ns.getAsDouble() / elements);
  }
}
