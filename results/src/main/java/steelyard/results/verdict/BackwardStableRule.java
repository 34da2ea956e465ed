package steelyard.results.verdict;

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
  public double used(Observation o) {
    double limit = Allowances.c(o.size()) * Allowances.unitRoundoff(o.precisionBits());
    return Allowances.share(o.backwardError().orElse(Double.POSITIVE_INFINITY), limit);
  }
}
