package steelyard.junit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import steelyard.results.Observation;
import steelyard.results.text.Figures;
import steelyard.results.verdict.Allowances;

/**
 * That no error is much larger than those of a baseline on problems alike. What counts is not the
 * baseline's error on the very problem, which may be small by luck, but its worst in the family,
 * where an error on a harder problem counts in proportion to the condition numbers.
 *
 * @param baseline the id of the baseline
 * @param factor how many times larger an error may be
 */
record BaselineCheck(String baseline, double factor) implements Check {

  @Override
  public String claim() {
    return "be no less accurate than the baseline, within a factor of " + Figures.plain(factor);
  }

  /** A problem on which both gave an answer, and the error that is allowed there. */
  private record Pair(Observation row, double allowed) {
    double used() {
      return row.forwardError().orElseThrow() / allowed;
    }
  }

  @Override
  public Optional<Finding> finding(Outcome outcome) {
    Map<String, Observation> base = new HashMap<>();
    outcome.of(baseline).stream()
        .filter(Observation::isJudged)
        .forEach(row -> base.put(row.problem(), row));
    List<Observation> failures =
        outcome.failures().stream().filter(row -> base.containsKey(row.problem())).toList();
    List<Pair> pairs = new ArrayList<>();
    for (Observation row : outcome.judged()) {
      if (base.containsKey(row.problem())) {
        pairs.add(new Pair(row, allowed(row, base.values())));
      }
    }
    if (!failures.isEmpty()) {
      return Finding.ofFailures(failures, failures.size() + pairs.size());
    }
    if (pairs.isEmpty()) {
      return Optional.of(
          Finding.ofNothing("there is no problem to compare them on: the baseline answered none"));
    }
    List<Pair> broken = pairs.stream().filter(pair -> pair.used() > 1).toList();
    return broken.stream()
        .max(Comparator.comparingDouble(Pair::used))
        .map(
            worst ->
                new Finding(
                    broken.size() + " of " + pairs.size() + " problems break it",
                    Optional.of(worst.row()),
                    "a forward error of at most "
                        + Figures.error(worst.allowed())
                        + ", as the baseline has up to "
                        + Figures.error(worst.allowed() / factor)
                        + " on such problems of the family"));
  }

  private double allowed(Observation row, Iterable<Observation> base) {
    double worst = Allowances.unitRoundoff(row.precisionBits());
    for (Observation other : base) {
      if (other.family().equals(row.family())) {
        double easier = Math.min(1, condition(row) / condition(other));
        worst = Math.max(worst, easier * other.forwardError().orElseThrow());
      }
    }
    return factor * worst;
  }

  private static double condition(Observation row) {
    return Math.max(1, row.condition().orElseThrow());
  }
}
