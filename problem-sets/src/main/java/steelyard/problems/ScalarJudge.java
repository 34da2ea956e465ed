package steelyard.problems;

import steelyard.problems.exact.Dyadic;

/**
 * Judges the answers of a scalar task whose answer s is known exactly.
 *
 * <p>For an answer &#349;, the forward error is |&#349; - s| / |s| and the backward error |&#349; -
 * s| / scale. Each is computed exactly and rounded once to the nearest double, except that an error
 * too small for a double is given as {@link Double#MIN_VALUE}: no wrong answer reads as right. A
 * ratio 0/0 is 0, and any other ratio with denominator 0 is infinite.
 *
 * <p>An infinite answer can be judged only if s itself rounds to it; it is then the nearest that
 * the format has, and both errors are 0.
 *
 * @param exact the exact answer s
 * @param scale the error that the largest permitted change of the data by a relative amount of 1
 *     makes, to first order; at least |s|
 */
public record ScalarJudge(Dyadic exact, Dyadic scale) {

  /**
   * Returns the condition number scale / |s|, rounded to the nearest double; infinite where s is
   * zero.
   */
  public Condition condition() {
    return Condition.of(
        exact.signum() == 0 ? Double.POSITIVE_INFINITY : Dyadic.quotient(scale, exact.abs()));
  }

  /** Judges an answer, as {@link Problem#judge} describes it. */
  public Judgement judge(double[] answer) {
    if (answer == null || answer.length != 1) {
      return Judgement.without(Judgement.Standing.MALFORMED);
    }
    double value = answer[0];
    if (Double.isNaN(value)) {
      return Judgement.without(Judgement.Standing.NAN);
    }
    if (Double.isInfinite(value)) {
      return exact.doubleValue() == value
          ? Judgement.ofScalar(0, 0, Judgement.Rounding.NEAREST)
          : Judgement.without(Judgement.Standing.INFINITE);
    }
    Dyadic error = Dyadic.of(value).subtract(exact).abs();
    return Judgement.ofScalar(ratio(error, scale), ratio(error, exact.abs()), rounding(value));
  }

  private Judgement.Rounding rounding(double value) {
    if (exact.isNearest(value)) {
      return Judgement.Rounding.NEAREST;
    }
    return exact.isFaithful(value) ? Judgement.Rounding.FAITHFUL : Judgement.Rounding.OTHER;
  }

  private static double ratio(Dyadic error, Dyadic denominator) {
    if (error.signum() == 0) {
      return 0;
    }
    return denominator.signum() == 0
        ? Double.POSITIVE_INFINITY
        : Math.max(Dyadic.quotient(error, denominator), Double.MIN_VALUE);
  }
}
