package steelyard.results.attainment;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import steelyard.results.Observation;
import steelyard.results.Timing;

/**
 * The candidates on one problem, the most accurate level first, within a level the fastest first.
 *
 * @param standings one for each candidate
 */
public record Attainment(List<Standing> standings) {

  private static final Comparator<Standing> ORDER =
      Comparator.comparing(Standing::level)
          .thenComparingDouble(s -> s.time().orElse(Double.POSITIVE_INFINITY))
          .thenComparingDouble(s -> s.row().forwardError().orElse(Double.POSITIVE_INFINITY))
          .thenComparing(s -> s.row().status());

  /** Copies the list. */
  public Attainment {
    standings = List.copyOf(standings);
  }

  /**
   * Puts the rows of one problem in order.
   *
   * @param rows what each candidate did
   * @param timings their times, on the same problem
   */
  public static Attainment of(List<Observation> rows, List<Timing> timings) {
    return new Attainment(
        rows.stream()
            .map(row -> new Standing(row, timing(row, timings), Level.of(row)))
            .sorted(ORDER)
            .toList());
  }

  /** Returns those that are at least as accurate as a level, the fastest first. */
  public List<Standing> reaching(Level level) {
    return standings.stream()
        .filter(s -> s.level().compareTo(level) <= 0)
        .sorted(Comparator.comparingDouble(s -> s.time().orElse(Double.POSITIVE_INFINITY)))
        .toList();
  }

  /** Returns the fastest of those, if it was timed. */
  public Optional<Standing> fastest(Level level) {
    return reaching(level).stream().findFirst().filter(s -> s.time().isPresent());
  }

  /** Returns those whose times cannot be told apart from that of the fastest. */
  public List<Standing> tied(Level level) {
    return fastest(level).stream()
        .flatMap(
            best ->
                reaching(level).stream()
                    .skip(1)
                    .filter(s -> s.time().isPresent() && !best.isFasterBeyondDoubt(s)))
        .toList();
  }

  private static Optional<Timing> timing(Observation row, List<Timing> timings) {
    return timings.stream()
        .filter(t -> t.candidate().equals(row.candidate()) && t.problem().equals(row.problem()))
        .findFirst();
  }
}
