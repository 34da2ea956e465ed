package steelyard.results.verdict;

import java.util.List;
import java.util.Set;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Rounding;

/**
 * Every answer is rounded as the grade says, on enough problems to mean something. The problem
 * decides how an answer is rounded, also where the exact answer is 0: there only 0 will do.
 */
record RoundingRule(Grade grade, Set<Rounding> allowed) implements VerdictRule {
  static final int LEAST_PROBLEMS = 20;

  @Override
  public boolean isEvidence(List<Observation> judged) {
    return judged.stream().map(Observation::problem).distinct().count() >= LEAST_PROBLEMS;
  }

  @Override
  public double used(Observation o) {
    return o.rounding().filter(allowed::contains).isPresent() ? 0 : Double.POSITIVE_INFINITY;
  }
}
