package steelyard.problems.exact;

import java.util.SplittableRandom;

/** Test inputs: finite doubles over every exponent, subnormal and extreme ones included. */
final class RandomDoubles {
  private final SplittableRandom random;

  RandomDoubles(long seed) {
    random = new SplittableRandom(seed);
  }

  /** Any finite double, its exponent uniform over the whole format. */
  double any() {
    double value;
    do {
      value = Double.longBitsToDouble(random.nextLong());
    } while (!Double.isFinite(value));
    return value;
  }

  /** A double whose exponent is near a given one, so that sums of several cancel and carry. */
  double near(int exponent, int spread) {
    double value = Math.scalb(random.nextDouble() * 2 - 1, exponent + random.nextInt(spread));
    return Double.isFinite(value) ? value : Math.copySign(Double.MAX_VALUE, value);
  }

  int below(int limit) {
    return random.nextInt(limit);
  }

  double[] array(int length) {
    int exponent = below(2090) - 1070;
    int spread = 1 + below(120);
    boolean wide = random.nextBoolean();
    double[] values = new double[length];
    for (int i = 0; i < length; i++) {
      values[i] = wide ? any() : near(exponent, spread);
    }
    return values;
  }
}
