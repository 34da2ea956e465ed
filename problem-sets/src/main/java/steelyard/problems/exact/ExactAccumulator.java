package steelyard.problems.exact;

import java.math.BigInteger;
import java.util.Arrays;

/**
 * A fixed-point number wide enough for any sum of doubles and of products of two doubles, so that
 * nothing is ever rounded away. It takes 2^63 terms and more, in any order, and allocates nothing
 * per term.
 *
 * <p>The number is held in chunks of 32 bits, each in a {@code long} whose upper half gathers
 * carries; the carries are passed on only now and then.
 *
 * @see <a href="https://arxiv.org/abs/1505.05571">Neal, Fast exact summation using small and large
 *     superaccumulators (2015)</a>, the small superaccumulator; its range is doubled here for
 *     products
 */
public final class ExactAccumulator {

  private static final int CHUNK_BITS = 32;
  private static final long CHUNK_MASK = 0xffff_ffffL;

  // Bit 0 of chunk 0 weighs 2^-2176, below the lowest bit of a product, 2^-2148; the highest chunk
  // starts at 2^2080, above any product, and is signed.
  private static final int LOWEST_EXPONENT = -2176;
  private static final int CHUNKS = 134;

  // A term adds less than 2^53 to any chunk, so that 512 leave a wide margin below 2^63.
  private static final int TERMS_BETWEEN_CARRIES = 512;

  private static final long IMPLICIT_BIT = 1L << 52;
  private static final int EXPONENT_MASK = 0x7ff;

  // What is added to the exponent field of a double to place the lowest bit of its significand.
  private static final int FIELD_TO_POSITION = Binary64.LEAST_EXPONENT - 1 - LOWEST_EXPONENT;

  private final long[] chunks = new long[CHUNKS];
  private int termsLeft = TERMS_BETWEEN_CARRIES;

  /** Makes an accumulator that holds zero. */
  public ExactAccumulator() {}

  /** Returns the exact sum of terms. */
  public static Dyadic sum(double... terms) {
    ExactAccumulator accumulator = new ExactAccumulator();
    ExactSums.add(terms, accumulator, accumulator);
    return accumulator.value();
  }

  /**
   * Returns the exact dot product of two vectors.
   *
   * @throws IllegalArgumentException if they differ in length
   */
  public static Dyadic dot(double[] x, double[] y) {
    ExactAccumulator accumulator = new ExactAccumulator();
    accumulator.addProducts(x, y);
    return accumulator.value();
  }

  /**
   * Adds a term.
   *
   * @throws IllegalArgumentException if it is infinite or NaN
   */
  public void add(double term) {
    long bits = Double.doubleToRawLongBits(term);
    int field = (int) (bits >>> 52) & EXPONENT_MASK;
    long significand = bits & (IMPLICIT_BIT - 1);
    if (field == 0) {
      if (significand == 0) {
        return;
      }
      field = 1;
    } else {
      requireFinite(field);
      significand |= IMPLICIT_BIT;
    }
    int position = field + FIELD_TO_POSITION;
    int chunk = position >>> 5;
    int shift = position & 31;
    long sign = bits >> 63;
    long signed = (significand ^ sign) - sign;
    chunks[chunk] += (signed << shift) & CHUNK_MASK;
    chunks[chunk + 1] += signed >> (CHUNK_BITS - shift);
    countTerm();
  }

  /**
   * Adds the absolute value of a term.
   *
   * @throws IllegalArgumentException if it is infinite or NaN
   */
  public void addAbs(double term) {
    add(Math.abs(term));
  }

  /**
   * Adds a product, exactly, whatever its size.
   *
   * @throws IllegalArgumentException if a factor is infinite or NaN
   */
  public void addProduct(double x, double y) {
    double product = x * y;
    if (ErrorFree.isProductSafe(product)) {
      add(product);
      add(Math.fma(x, y, -product));
    } else {
      addIntegerProduct(x, y);
    }
  }

  /**
   * Adds the products of the entries of two vectors, exactly, whatever their size.
   *
   * @throws IllegalArgumentException if the vectors differ in length, or an entry is infinite or
   *     NaN
   */
  public void addProducts(double[] x, double[] y) {
    ExactSums.addProducts(x, y, this, this);
  }

  /**
   * Adds the absolute value of a product, exactly, whatever its size.
   *
   * @throws IllegalArgumentException if a factor is infinite or NaN
   */
  public void addAbsProduct(double x, double y) {
    addProduct(Math.abs(x), Math.abs(y));
  }

  /**
   * Adds an integer times the weight of the lowest bit of the doubles with a given exponent field.
   *
   * @throws IllegalArgumentException if the field is that of infinities and NaN
   */
  void addMultiple(long magnitude, int field, boolean negative) {
    requireFinite(field);
    addInteger(magnitude, Math.max(field, 1) + Binary64.LEAST_EXPONENT - 1, negative);
  }

  /** Adds an integer below 2^63 times a power of two, or its negative. */
  void addInteger(long magnitude, int exponent, boolean negative) {
    if (magnitude == 0) {
      return;
    }
    int position = exponent - LOWEST_EXPONENT;
    int chunk = position >>> 5;
    int shift = position & 31;
    long sign = negative ? -1 : 0;
    long rest = magnitude >>> (CHUNK_BITS - shift);
    addSigned(chunk, (magnitude << shift) & CHUNK_MASK, sign);
    addSigned(chunk + 1, rest & CHUNK_MASK, sign);
    addSigned(chunk + 2, rest >>> CHUNK_BITS, sign);
    countTerm();
  }

  /** Adds another accumulator's number. */
  public void add(ExactAccumulator other) {
    other.passCarries();
    passCarries();
    for (int i = 0; i < CHUNKS; i++) {
      chunks[i] += other.chunks[i];
    }
    countTerm();
  }

  /** Returns the number, exactly. */
  public Dyadic value() {
    passCarries();
    int top = CHUNKS - 1;
    while (top > 0 && chunks[top] == 0) {
      top--;
    }
    int bottom = 0;
    while (bottom < top && chunks[bottom] == 0) {
      bottom++;
    }
    byte[] digits = new byte[(top - bottom) * 4 + 8];
    writeBigEndian(chunks[top], digits, 0, 8);
    for (int i = top - 1, at = 8; i >= bottom; i--, at += 4) {
      writeBigEndian(chunks[i], digits, at, 4);
    }
    return new Dyadic(new BigInteger(digits), bottom * CHUNK_BITS + LOWEST_EXPONENT);
  }

  /** Returns the number correctly rounded, as {@link Dyadic#doubleValue()} does. */
  public double round() {
    passCarries();
    int bottom = 0;
    while (bottom < CHUNKS - 1 && chunks[bottom] == 0) {
      bottom++;
    }
    boolean negative = chunks[CHUNKS - 1] < 0;
    int top = CHUNKS - 1;
    while (top > bottom && magnitude(top, bottom, negative) == 0) {
      top--;
    }
    long leading = magnitude(top, bottom, negative);
    if (leading > CHUNK_MASK) {
      return negative ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
    }
    if (leading == 0) {
      return 0;
    }
    // The leading 64 bits of the magnitude, the lowest of them set if anything is left below.
    int lost = Long.numberOfLeadingZeros(leading) - CHUNK_BITS;
    long second = top > 0 ? magnitude(top - 1, bottom, negative) : 0;
    long third = top > 1 ? magnitude(top - 2, bottom, negative) : 0;
    long window = (leading << CHUNK_BITS | second) << lost | third >>> (CHUNK_BITS - lost);
    boolean isCut = (third << lost & CHUNK_MASK) != 0 || bottom < top - 2;
    int exponent = top * CHUNK_BITS + LOWEST_EXPONENT - CHUNK_BITS - lost;
    double rounded = rounded(isCut ? window | 1 : window, exponent);
    return negative ? -rounded : rounded;
  }

  // A chunk of the absolute value, after carries were passed: a negative number's chunks are those
  // of its complement.
  private long magnitude(int chunk, int bottom, boolean negative) {
    if (!negative || chunk < bottom) {
      return chunks[chunk];
    }
    long complement = chunk == bottom ? -chunks[chunk] : -1 - chunks[chunk];
    return chunk == CHUNKS - 1 ? complement : complement & CHUNK_MASK;
  }

  // The double nearest to a number of 64 bits, the highest one set, times a power of two.
  private static double rounded(long window, int exponent) {
    int dropped = Math.max(Long.SIZE - Binary64.PRECISION, Binary64.LEAST_EXPONENT - exponent);
    if (dropped > Long.SIZE) {
      return 0;
    }
    long kept = dropped == Long.SIZE ? 0 : window >>> dropped;
    long half = 1L << (dropped - 1);
    long rest = window & (half | (half - 1));
    boolean up = Long.compareUnsigned(rest, half) > 0 || (rest == half && (kept & 1) == 1);
    return Math.scalb((double) (up ? kept + 1 : kept), exponent + dropped);
  }

  /** Makes the number zero again. */
  public void reset() {
    Arrays.fill(chunks, 0);
    termsLeft = TERMS_BETWEEN_CARRIES;
  }

  private void addIntegerProduct(double x, double y) {
    long xBits = Double.doubleToRawLongBits(x);
    long yBits = Double.doubleToRawLongBits(y);
    int xField = (int) (xBits >>> 52) & EXPONENT_MASK;
    int yField = (int) (yBits >>> 52) & EXPONENT_MASK;
    requireFinite(xField);
    requireFinite(yField);
    long xSignificand = significand(xBits, xField);
    long ySignificand = significand(yBits, yField);
    long high = Math.multiplyHigh(xSignificand, ySignificand);
    long low = xSignificand * ySignificand;
    int position =
        Math.max(xField, 1)
            + Math.max(yField, 1)
            + 2 * (Binary64.LEAST_EXPONENT - 1)
            - LOWEST_EXPONENT;
    long sign = (xBits ^ yBits) >> 63;
    addPieces(high, low, position, sign);
    countTerm();
  }

  // The 106-bit integer high:low times 2^position, in pieces that each fit a chunk.
  private void addPieces(long high, long low, int position, long sign) {
    int chunk = position >>> 5;
    int shift = position & 31;
    long carried = 0;
    for (int i = 0; i < 4; i++) {
      long word = (i < 2 ? low : high) >>> (CHUNK_BITS * (i & 1)) & CHUNK_MASK;
      long shifted = (word << shift) + carried;
      addSigned(chunk + i, shifted & CHUNK_MASK, sign);
      carried = shifted >>> CHUNK_BITS;
    }
    addSigned(chunk + 4, carried, sign);
  }

  private void addSigned(int chunk, long piece, long sign) {
    chunks[chunk] += (piece ^ sign) - sign;
  }

  private static long significand(long bits, int field) {
    long fraction = bits & (IMPLICIT_BIT - 1);
    return field == 0 ? fraction : fraction | IMPLICIT_BIT;
  }

  private void countTerm() {
    if (--termsLeft == 0) {
      passCarries();
    }
  }

  // Afterwards every chunk but the highest lies in [0, 2^32).
  private void passCarries() {
    long carry = 0;
    for (int i = 0; i < CHUNKS - 1; i++) {
      long chunk = chunks[i] + carry;
      chunks[i] = chunk & CHUNK_MASK;
      carry = chunk >> CHUNK_BITS;
    }
    chunks[CHUNKS - 1] += carry;
    termsLeft = TERMS_BETWEEN_CARRIES;
  }

  private static void writeBigEndian(long value, byte[] digits, int at, int length) {
    for (int i = 0; i < length; i++) {
      digits[at + i] = (byte) (value >> (8 * (length - 1 - i)));
    }
  }

  private static void requireFinite(int field) {
    if (field == EXPONENT_MASK) {
      throw new IllegalArgumentException("a finite double is wanted, but it is infinite or NaN");
    }
  }
}
