package steelyard.results.verdict;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Rounding;
import steelyard.results.Status;

/** Finds the best grade that holds on every problem seen. */
final class Grader {
  private static final List<VerdictRule> BEST_FIRST = bestFirst();

  private Grader() {}

  private static List<VerdictRule> bestFirst() {
    List<VerdictRule> rules = new ArrayList<>();
    rules.add(new RoundingRule(Grade.CORRECTLY_ROUNDED, Set.of(Rounding.NEAREST)));
    rules.add(new RoundingRule(Grade.FAITHFUL, Set.of(Rounding.NEAREST, Rounding.FAITHFUL)));
    for (int k = 8; k >= 2; k--) {
      rules.add(new KFoldRule(k));
    }
    rules.add(new BackwardStableRule());
    rules.add(new ForwardStableRule());
    return List.copyOf(rules);
  }

  /** Returns the rule of a grade, if it is one that a candidate can earn. */
  static Optional<VerdictRule> rule(Grade grade) {
    return BEST_FIRST.stream().filter(rule -> rule.grade() == grade).findFirst();
  }

  /** Grades any observations of one candidate. */
  static Grade grade(List<Observation> observations) {
    if (observations.stream().anyMatch(o -> o.status().isFailure())) {
      return Grade.FAILED;
    }
    List<Observation> judged = observations.stream().filter(Observation::isJudged).toList();
    if (judged.isEmpty()) {
      boolean applicable = observations.stream().anyMatch(o -> o.status() != Status.NOT_APPLICABLE);
      return applicable ? Grade.UNJUDGED : Grade.NOT_APPLICABLE;
    }
    return BEST_FIRST.stream()
        .filter(rule -> rule.holds(judged))
        .map(VerdictRule::grade)
        .findFirst()
        .orElse(Grade.UNSTABLE);
  }
}
