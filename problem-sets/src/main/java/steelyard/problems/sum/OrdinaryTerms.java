package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.generate.Draw;

/** Independent random terms, with no other structure than their signs and exponents. */
final class OrdinaryTerms {
  // The widest range that leaves the room which the trait no-intermediate-overflow promises.
  private static final int WIDEST_EXPONENT = 950;

  private OrdinaryTerms() {}

  static double[] sameSign(Family.Request request, UniformRandomProvider random) {
    double sign = random.nextBoolean() ? 1 : -1;
    double[] terms = new double[request.size()];
    for (int i = 0; i < terms.length; i++) {
      terms[i] = sign * Draw.magnitude(random, Draw.between(random, -3, 0));
    }
    return terms;
  }

  static double[] randomSigns(Family.Request request, UniformRandomProvider random) {
    double[] terms = new double[request.size()];
    for (int i = 0; i < terms.length; i++) {
      terms[i] = Draw.signed(random, Draw.between(random, -3, 0));
    }
    return terms;
  }

  static double[] wideExponent(Family.Request request, UniformRandomProvider random) {
    double[] terms = new double[request.size()];
    for (int i = 0; i < terms.length; i++) {
      terms[i] = Draw.signed(random, Draw.between(random, -WIDEST_EXPONENT, WIDEST_EXPONENT));
    }
    return terms;
  }
}
