package steelyard.results.verdict;

import java.util.List;
import steelyard.results.Grade;
import steelyard.results.Observation;

/** What must hold on every problem for one grade. */
interface VerdictRule {
  /** Returns the grade that this rule gives. */
  Grade grade();

  /**
   * Says whether the rule holds.
   *
   * @param judged at least one observation, each {@linkplain Observation#isJudged() judged}
   */
  boolean holds(List<Observation> judged);
}
