package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.generate.Draw;

/**
 * Positive terms of ordinary size, among which, after three quarters, stands one term that
 * outweighs all before it, and whose negative is the last.
 *
 * <p>An algorithm that corrects the running sum by what the new term lost forgets the running sum
 * when the new term is the larger one.
 */
final class LateDominantTerms {
  // With at least this share of the small terms the condition number is 1.25 or more.
  private static final double LEAST_SHARE = 0.125;

  private LateDominantTerms() {}

  static double[] generate(Family.Request request, UniformRandomProvider random) {
    int size = request.size();
    int dominant = Math.min(size - 2, 3 * size / 4);
    double[] terms = new double[size];
    for (int i = 0; i < size - 1; i++) {
      terms[i] = i == dominant ? 0 : Draw.magnitude(random, 1);
    }
    double share = Math.max(LEAST_SHARE, (request.condition() - 1) / 2);
    double large = ExactAccumulator.sum(terms).multiply(Dyadic.of(share)).doubleValue();
    terms[dominant] = large;
    terms[size - 1] = -large;
    return terms;
  }
}
