package steelyard.results.verdict;

import java.util.List;
import steelyard.results.Grade;
import steelyard.results.Observation;

/** What must hold on every problem for one grade. */
interface VerdictRule {
  /** Returns the grade that this rule gives. */
  Grade grade();

  /**
   * Returns how much of what the rule allows an observation uses up: at most 1 where it holds.
   *
   * @param judged an observation that is {@linkplain Observation#isJudged() judged}
   */
  double used(Observation judged);

  /**
   * Says whether observations are many enough, or hard enough, to prove anything.
   *
   * @param judged at least one observation, each {@linkplain Observation#isJudged() judged}
   */
  default boolean isEvidence(List<Observation> judged) {
    return true;
  }

  /** Says whether the rule holds on such observations. */
  default boolean holds(List<Observation> judged) {
    return isEvidence(judged) && judged.stream().allMatch(o -> used(o) <= 1);
  }
}
