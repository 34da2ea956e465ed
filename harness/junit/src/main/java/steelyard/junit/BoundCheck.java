package steelyard.junit;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import steelyard.algorithms.Bound;
import steelyard.results.Observation;
import steelyard.results.text.Figures;
import steelyard.results.verdict.BrokenBound;

/**
 * That an error stays within a bound.
 *
 * @param bound the bound
 */
record BoundCheck(Bound bound) implements Check {

  @Override
  public String claim() {
    String source = bound.source().isEmpty() ? "" : " (" + bound.source() + ")";
    return "have a " + error() + " of at most " + bound.text() + source;
  }

  @Override
  public Optional<Finding> finding(Outcome outcome) {
    List<Observation> held =
        outcome.judged().stream().filter(row -> row.claim().isPresent()).toList();
    if (!outcome.failures().isEmpty()) {
      return Finding.ofFailures(
          outcome.failures(), outcome.judged().size() + outcome.failures().size());
    }
    if (held.isEmpty()) {
      return Optional.of(
          Finding.ofNothing(
              bound.traits().isEmpty()
                  ? "no problem of the task has that error"
                  : "no problem tried is "
                      + String.join(" and ", bound.traits().stream().sorted().toList())));
    }
    List<BrokenBound> broken = BrokenBound.in(held);
    return broken.stream()
        .max(Comparator.comparingDouble(each -> each.observed().orElse(0) / each.bound()))
        .map(
            worst ->
                new Finding(
                    broken.size() + " of " + held.size() + " problems break it",
                    held.stream().filter(row -> row.problem().equals(worst.problem())).findFirst(),
                    "a " + error() + " of at most " + Figures.error(worst.bound())));
  }

  private String error() {
    return bound.limits().name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
