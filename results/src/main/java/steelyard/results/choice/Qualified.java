package steelyard.results.choice;

import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.results.Timing;

/**
 * A candidate that meets a requirement on every problem.
 *
 * @param problems on how many problems
 * @param worstError its largest forward error
 * @param worstProblem where
 * @param margin the required error over the worst; infinite where the worst is 0
 * @param maxCondition the largest condition number among the problems
 * @param timing its time, if one was measured
 */
public record Qualified(
    String candidate,
    int problems,
    double worstError,
    String worstProblem,
    double margin,
    double maxCondition,
    Optional<Timing> timing) {

  /** Returns the time of one call, infinite where none was measured. */
  double timeOrInfinity() {
    return timing
        .map(Timing::timeNs)
        .orElse(OptionalDouble.empty())
        .orElse(Double.POSITIVE_INFINITY);
  }

  /**
   * Says whether the measured times of two candidates cannot be told apart: their intervals
   * overlap, or one of them has a time and no interval.
   */
  boolean tiesWith(Qualified other) {
    if (timing.isEmpty() || other.timing.isEmpty()) {
      return false;
    }
    double low = Math.max(low(timing.get()), low(other.timing.get()));
    double high = Math.min(high(timing.get()), high(other.timing.get()));
    return low <= high;
  }

  private static double low(Timing timing) {
    return timing.timeLowNs().orElse(Double.NEGATIVE_INFINITY);
  }

  private static double high(Timing timing) {
    return timing.timeHighNs().orElse(Double.POSITIVE_INFINITY);
  }
}
