package steelyard.results.verdict;

import java.util.List;
import java.util.Optional;
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
  public boolean holds(List<Observation> judged) {
    return judged.stream().map(Observation::problem).distinct().count() >= LEAST_PROBLEMS
        && judged.stream().map(Observation::rounding).allMatch(this::allows);
  }

  private boolean allows(Optional<Rounding> rounding) {
    return rounding.isPresent() && allowed.contains(rounding.get());
  }
}
