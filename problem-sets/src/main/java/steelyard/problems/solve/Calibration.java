package steelyard.problems.solve;

import java.util.function.DoubleFunction;
import steelyard.problems.solve.certificate.ConditionEstimate;

/**
 * Finds the parameter of a generator at which the achieved condition number is the target. The
 * condition number is taken to grow with the parameter, about in proportion as a first guess; where
 * the stored format or the size does not allow the target, the nearest system seen is returned.
 */
final class Calibration {
  private static final int LARGEST_TRIALS = 10;
  private static final double SMALLEST_STEP = 1.0001;
  private static final double CLOSE_ENOUGH = 1.4;

  private Calibration() {}

  /**
   * Returns the system whose estimated condition number is nearest to the target in ratio.
   *
   * @param target the condition number wanted
   * @param largest the largest parameter to try; the smallest is 1
   * @param generator makes the system of a parameter, from the same random factors each time
   */
  static LinearSystem nearest(
      double target, double largest, DoubleFunction<LinearSystem> generator) {
    double low = 1;
    double high = largest;
    double parameter = Math.min(target, largest);
    LinearSystem best = null;
    double smallestRatio = Double.POSITIVE_INFINITY;
    for (int trial = 0; trial < LARGEST_TRIALS; trial++) {
      LinearSystem system = generator.apply(parameter);
      double achieved = shortened(ConditionEstimate.of(system.a(), system.b()));
      double ratio = Math.max(achieved / target, target / achieved);
      if (best == null || ratio < smallestRatio) {
        best = system;
        smallestRatio = ratio;
      }
      if (achieved < target) {
        low = parameter;
      } else {
        high = parameter;
      }
      if (ratio <= CLOSE_ENOUGH || high / low < SMALLEST_STEP) {
        break;
      }
      double next = parameter * (target / achieved);
      parameter = next > low && next < high ? next : Math.sqrt(low) * Math.sqrt(high);
    }
    return best;
  }

  // To 21 significant bits, so that how the estimate was rounded does not decide which problem is
  // made.
  private static double shortened(double estimate) {
    long half = 1L << 31;
    return Double.longBitsToDouble(Double.doubleToLongBits(estimate) + half & -2 * half);
  }
}
