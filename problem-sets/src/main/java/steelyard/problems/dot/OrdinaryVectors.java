package steelyard.problems.dot;

import java.util.function.IntSupplier;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.exact.Binary64;
import steelyard.problems.generate.Draw;

/** Independent random entries, with no other structure than their signs and exponents. */
final class OrdinaryVectors {
  // Factors so wide apart that their products still stay clear of both ends of the format.
  private static final int WIDEST_EXPONENT = 470;

  // From here on a factor times 2^27 + 1, the usual way to split it, overflows.
  private static final int SPLIT_OVERFLOWS_EXPONENT = 998;

  private OrdinaryVectors() {}

  static Vectors sameSign(Family.Request request, UniformRandomProvider random) {
    double sign = random.nextBoolean() ? 1 : -1;
    Vectors vectors = randomSigns(request, random);
    for (int i = 0; i < request.size(); i++) {
      vectors.y()[i] = sign * Math.copySign(vectors.y()[i], vectors.x()[i]);
    }
    return vectors;
  }

  static Vectors randomSigns(Family.Request request, UniformRandomProvider random) {
    IntSupplier ordinary = () -> Draw.between(random, -3, 0);
    return signed(request.size(), random, ordinary, ordinary);
  }

  static Vectors wideExponent(Family.Request request, UniformRandomProvider random) {
    IntSupplier wide = () -> Draw.between(random, -WIDEST_EXPONENT, WIDEST_EXPONENT);
    return signed(request.size(), random, wide, wide);
  }

  /** Huge factors beside small ones: the sum of the products' absolute values is below 2^1022. */
  static Vectors nearOverflow(Family.Request request, UniformRandomProvider random) {
    int sizeBits = Integer.SIZE - Integer.numberOfLeadingZeros(request.size());
    IntSupplier huge =
        () ->
            Draw.between(
                random, SPLIT_OVERFLOWS_EXPONENT, Binary64.OVERFLOW_EXPONENT - 2 - sizeBits);
    return signed(request.size(), random, huge, () -> Draw.between(random, -3, 0));
  }

  /** Products whose last bits fall below the least double, and some that do so themselves. */
  static Vectors nearUnderflow(Family.Request request, UniformRandomProvider random) {
    IntSupplier small = () -> Draw.between(random, -537, -512);
    return signed(request.size(), random, small, small);
  }

  private static Vectors signed(
      int size, UniformRandomProvider random, IntSupplier xExponent, IntSupplier yExponent) {
    double[] x = new double[size];
    double[] y = new double[size];
    for (int i = 0; i < size; i++) {
      x[i] = Draw.signed(random, xExponent.getAsInt());
      y[i] = Draw.signed(random, yExponent.getAsInt());
    }
    return new Vectors(x, y);
  }
}
