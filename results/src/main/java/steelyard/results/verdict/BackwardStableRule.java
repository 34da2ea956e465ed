package steelyard.results.verdict;

import java.util.List;
import java.util.OptionalDouble;
import steelyard.results.Grade;
import steelyard.results.Observation;

/**
 * Every backward error is at most C(n)u. A backward error that is not known does not hold. The
 * backward error keeps its meaning where κ is infinite, and is held to the same limit there.
 */
record BackwardStableRule() implements VerdictRule {
  @Override
  public Grade grade() {
    return Grade.BACKWARD_STABLE;
  }

  @Override
  public boolean holds(List<Observation> judged) {
    return judged.stream().allMatch(BackwardStableRule::holds);
  }

  private static boolean holds(Observation o) {
    OptionalDouble error = o.backwardError();
    double limit = Allowances.c(o.size()) * Allowances.unitRoundoff(o.precisionBits());
    return error.isPresent() && error.getAsDouble() <= limit;
  }
}
