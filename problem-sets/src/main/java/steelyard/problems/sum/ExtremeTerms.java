package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.exact.Binary64;
import steelyard.problems.generate.Draw;

/** Terms at the two ends of the format. */
final class ExtremeTerms {
  private ExtremeTerms() {}

  /**
   * Large positive terms, any two of which overflow, then slightly smaller negative ones. The sum
   * is below 2^1024: each pair leaves less than a share of 1/n, and an odd term is below 2^1023.
   */
  static double[] overflow(Family.Request request, UniformRandomProvider random) {
    int size = request.size();
    int pairs = size / 2;
    double[] terms = new double[size];
    for (int i = 0; i < pairs; i++) {
      double large = Math.scalb(0.75 + random.nextDouble() / 4, Binary64.OVERFLOW_EXPONENT - 1) * 2;
      terms[i] = Math.min(large, Double.MAX_VALUE);
      terms[size - 1 - i] = -terms[i] * (1 - random.nextDouble() / size);
    }
    if (size % 2 == 1) {
      terms[pairs] = Draw.magnitude(random, Binary64.OVERFLOW_EXPONENT - 1);
    }
    return terms;
  }

  /** Terms of random sign from the least double up to small normal ones. */
  static double[] subnormal(Family.Request request, UniformRandomProvider random) {
    double[] terms = new double[request.size()];
    for (int i = 0; i < terms.length; i++) {
      int exponent = Draw.between(random, Binary64.LEAST_EXPONENT + 1, Double.MIN_EXPONENT + 10);
      terms[i] = Draw.signed(random, exponent);
    }
    return terms;
  }
}
