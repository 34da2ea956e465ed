package steelyard.results.verdict;

import java.util.List;
import steelyard.results.Grade;
import steelyard.results.Observation;

/**
 * The limit that a grade sets to an observation, for who needs to know how near one came to it.
 *
 * @param grade a grade from correctly rounded to forward stable
 */
public record GradeLimit(Grade grade) {

  /**
   * Checks the grade.
   *
   * @throws IllegalArgumentException if no observation can earn it
   */
  public GradeLimit {
    if (Grader.rule(grade).isEmpty()) {
      throw new IllegalArgumentException(
          "no candidate is held to the grade '"
              + grade.words()
              + "': name one from correctly rounded to forward stable");
    }
  }

  /**
   * Returns how much of the limit an observation uses up: above 1 it breaks it, and is infinite
   * where there are no degrees of breaking it.
   *
   * @param judged an observation that is {@linkplain Observation#isJudged() judged}
   */
  public double used(Observation judged) {
    return rule().used(judged);
  }

  /** Says whether such observations are many enough, or hard enough, to prove the grade. */
  public boolean isProvable(List<Observation> judged) {
    return !judged.isEmpty() && rule().isEvidence(judged);
  }

  private VerdictRule rule() {
    return Grader.rule(grade).orElseThrow();
  }
}
