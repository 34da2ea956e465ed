package steelyard.harness.benchmark;

import java.util.Random;

/** Random vectors with exponents in one binade ("narrow") or from -300 to 300 ("wide"). */
final class Vectors {
  private static final int SPREAD = 300;

  private Vectors() {}

  static double[] random(String spread, String size, long seed) {
    boolean wide = spread.equals("wide");
    Random random = new Random(seed);
    double[] x = new double[Integer.parseInt(size)];
    for (int i = 0; i < x.length; i++) {
      double magnitude = 1 + random.nextDouble();
      int exponent = wide ? random.nextInt(2 * SPREAD + 1) - SPREAD : 0;
      x[i] = Math.scalb(random.nextBoolean() ? magnitude : -magnitude, exponent);
    }
    return x;
  }
}
