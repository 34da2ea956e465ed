package steelyard.results;

import java.util.Locale;
import java.util.OptionalInt;

/** What the observations of a candidate amount to, best first. */
public enum Grade {
  /** Every answer is a double nearest to the exact one. */
  CORRECTLY_ROUNDED,
  /** Every answer is one of the two doubles around the exact one. */
  FAITHFUL,
  /** As if computed in 8-fold working precision and then rounded. */
  EIGHT_FOLD(8),
  /** As if computed in 7-fold working precision and then rounded. */
  SEVEN_FOLD(7),
  /** As if computed in 6-fold working precision and then rounded. */
  SIX_FOLD(6),
  /** As if computed in 5-fold working precision and then rounded. */
  FIVE_FOLD(5),
  /** As if computed in 4-fold working precision and then rounded. */
  FOUR_FOLD(4),
  /** As if computed in 3-fold working precision and then rounded. */
  THREE_FOLD(3),
  /** As if computed in twice the working precision and then rounded. */
  TWO_FOLD(2),
  /** Every answer is the exact one of a problem nearby. */
  BACKWARD_STABLE,
  /** No error is larger than the condition number explains. */
  FORWARD_STABLE,
  /** Some error is larger than the condition number explains. */
  UNSTABLE,
  /** Some problem got no answer that could be judged, by the candidate's fault. */
  FAILED,
  /** No observation could be judged, and none of them by the candidate's fault. */
  UNJUDGED,
  /** The candidate is for none of the problems. */
  NOT_APPLICABLE;

  private final int folds;

  Grade() {
    this(0);
  }

  Grade(int folds) {
    this.folds = folds;
  }

  /**
   * Returns the grade of k-fold working precision.
   *
   * @param k from 2 to 8
   * @throws IllegalArgumentException for any other k
   */
  public static Grade ofFolds(int k) {
    for (Grade grade : values()) {
      if (grade.folds == k && k != 0) {
        return grade;
      }
    }
    throw new IllegalArgumentException(
        "There is no grade of " + k + "-fold precision; 2 to 8 are.");
  }

  /** Returns k for a k-fold grade. */
  public OptionalInt folds() {
    return folds == 0 ? OptionalInt.empty() : OptionalInt.of(folds);
  }

  /** Returns the name as the tables have it, such as {@code backward-stable} or {@code 2-fold}. */
  public String text() {
    return folds == 0 ? name().toLowerCase(Locale.ROOT).replace('_', '-') : folds + "-fold";
  }

  /** Returns the name as a sentence has it, such as {@code backward stable} or {@code 2-fold}. */
  public String words() {
    return folds == 0 ? text().replace('-', ' ') : text();
  }
}
