package steelyard.problems.exact;

/**
 * Adds products exactly, as integers: there are three chunks for every sign and every eighth
 * exponent, and what remains of the exponent is shifted into one of the factors, so that a product
 * is cut at fixed places.
 *
 * <p>This is the idea of a large superaccumulator carried over to products. Neither a rounded
 * product nor its error is computed, so that nothing overflows or underflows.
 *
 * @see <a href="https://arxiv.org/abs/1505.05571">Neal, Fast exact summation using small and large
 *     superaccumulators (2015)</a>
 */
final class ProductChunks {
  private static final int FRACTION_BITS = 52;
  private static final long IMPLICIT_BIT = 1L << FRACTION_BITS;
  private static final int EXPONENT_MASK = 0x7ff;
  private static final int STEP_BITS = 3;
  private static final int STEP_MASK = (1 << STEP_BITS) - 1;

  // For products of positive sign; those of negative sign follow.
  private static final int PLACES = 1 << (12 - STEP_BITS);
  private static final int PLACE_MASK = 2 * PLACES - 1;

  // What a unit in place 0 weighs: the lowest bits of two significands with exponent fields of 0.
  private static final int LOWEST_EXPONENT = 2 * (Binary64.LEAST_EXPONENT - 1);

  // The upper half of a product has 49 bits, so that as many fit a long.
  private static final int LARGEST_BLOCK = 1 << 14;

  private ProductChunks() {}

  /** Adds products to two accumulators, by their signs. */
  static void add(double[] x, double[] y, ExactAccumulator... bySign) {
    for (int from = 0; from < x.length; from += LARGEST_BLOCK) {
      add(x, y, from, Math.min(x.length, from + LARGEST_BLOCK), bySign);
    }
  }

  private static void add(double[] x, double[] y, int from, int to, ExactAccumulator... bySign) {
    // Local, so that the compiler knows their lengths.
    long[] low = new long[2 * PLACES];
    long[] middle = new long[2 * PLACES];
    long[] high = new long[2 * PLACES];
    for (int i = from; i < to; i++) {
      long xBits = Double.doubleToRawLongBits(x[i]);
      long yBits = Double.doubleToRawLongBits(y[i]);
      int xField = (int) (xBits >>> FRACTION_BITS) & EXPONENT_MASK;
      int yField = (int) (yBits >>> FRACTION_BITS) & EXPONENT_MASK;
      int sign = (int) ((xBits ^ yBits) >>> 63);
      if ((normality(xField) | normality(yField)) < 0) {
        bySign[sign].addProduct(x[i], y[i]);
        continue;
      }
      int exponent = xField + yField;
      long left = ((xBits & (IMPLICIT_BIT - 1)) | IMPLICIT_BIT) << (exponent & STEP_MASK);
      long right = (yBits & (IMPLICIT_BIT - 1)) | IMPLICIT_BIT;
      long product = left * right;
      int place = ((exponent >>> STEP_BITS) + sign * PLACES) & PLACE_MASK;
      low[place] += product & 0xffff_ffffL;
      middle[place] += product >>> 32;
      high[place] += Math.multiplyHigh(left, right);
    }
    for (int place = 0; place < 2 * PLACES; place++) {
      if ((low[place] | middle[place] | high[place]) == 0) {
        continue;
      }
      int sign = place / PLACES;
      boolean isNegative = sign == 1;
      ExactAccumulator target = bySign[sign];
      int exponent = ((place % PLACES) << STEP_BITS) + LOWEST_EXPONENT;
      target.addInteger(low[place], exponent, isNegative);
      target.addInteger(middle[place], exponent + 32, isNegative);
      target.addInteger(high[place], exponent + 64, isNegative);
    }
  }

  // Negative for the fields of zero, subnormal numbers, infinities and NaN.
  private static int normality(int field) {
    return ((field + 1) & (EXPONENT_MASK - 1)) - 1;
  }
}
