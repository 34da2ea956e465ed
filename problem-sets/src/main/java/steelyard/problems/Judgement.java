package steelyard.problems;

import java.util.OptionalDouble;

/**
 * What an answer amounts to. The errors are meaningful only where the standing is {@link
 * Standing#OK}; elsewhere they are NaN.
 *
 * @param standing whether the answer could be judged
 * @param backwardError the (normwise) backward error
 * @param forwardError the relative forward error
 * @param componentwiseBackwardError where the task has one
 * @param componentwiseForwardError the largest relative error of a component, where the task has
 *     one
 * @param rounding how the answer sits among the doubles
 */
public record Judgement(
    Standing standing,
    double backwardError,
    double forwardError,
    OptionalDouble componentwiseBackwardError,
    OptionalDouble componentwiseForwardError,
    Rounding rounding) {

  /** Whether an answer could be judged. */
  public enum Standing {
    /** It was judged. */
    OK,
    /** It is, or contains, a NaN. */
    NAN,
    /** It is, or contains, an infinity although the exact answer is finite. */
    INFINITE,
    /** It is null or has the wrong length. */
    MALFORMED,
    /**
     * The reference's own error bound exceeds both 1 % of the forward error and u/1000, so that the
     * error cannot be told.
     */
    UNCERTIFIED
  }

  /** How an answer sits among the doubles. */
  public enum Rounding {
    /** Every entry is a double nearest to the exact one. */
    NEAREST,
    /** Every entry is one of the two doubles around the exact one, or equals it. */
    FAITHFUL,
    /** Some entry is neither, or it could not be proved. */
    OTHER
  }

  /** Returns the judgement of a scalar answer, which has no componentwise errors. */
  public static Judgement ofScalar(double backwardError, double forwardError, Rounding rounding) {
    return new Judgement(
        Standing.OK,
        backwardError,
        forwardError,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        rounding);
  }

  /** Returns the judgement of an answer that could not be judged. */
  public static Judgement without(Standing standing) {
    return new Judgement(
        standing,
        Double.NaN,
        Double.NaN,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Rounding.OTHER);
  }
}
