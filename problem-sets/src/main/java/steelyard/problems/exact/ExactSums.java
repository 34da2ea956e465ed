package steelyard.problems.exact;

/**
 * The sum of terms and the sum of their absolute values, both exact and from one pass: positive and
 * negative terms are added up apart.
 */
public final class ExactSums {

  // From here on looking through many chunks costs less than they save.
  private static final int LEAST_FOR_LARGE = 8192;
  private static final int LEAST_FOR_PRODUCT_CHUNKS = 64;

  // Of what has a positive sign, and of what has a negative one.
  private final ExactAccumulator[] bySign = {new ExactAccumulator(), new ExactAccumulator()};

  /** Makes sums of nothing. */
  public ExactSums() {}

  /**
   * Adds up terms.
   *
   * @throws IllegalArgumentException if one is infinite or NaN
   */
  public static ExactSums of(double[] terms) {
    ExactSums sums = new ExactSums();
    add(terms, sums.bySign);
    return sums;
  }

  /**
   * Adds up the products of the entries of two vectors, whatever their size.
   *
   * @throws IllegalArgumentException if the vectors differ in length, or an entry is infinite or
   *     NaN
   */
  public static ExactSums ofProducts(double[] x, double[] y) {
    ExactSums sums = new ExactSums();
    sums.addProducts(x, y);
    return sums;
  }

  /**
   * Adds the products of the entries of two vectors, whatever their size.
   *
   * @throws IllegalArgumentException if the vectors differ in length, or an entry is infinite or
   *     NaN
   */
  public void addProducts(double[] x, double[] y) {
    addProducts(x, y, bySign);
  }

  /**
   * Adds terms to one of two accumulators each, by their signs; the two may be the same.
   *
   * @throws IllegalArgumentException if a term is infinite or NaN
   */
  static void add(double[] terms, ExactAccumulator... bySign) {
    if (terms.length < LEAST_FOR_LARGE) {
      for (double term : terms) {
        bySign[signBit(term)].add(term);
      }
    } else {
      LargeAccumulator large = new LargeAccumulator(bySign);
      large.add(terms);
      large.drain();
    }
  }

  /**
   * Adds products to one of two accumulators each, by their signs; the two may be the same.
   *
   * @throws IllegalArgumentException if the vectors differ in length, or an entry is infinite or
   *     NaN
   */
  static void addProducts(double[] x, double[] y, ExactAccumulator... bySign) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          "two vectors of the same length are wanted, but they have "
              + x.length
              + " and "
              + y.length
              + " entries");
    }
    if (x.length < LEAST_FOR_PRODUCT_CHUNKS) {
      for (int i = 0; i < x.length; i++) {
        bySign[signBit(x[i]) ^ signBit(y[i])].addProduct(x[i], y[i]);
      }
    } else {
      ProductChunks.add(x, y, bySign);
    }
  }

  private static int signBit(double value) {
    return (int) (Double.doubleToRawLongBits(value) >>> 63);
  }

  /** Returns the sum. */
  public Dyadic sum() {
    return accumulated().value();
  }

  /** Returns an accumulator of its own that holds the sum. */
  public ExactAccumulator accumulated() {
    ExactAccumulator both = new ExactAccumulator();
    both.add(bySign[0]);
    both.add(bySign[1]);
    return both;
  }

  /** Returns the sum of the absolute values. */
  public Dyadic absoluteSum() {
    return bySign[0].value().subtract(bySign[1].value());
  }
}
