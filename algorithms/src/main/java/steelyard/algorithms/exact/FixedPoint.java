package steelyard.algorithms.exact;

/**
 * A fixed-point number wide enough to hold a sum exactly: signed 64-bit chunks, each weighing 2^32
 * times the one before, so that 32 bits of each are room for carries.
 *
 * <p>Whoever adds to the chunks calls {@link #carry} before one of them can overflow.
 *
 * @see <a href="https://arxiv.org/abs/1505.05571">Neal, Fast exact summation using small and large
 *     superaccumulators, 2015, section 3 (the small superaccumulator)</a>
 */
final class FixedPoint {

  private static final long LOW_32 = 0xFFFF_FFFFL;
  private static final int PRECISION = 53;

  /** The value is the sum of {@code chunks[k]} 2^(32 k + lowest). */
  final long[] chunks;

  private final int lowest;

  /**
   * Makes a zero.
   *
   * @param lowest the exponent of the least bit, at most -1074
   * @param size the number of chunks
   */
  FixedPoint(int lowest, int size) {
    this.lowest = lowest;
    this.chunks = new long[size];
  }

  /** Moves all carries up, so that every chunk but the last is in [0, 2^32). */
  void carry() {
    long carry = 0;
    int last = chunks.length - 1;
    for (int k = 0; k < last; k++) {
      long chunk = chunks[k] + carry;
      chunks[k] = chunk & LOW_32;
      carry = chunk >> 32;
    }
    chunks[last] += carry;
  }

  /**
   * Returns the double nearest to the value, ties to even; infinite beyond the largest double. A
   * zero is +0. Destroys the value.
   */
  double round() {
    carry();
    boolean negative = chunks[chunks.length - 1] < 0;
    if (negative) {
      negate();
    }
    int length = bitLength();
    // The last bit of the answer: 53 bits below the leading one, or that of the subnormals.
    int last = Math.max(length - PRECISION, Double.MIN_EXPONENT - PRECISION + 1 - lowest);
    long significand = bitsFrom(last);
    if (last > 0 && bit(last - 1) && ((significand & 1) == 1 || anyBitBelow(last - 1))) {
      significand++;
    }
    double magnitude = Math.scalb((double) significand, last + lowest);
    return negative ? -magnitude : magnitude;
  }

  private void negate() {
    for (int k = 0; k < chunks.length; k++) {
      chunks[k] = -chunks[k];
    }
    carry();
  }

  private int bitLength() {
    int k = chunks.length - 1;
    while (k > 0 && chunks[k] == 0) {
      k--;
    }
    return 32 * k + Long.SIZE - Long.numberOfLeadingZeros(chunks[k]);
  }

  /** Returns the bits from a position upwards, of which at most 53 may be there. */
  private long bitsFrom(int position) {
    int k = position >>> 5;
    int offset = position & 31;
    long bits = (chunk(k) >>> offset) | (chunk(k + 1) << (32 - offset));
    return offset == 0 ? bits : bits | (chunk(k + 2) << (64 - offset));
  }

  private long chunk(int k) {
    return k < chunks.length ? chunks[k] : 0;
  }

  private boolean bit(int position) {
    return ((chunks[position >>> 5] >>> (position & 31)) & 1) == 1;
  }

  private boolean anyBitBelow(int position) {
    int k = position >>> 5;
    if ((chunks[k] & ((1L << (position & 31)) - 1)) != 0) {
      return true;
    }
    for (k--; k >= 0; k--) {
      if (chunks[k] != 0) {
        return true;
      }
    }
    return false;
  }
}
