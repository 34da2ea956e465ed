package steelyard.results;

import java.util.Arrays;
import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * The extremes and the median of the errors of some judged observations; empty where no observation
 * has the figure.
 */
public record ErrorSummary(
    OptionalDouble worstForwardError,
    OptionalDouble medianForwardError,
    OptionalDouble worstBackwardError,
    OptionalDouble worstExcess,
    Optional<String> worstExcessProblem) {

  /** Summarizes the observations that {@linkplain Observation#isJudged() were judged}. */
  public static ErrorSummary of(Collection<Observation> observations) {
    double[] forward = sorted(observations, Observation::forwardError);
    double[] backward = sorted(observations, Observation::backwardError);
    Optional<Observation> worst =
        observations.stream()
            .filter(o -> o.isJudged() && o.excess().isPresent())
            .reduce((a, b) -> compareExcess(a, b) >= 0 ? a : b);
    return new ErrorSummary(
        last(forward),
        median(forward),
        last(backward),
        worst.map(Observation::excess).orElse(OptionalDouble.empty()),
        worst.map(Observation::problem));
  }

  private static int compareExcess(Observation a, Observation b) {
    return Comparator.<Observation>comparingDouble(o -> o.excess().orElseThrow()).compare(a, b);
  }

  private static double[] sorted(
      Collection<Observation> observations, Function<Observation, OptionalDouble> figure) {
    return observations.stream()
        .filter(Observation::isJudged)
        .flatMapToDouble(o -> figure.apply(o).stream())
        .sorted()
        .toArray();
  }

  private static OptionalDouble last(double[] sorted) {
    return Arrays.stream(sorted).skip(Math.max(0, sorted.length - 1)).findFirst();
  }

  private static OptionalDouble median(double[] sorted) {
    if (sorted.length == 0) {
      return OptionalDouble.empty();
    }
    double below = sorted[(sorted.length - 1) / 2];
    double above = sorted[sorted.length / 2];
    // Halved before the addition, which could overflow; equal ones are not touched at all.
    return OptionalDouble.of(below == above ? below : below * 0.5 + above * 0.5);
  }
}
