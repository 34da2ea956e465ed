package steelyard.results.verdict;

import steelyard.results.Grade;
import steelyard.results.Observation;

/**
 * Every forward error is at most C(n) max(κ, 1) u. Where κ is infinite no forward error, not even
 * an infinite one, is more than the condition number explains.
 */
record ForwardStableRule() implements VerdictRule {
  @Override
  public Grade grade() {
    return Grade.FORWARD_STABLE;
  }

  @Override
  public double used(Observation o) {
    double limit =
        Allowances.c(o.size())
            * Math.max(o.condition().orElseThrow(), 1)
            * Allowances.unitRoundoff(o.precisionBits());
    return Allowances.share(o.forwardError().orElseThrow(), limit);
  }
}
