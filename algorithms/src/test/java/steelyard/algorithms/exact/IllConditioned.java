package steelyard.algorithms.exact;

import java.math.BigDecimal;
import java.util.Random;

/**
 * Inner products and sums with heavy cancellation, made as in Ogita, Rump, Oishi, Accurate sum and
 * dot product, SIAM J. Sci. Comput. 26 (2005), section 6, Algorithm 6.1: random exponents first,
 * then factors that cancel what has been summed so far to fewer and fewer bits.
 */
public final class IllConditioned {

  /** A pair of vectors of the same length. */
  public record Pair(double[] x, double[] y) {}

  private IllConditioned() {}

  /**
   * Returns an inner product.
   *
   * @param n an even number of products, at least 6
   * @param bits about the binary logarithm of the condition number
   */
  public static Pair dot(int n, int bits, Random random) {
    double[] x = new double[n];
    double[] y = new double[n];
    BigDecimal partial = BigDecimal.ZERO;
    int half = n / 2;
    for (int i = 0; i < n; i++) {
      int exponent;
      if (i < half) {
        exponent = i == 0 ? bits / 2 + 1 : (int) Math.round(random.nextDouble() * bits / 2);
      } else {
        exponent = (int) Math.round(bits / 2.0 * (n - 1 - i) / (n - 1 - half));
      }
      x[i] = Math.scalb(symmetric(random), exponent);
      y[i] = Math.scalb(symmetric(random), exponent);
      if (i >= half) {
        BigDecimal wanted = new BigDecimal(y[i]).subtract(partial);
        y[i] = wanted.doubleValue() / x[i];
      }
      partial = partial.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])));
    }
    shuffle(x, y, random);
    return new Pair(x, y);
  }

  /** Returns a sum of 2n terms: the products of an inner product and their rounding errors. */
  public static double[] sum(int n, int bits, Random random) {
    Pair pair = dot(n, bits, random);
    double[] terms = new double[2 * n];
    for (int i = 0; i < n; i++) {
      terms[i] = pair.x[i] * pair.y[i];
      terms[n + i] = Math.fma(pair.x[i], pair.y[i], -terms[i]);
    }
    shuffle(terms, new double[2 * n], random);
    return terms;
  }

  private static double symmetric(Random random) {
    return 2 * random.nextDouble() - 1;
  }

  private static void shuffle(double[] x, double[] y, Random random) {
    for (int i = x.length - 1; i > 0; i--) {
      int j = random.nextInt(i + 1);
      double swappedX = x[i];
      double swappedY = y[i];
      x[i] = x[j];
      y[i] = y[j];
      x[j] = swappedX;
      y[j] = swappedY;
    }
  }
}
