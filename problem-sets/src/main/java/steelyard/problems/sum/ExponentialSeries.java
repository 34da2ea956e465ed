package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.UnreachableException;
import steelyard.problems.exact.Dyadic;

/**
 * The terms of the power series of exp(-t): alternating, growing at first, and far larger than
 * their sum when t is.
 *
 * <p>Their absolute values add up to exp(t), so that the condition number is exp(2t). Each term is
 * the exact fraction correctly rounded. Above exp(2t) = 1e16 those roundings alone outweigh
 * exp(-t), and the condition number of the stored terms grows no further. A term below the least
 * normal double is stored as zero.
 */
final class ExponentialSeries {
  // A short t keeps its exact powers short.
  private static final double STEP_OF_T = 0x1p-16;

  private static final double JITTER = 0.125;

  // So many terms are enough for every condition number within reach.
  private static final int MANY_TERMS = 200;

  // Smaller t would leave one term alone; exp(2t) = 1.65 is within a factor of two of 1.
  private static final double LEAST_T = 0.25;

  // What is left out may change the sum, and with it the condition number, by this factor at most.
  private static final double TOLERATED_TAIL = 0.125;

  private ExponentialSeries() {}

  static double[] generate(Family.Request request, UniformRandomProvider random) {
    double t = argument(request.condition(), random);
    Dyadic factor = Dyadic.of(-t);
    Dyadic power = Dyadic.ONE;
    Dyadic factorial = Dyadic.ONE;
    double[] terms = new double[request.size()];
    for (int k = 0; k < terms.length; k++) {
      double term = Dyadic.quotient(power, factorial);
      if (Math.abs(term) < Double.MIN_NORMAL) {
        return terms;
      }
      terms[k] = term;
      power = power.multiply(factor);
      factorial = factorial.multiply(Dyadic.of(k + 1L));
    }
    requireConverged(terms.length, t, Dyadic.quotient(power, factorial));
    return terms;
  }

  /**
   * Returns the largest condition number for which so many terms come near enough to exp(-t). It
   * leaves room for the jitter of t, and is a power of two.
   */
  static double largestCondition(int count) {
    double condition = 1;
    while (condition < 1e16 && converges(count, StrictMath.log(condition * 2) / 2 + JITTER)) {
      condition *= 2;
    }
    return condition;
  }

  private static boolean converges(int count, double t) {
    double logOfOmitted = count * StrictMath.log(t);
    for (int k = 2; k <= count && k <= MANY_TERMS; k++) {
      logOfOmitted -= StrictMath.log(k);
    }
    return count >= MANY_TERMS || (count >= t && logOfOmitted < StrictMath.log(TOLERATED_TAIL) - t);
  }

  private static double argument(double condition, UniformRandomProvider random) {
    double jitter = (random.nextDouble() - 0.5) * 2 * JITTER;
    double t = Math.max(LEAST_T, StrictMath.log(condition) / 2 + jitter);
    return Math.rint(t / STEP_OF_T) * STEP_OF_T;
  }

  // The tail of an alternating series is below its first term, once the terms fall.
  private static void requireConverged(int count, double t, double omitted) {
    double limit = TOLERATED_TAIL * StrictMath.exp(-t);
    if (count < t || Math.abs(omitted) > limit) {
      throw new UnreachableException(
          "the first %s terms of the series are too few to add up to exp(-t) at this condition"
                  .formatted(count)
              + " number; a larger size is wanted");
    }
  }
}
