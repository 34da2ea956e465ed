package steelyard.problems.exact;

/**
 * The sum of terms and the sum of their absolute values, both exact and from one pass: positive and
 * negative terms are added up apart.
 */
public final class ExactSums {

  // From here on looking through many chunks costs less than they save.
  private static final int LEAST_FOR_LARGE = 8192;
  private static final int LEAST_FOR_PRODUCT_CHUNKS = 2048;

  private final ExactAccumulator positive = new ExactAccumulator();
  private final ExactAccumulator negative = new ExactAccumulator();

  private ExactSums() {}

  /**
   * Adds up terms.
   *
   * @throws IllegalArgumentException if one is infinite or NaN
   */
  public static ExactSums of(double[] terms) {
    ExactSums sums = new ExactSums();
    if (terms.length < LEAST_FOR_LARGE) {
      for (double term : terms) {
        (term < 0 ? sums.negative : sums.positive).add(term);
      }
    } else {
      LargeAccumulator large = new LargeAccumulator(sums.positive, sums.negative);
      large.add(terms);
      large.drain();
    }
    return sums;
  }

  /**
   * Adds up the products of the entries of two vectors, whatever their size.
   *
   * @throws IllegalArgumentException if the vectors differ in length, or an entry is infinite or
   *     NaN
   */
  public static ExactSums ofProducts(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          "two vectors of the same length are wanted, but they have "
              + x.length
              + " and "
              + y.length
              + " entries");
    }
    ExactSums sums = new ExactSums();
    if (x.length < LEAST_FOR_PRODUCT_CHUNKS) {
      for (int i = 0; i < x.length; i++) {
        boolean isNegative = Math.signum(x[i]) * Math.signum(y[i]) < 0;
        (isNegative ? sums.negative : sums.positive).addProduct(x[i], y[i]);
      }
    } else {
      ProductChunks.add(x, y, sums.positive, sums.negative);
    }
    return sums;
  }

  /** Returns the sum. */
  public Dyadic sum() {
    ExactAccumulator both = new ExactAccumulator();
    both.add(positive);
    both.add(negative);
    return both.value();
  }

  /** Returns the sum of the absolute values. */
  public Dyadic absoluteSum() {
    return positive.value().subtract(negative.value());
  }
}
