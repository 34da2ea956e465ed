package steelyard.results.tradeoff;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import steelyard.results.ErrorSummary;
import steelyard.results.Observation;
import steelyard.results.Timing;
import steelyard.results.Tradeoff;

/** Puts the errors of every candidate on a family and size beside its time. */
public final class Tradeoffs {
  private record Place(String task, String family, int size) {}

  private record Entry(String candidate, List<Observation> rows, Optional<Timing> timing) {
    private boolean failed() {
      return failures() > 0;
    }

    private int failures() {
      return Math.toIntExact(rows.stream().filter(o -> o.status().isFailure()).count());
    }

    private int judged() {
      return Math.toIntExact(rows.stream().filter(Observation::isJudged).count());
    }

    private OptionalDouble figure(Function<Timing, OptionalDouble> getter) {
      return timing.map(getter).orElse(OptionalDouble.empty());
    }

    private Optional<Frontier.Point> point() {
      return timing.isEmpty() || failed() || judged() == 0
          ? Optional.empty()
          : Optional.of(
              new Frontier.Point(
                  ErrorSummary.of(rows).worstForwardError().orElseThrow(),
                  timing.get().timeNs().orElseThrow()));
    }
  }

  private Tradeoffs() {}

  /**
   * Returns the rows of all tasks, families and sizes in the order in which the observations first
   * name them. A candidate that was neither judged nor failed at a place has no row there.
   */
  public static List<Tradeoff> of(List<Observation> observations, List<Timing> timings) {
    Map<Place, Map<String, List<Observation>>> places = new LinkedHashMap<>();
    for (Observation o : observations) {
      if (o.isJudged() || o.status().isFailure()) {
        places
            .computeIfAbsent(new Place(o.task(), o.family(), o.size()), p -> new LinkedHashMap<>())
            .computeIfAbsent(o.candidate(), c -> new ArrayList<>())
            .add(o);
      }
    }
    TimeLookup times = new TimeLookup(timings);
    List<Tradeoff> tradeoffs = new ArrayList<>();
    places.forEach((place, candidates) -> tradeoffs.addAll(rows(place, candidates, times)));
    return tradeoffs;
  }

  private static List<Tradeoff> rows(
      Place place, Map<String, List<Observation>> candidates, TimeLookup times) {
    List<Entry> entries = new ArrayList<>();
    candidates.forEach(
        (candidate, rows) ->
            entries.add(
                new Entry(
                    candidate,
                    rows,
                    times.find(place.task, candidate, place.size, Set.of(place.family)))));
    List<Frontier.Point> points =
        entries.stream().map(Entry::point).flatMap(Optional::stream).toList();
    return entries.stream().map(entry -> row(place, entry, points)).toList();
  }

  private static Tradeoff row(Place place, Entry entry, List<Frontier.Point> points) {
    ErrorSummary errors = ErrorSummary.of(entry.rows);
    return new Tradeoff(
        place.task,
        place.family,
        place.size,
        entry.candidate,
        entry.judged(),
        entry.failures(),
        errors.worstForwardError(),
        errors.medianForwardError(),
        errors.worstBackwardError(),
        errors.worstExcess(),
        entry.timing.map(Timing::family),
        entry.figure(Timing::timeNs),
        entry.figure(Timing::timeLowNs),
        entry.figure(Timing::timeHighNs),
        entry.figure(Timing::ratio),
        entry.figure(Timing::ratioLow),
        entry.figure(Timing::ratioHigh),
        entry.timing.map(
            t -> entry.point().map(point -> Frontier.isOn(point, points)).orElse(false)));
  }
}
