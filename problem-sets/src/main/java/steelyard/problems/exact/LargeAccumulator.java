package steelyard.problems.exact;

import java.util.Arrays;

/**
 * Adds many terms exactly: there is a chunk for every sign and exponent, to which a term only adds
 * its fraction as an integer. A chunk's hidden bits are known from the number of its terms.
 *
 * @see <a href="https://arxiv.org/abs/1505.05571">Neal, Fast exact summation using small and large
 *     superaccumulators (2015)</a>, the large superaccumulator
 */
final class LargeAccumulator {
  private static final int FRACTION_BITS = 52;
  private static final long FRACTION_MASK = (1L << FRACTION_BITS) - 1;
  private static final int CHUNKS = 1 << 12;
  private static final int NEGATIVE_CHUNKS = CHUNKS / 2;

  // So many significands add up to less than 2^63.
  private static final int CHUNK_TERMS = 1024;

  private final long[] fractions = new long[CHUNKS];
  private final int[] termsLeft = new int[CHUNKS];
  private final ExactAccumulator[] bySign;

  /** Makes one that adds terms to two accumulators, by their signs. */
  LargeAccumulator(ExactAccumulator... bySign) {
    Arrays.fill(termsLeft, CHUNK_TERMS);
    this.bySign = bySign;
  }

  /** Adds terms. */
  void add(double[] terms) {
    // Local, because the compiler cannot know that emptying a chunk leaves the fields alone.
    long[] sums = fractions;
    int[] left = termsLeft;
    for (double term : terms) {
      long bits = Double.doubleToRawLongBits(term);
      int at = (int) (bits >>> FRACTION_BITS);
      sums[at] += bits & FRACTION_MASK;
      if (--left[at] == 0) {
        empty(at);
      }
    }
  }

  private void empty(int at) {
    int sign = at / NEGATIVE_CHUNKS;
    int field = at % NEGATIVE_CHUNKS;
    long hidden = field == 0 ? 0 : (long) (CHUNK_TERMS - termsLeft[at]) << FRACTION_BITS;
    bySign[sign].addMultiple(hidden + fractions[at], field, sign == 1);
    fractions[at] = 0;
    termsLeft[at] = CHUNK_TERMS;
  }

  /**
   * Completes what was added to the accumulators.
   *
   * @throws IllegalArgumentException if a term was infinite or NaN
   */
  void drain() {
    for (int at = 0; at < CHUNKS; at++) {
      if (termsLeft[at] != CHUNK_TERMS) {
        empty(at);
      }
    }
  }
}
