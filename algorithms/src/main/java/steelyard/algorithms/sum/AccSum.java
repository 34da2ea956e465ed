package steelyard.algorithms.sum;

/**
 * AccSum: leading bits of all terms are cut off at a common place, where they sum without error;
 * this is repeated lower down until the rest no longer matters. The answer is faithful, one of the
 * two doubles around the exact sum or the exact sum itself, for any condition number and also among
 * subnormals; the number of repetitions grows with the condition number.
 *
 * <p>The cut sits above n + 2 times the largest term, so terms within a factor n of the overflow
 * threshold are first scaled down by a power of two. Where that would cost a tiny term its last
 * bits, the method does not apply and says so.
 *
 * @see <a href="https://doi.org/10.1137/050645671">Rump, Ogita, Oishi, Accurate floating-point
 *     summation part I: faithful rounding, SIAM J. Sci. Comput. 31 (2008) 189-224, Algorithms 3.3,
 *     4.1 and 4.5</a>
 */
final class AccSum implements Summation {

  /** The largest n with (n + 2)^2 u at most 1, beyond which faithfulness is not proven. */
  static final int MAX_TERMS = (1 << 26) - 2;

  private static final double U = 0x1p-53;

  /**
   * {@inheritDoc}
   *
   * @throws IllegalArgumentException if there are more than 2^26 - 2 terms
   * @throws ArithmeticException if the terms reach from the overflow threshold to the underflow
   *     threshold, so that no scaling keeps all their bits
   */
  @Override
  public double sum(double[] terms) {
    if (terms.length > MAX_TERMS) {
      throw new IllegalArgumentException(
          "AccSum is for at most " + MAX_TERMS + " terms, not " + terms.length);
    }
    double largest = largestMagnitude(terms);
    if (!Double.isFinite(largest)) {
      return RecursiveSum.of(terms);
    }
    if (largest == 0) {
      return 0;
    }
    int excess = sizeExponent(terms.length) + ceilingExponent(largest) - Double.MAX_EXPONENT;
    return excess > 0
        ? Math.scalb(faithful(scaledDown(terms, excess)), excess)
        : faithful(terms.clone());
  }

  /** Returns a faithful sum of terms that leave room for the cut; overwrites them. */
  private static double faithful(double[] terms) {
    double largest = largestMagnitude(terms);
    double size = Math.scalb(1.0, sizeExponent(terms.length));
    while (largest > 0) {
      double cut = Math.scalb(size, ceilingExponent(largest));
      double before = 0;
      do {
        double leading = extract(cut, terms);
        double sum = before + leading;
        if (Math.abs(sum) >= 2 * U * size * size * cut || cut <= Double.MIN_NORMAL) {
          double rest = leading - (sum - before);
          return sum + (rest + RecursiveSum.of(terms));
        }
        before = sum;
        cut *= U * size;
      } while (before != 0);
      // All that was cut off cancelled: what is left is the whole sum, and may be much smaller.
      largest = largestMagnitude(terms);
    }
    return 0;
  }

  /** Moves the bits above the last place of the cut out of the terms and returns their sum. */
  private static double extract(double cut, double[] terms) {
    double sum = 0;
    for (int i = 0; i < terms.length; i++) {
      double leading = (cut + terms[i]) - cut;
      terms[i] -= leading;
      sum += leading;
    }
    return sum;
  }

  private static double[] scaledDown(double[] terms, int bits) {
    double[] scaled = new double[terms.length];
    for (int i = 0; i < terms.length; i++) {
      scaled[i] = Math.scalb(terms[i], -bits);
      if (Math.scalb(scaled[i], bits) != terms[i]) {
        throw new ArithmeticException(
            "AccSum cannot scale its terms: some are near the overflow threshold, and the one at index "
                + i
                + " is too near the underflow threshold to be scaled down with them");
      }
    }
    return scaled;
  }

  private static double largestMagnitude(double[] terms) {
    double largest = 0;
    for (double term : terms) {
      largest = Math.max(largest, Math.abs(term));
    }
    return largest;
  }

  /** Returns the least M with n + 2 at most 2^M. */
  private static int sizeExponent(int n) {
    return Integer.SIZE - Integer.numberOfLeadingZeros(n + 1);
  }

  /** Returns the least e with x at most 2^e, for x above 0. */
  private static int ceilingExponent(double x) {
    if (x < Double.MIN_NORMAL) {
      return ceilingExponent(x * 0x1p53) - 53;
    }
    int e = Math.getExponent(x);
    return x == Math.scalb(1.0, e) ? e : e + 1;
  }
}
