package steelyard.problems.generate;

import org.apache.commons.rng.UniformRandomProvider;

/** Random doubles and orders, made by operations that give the same bits everywhere. */
public final class Draw {
  private Draw() {}

  /** Returns a double uniform in [1/2, 1) times a power of two. */
  public static double magnitude(UniformRandomProvider random, int exponent) {
    double fraction = 0.5 + random.nextDouble() / 2;
    return Math.abs(exponent) < Double.MAX_EXPONENT
        ? fraction * powerOfTwo(exponent)
        : Math.scalb(fraction, exponent);
  }

  // Generators spend their time here, and this is several times as fast as Math.scalb.
  private static double powerOfTwo(int exponent) {
    return Double.longBitsToDouble((long) (exponent + Double.MAX_EXPONENT) << 52);
  }

  /** Returns {@link #magnitude} with a random sign. */
  public static double signed(UniformRandomProvider random, int exponent) {
    double magnitude = magnitude(random, exponent);
    return random.nextBoolean() ? magnitude : -magnitude;
  }

  /** Returns an integer uniform from {@code least} to {@code greatest}, both included. */
  public static int between(UniformRandomProvider random, int least, int greatest) {
    return least + random.nextInt(greatest - least + 1);
  }

  /**
   * Puts arrays of one length into the same random order, uniform among all orders (Fisher and
   * Yates).
   */
  public static void shuffle(UniformRandomProvider random, double[]... arrays) {
    for (int i = arrays[0].length - 1; i > 0; i--) {
      int j = random.nextInt(i + 1);
      for (double[] array : arrays) {
        double kept = array[i];
        array[i] = array[j];
        array[j] = kept;
      }
    }
  }
}
