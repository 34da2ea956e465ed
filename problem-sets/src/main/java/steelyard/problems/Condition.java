package steelyard.problems;

import java.util.OptionalDouble;

/**
 * An achieved condition number.
 *
 * @param kappa the condition number that pairs with the (normwise) backward error; infinite when
 *     the exact answer is zero
 * @param componentwise the one that pairs with the componentwise backward error, where the task
 *     tells them apart
 */
public record Condition(double kappa, OptionalDouble componentwise) {

  /** Returns a condition number of a task that has only one. */
  public static Condition of(double kappa) {
    return new Condition(kappa, OptionalDouble.empty());
  }
}
