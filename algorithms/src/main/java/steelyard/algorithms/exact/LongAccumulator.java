package steelyard.algorithms.exact;

/**
 * Correctly rounded sums and inner products, by adding integers in a fixed-point register that
 * spans the whole exponent range.
 *
 * <p>The answer is the double nearest to the exact value, ties to even, whatever the order of the
 * terms; it is infinite only if the exact value rounds to infinity, and a zero is +0. Terms or
 * factors that are not finite give what the same additions and multiplications give in IEEE
 * arithmetic: NaN, or an infinity.
 *
 * @see <a href="https://arxiv.org/abs/1505.05571">Neal, Fast exact summation using small and large
 *     superaccumulators, 2015, section 3 (the small superaccumulator)</a>
 * @see "Kulisch, Miranker, Computer Arithmetic in Theory and Practice, 1981 (the long accumulator
 *     for inner products)"
 */
public final class LongAccumulator {

  private static final long LOW_32 = 0xFFFF_FFFFL;
  private static final long FRACTION = (1L << 52) - 1;
  private static final long HIDDEN_BIT = 1L << 52;
  private static final int EXPONENT_MASK = 0x7FF;

  /** From 2^-1074 to 2^1024, and 2^31 terms. */
  private static final int SUM_CHUNKS = 67;

  /** From 2^-2148 to 2^2048, and 2^31 products. */
  private static final int DOT_CHUNKS = 133;

  /** Each term moves a chunk by less than 2^52, so that 2^11 - 2 of them keep it below 2^63. */
  private static final int TERMS_PER_CARRY = 2046;

  /** Each product moves a chunk by less than 2^42. */
  private static final int PRODUCTS_PER_CARRY = 1 << 20;

  private LongAccumulator() {}

  /**
   * Returns the correctly rounded sum.
   *
   * @param terms at most 2^31 - 1 terms, not modified
   * @return the double nearest to the exact sum; +0 for none
   */
  public static double sum(double[] terms) {
    FixedPoint register = new FixedPoint(-1074, SUM_CHUNKS);
    double nonFinite = 0;
    int from = 0;
    while (from < terms.length) {
      int to = from + Math.min(TERMS_PER_CARRY, terms.length - from);
      nonFinite += addTerms(register.chunks, terms, from, to);
      register.carry();
      from = to;
    }
    return nonFinite == 0 ? register.round() : nonFinite;
  }

  /** Adds the finite terms to the chunks and returns the sum of the others, 0 if none. */
  private static double addTerms(long[] chunks, double[] terms, int from, int to) {
    double nonFinite = 0;
    for (int i = from; i < to; i++) {
      long bits = Double.doubleToRawLongBits(terms[i]);
      int exponent = (int) (bits >>> 52) & EXPONENT_MASK;
      long significand = bits & FRACTION;
      if (exponent == EXPONENT_MASK) {
        nonFinite += terms[i];
        continue;
      } else if (exponent == 0) {
        exponent = 1;
      } else {
        significand |= HIDDEN_BIT;
      }
      long sign = bits >> 63;
      long signed = (significand ^ sign) - sign;
      int chunk = (exponent - 1) >>> 5;
      int shift = (exponent - 1) & 31;
      chunks[chunk] += (signed << shift) & LOW_32;
      chunks[chunk + 1] += signed >> (32 - shift);
    }
    return nonFinite;
  }

  /**
   * Returns the correctly rounded inner product. Products are formed as integers, so that none
   * overflows or underflows whatever the exponents.
   *
   * @param x at most 2^31 - 1 entries, not modified
   * @param y as many entries, not modified
   * @return the double nearest to the exact sum of x[i] y[i]; +0 for none
   */
  public static double dot(double[] x, double[] y) {
    FixedPoint register = new FixedPoint(-2148, DOT_CHUNKS);
    double nonFinite = 0;
    int from = 0;
    while (from < x.length) {
      int to = from + Math.min(PRODUCTS_PER_CARRY, x.length - from);
      nonFinite += addProducts(register.chunks, x, y, from, to);
      register.carry();
      from = to;
    }
    return nonFinite == 0 ? register.round() : nonFinite;
  }

  /** Adds the finite products to the chunks and returns the sum of the others, 0 if none. */
  private static double addProducts(long[] chunks, double[] x, double[] y, int from, int to) {
    double nonFinite = 0;
    for (int i = from; i < to; i++) {
      long xBits = Double.doubleToRawLongBits(x[i]);
      long yBits = Double.doubleToRawLongBits(y[i]);
      int xExponent = (int) (xBits >>> 52) & EXPONENT_MASK;
      int yExponent = (int) (yBits >>> 52) & EXPONENT_MASK;
      if (xExponent == EXPONENT_MASK || yExponent == EXPONENT_MASK) {
        nonFinite += x[i] * y[i];
        continue;
      }
      long xSignificand = significand(xBits, xExponent);
      long ySignificand = significand(yBits, yExponent);
      int position = Math.max(xExponent, 1) + Math.max(yExponent, 1) - 2;
      int chunk = position >>> 5;
      int shift = position & 31;
      // The signed product of up to 106 bits, shifted by up to 31, over four chunks.
      long high = Math.multiplyHigh(xSignificand, ySignificand);
      long low = xSignificand * ySignificand;
      chunks[chunk] += (low << shift) & LOW_32;
      chunks[chunk + 1] += (low >>> (32 - shift)) & LOW_32;
      chunks[chunk + 2] += ((high << shift) | ((low >>> 32) >>> (32 - shift))) & LOW_32;
      chunks[chunk + 3] += high >> (32 - shift);
    }
    return nonFinite;
  }

  private static long significand(long bits, int exponent) {
    long magnitude = (bits & FRACTION) | (exponent == 0 ? 0 : HIDDEN_BIT);
    long sign = bits >> 63;
    return (magnitude ^ sign) - sign;
  }
}
