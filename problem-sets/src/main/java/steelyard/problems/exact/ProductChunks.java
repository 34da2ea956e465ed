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

  // To make chunks for each vector would cost as much as several hundred products.
  private static final ThreadLocal<ProductChunks> OWN = ThreadLocal.withInitial(ProductChunks::new);

  private final long[] lows = new long[2 * PLACES];
  private final long[] middles = new long[2 * PLACES];
  private final long[] highs = new long[2 * PLACES];

  private ProductChunks() {}

  /** Adds products to two accumulators, by their signs. */
  static void add(double[] x, double[] y, ExactAccumulator... bySign) {
    ProductChunks chunks = OWN.get();
    for (int from = 0; from < x.length; from += LARGEST_BLOCK) {
      chunks.add(x, y, from, Math.min(x.length, from + LARGEST_BLOCK), bySign);
    }
  }

  private void add(double[] x, double[] y, int from, int to, ExactAccumulator... bySign) {
    long[] low = lows;
    long[] middle = middles;
    long[] high = highs;
    if (low.length <= PLACE_MASK || middle.length <= PLACE_MASK || high.length <= PLACE_MASK) {
      // Never so, but the compiler does not know it before, and checks every index.
      throw new IllegalStateException();
    }
    int least = Integer.MAX_VALUE;
    int greatest = 0;
    boolean special = false;
    for (int i = from; i < to; i++) {
      long xBits = Double.doubleToRawLongBits(x[i]);
      long yBits = Double.doubleToRawLongBits(y[i]);
      int xField = (int) (xBits >>> FRACTION_BITS) & EXPONENT_MASK;
      int yField = (int) (yBits >>> FRACTION_BITS) & EXPONENT_MASK;
      if ((normality(xField) | normality(yField)) < 0) {
        special = true;
        continue;
      }
      int exponent = xField + yField;
      least = Math.min(least, exponent);
      greatest = Math.max(greatest, exponent);
      long left = ((xBits & (IMPLICIT_BIT - 1)) | IMPLICIT_BIT) << (exponent & STEP_MASK);
      long right = (yBits & (IMPLICIT_BIT - 1)) | IMPLICIT_BIT;
      long product = left * right;
      int sign = (int) ((xBits ^ yBits) >>> 63);
      int place = ((exponent >>> STEP_BITS) + sign * PLACES) & PLACE_MASK;
      low[place] += product & 0xffff_ffffL;
      middle[place] += product >>> 32;
      high[place] += Math.multiplyHigh(left, right);
    }
    for (int place = least >>> STEP_BITS; place <= greatest >>> STEP_BITS; place++) {
      empty(place, false, bySign[0]);
      empty(place, true, bySign[1]);
    }
    if (special) {
      addSpecial(x, y, from, to, bySign);
    }
  }

  private void empty(int exponentPlace, boolean isNegative, ExactAccumulator target) {
    int place = isNegative ? exponentPlace + PLACES : exponentPlace;
    if ((lows[place] | middles[place] | highs[place]) == 0) {
      return;
    }
    int exponent = (exponentPlace << STEP_BITS) + LOWEST_EXPONENT;
    target.addInteger(lows[place], exponent, isNegative);
    target.addInteger(middles[place], exponent + 32, isNegative);
    target.addInteger(highs[place], exponent + 64, isNegative);
    lows[place] = 0;
    middles[place] = 0;
    highs[place] = 0;
  }

  private static void addSpecial(
      double[] x, double[] y, int from, int to, ExactAccumulator... bySign) {
    for (int i = from; i < to; i++) {
      if (isSpecial(x[i]) || isSpecial(y[i])) {
        int sign =
            (int) ((Double.doubleToRawLongBits(x[i]) ^ Double.doubleToRawLongBits(y[i])) >>> 63);
        bySign[sign].addProduct(x[i], y[i]);
      }
    }
  }

  private static boolean isSpecial(double value) {
    return normality(Math.getExponent(value) + Double.MAX_EXPONENT) < 0;
  }

  // Negative for the fields of zero, subnormal numbers, infinities and NaN.
  private static int normality(int field) {
    return ((field + 1) & (EXPONENT_MASK - 1)) - 1;
  }
}
