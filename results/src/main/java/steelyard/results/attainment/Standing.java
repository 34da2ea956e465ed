package steelyard.results.attainment;

import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.results.Observation;
import steelyard.results.Timing;

/**
 * One candidate on the problem.
 *
 * @param row what it did
 * @param timing its time, if it was measured
 * @param level how accurate it was
 */
public record Standing(Observation row, Optional<Timing> timing, Level level) {

  String candidate() {
    return row.candidate();
  }

  OptionalDouble time() {
    return timing.map(Timing::timeNs).orElse(OptionalDouble.empty());
  }

  /** Says whether the interval of this time and that of a slower one have no point in common. */
  boolean isFasterBeyondDoubt(Standing slower) {
    double high = timing.map(Timing::timeHighNs).orElse(OptionalDouble.empty()).orElse(0);
    double low = slower.timing.map(Timing::timeLowNs).orElse(OptionalDouble.empty()).orElse(0);
    return high < low;
  }
}
