package steelyard.algorithms.exact;

/**
 * The rounding errors of single operations, which are themselves floating-point numbers.
 *
 * <p>The sums are exact unless they overflow. The product is exact unless it overflows or the error
 * term falls below the normal range.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump, Oishi, Accurate sum and dot
 *     product, SIAM J. Sci. Comput. 26 (2005) 1955-1988, Algorithms 1.1, 3.1 and 3.5</a>
 */
public final class ErrorFree {

  private ErrorFree() {}

  /**
   * Returns the rounding error of a sum, for summands in any order (Knuth's TwoSum, 6 operations
   * with the sum itself).
   *
   * @param sum the computed a + b
   * @return the exact a + b - sum
   */
  public static double ofSum(double a, double b, double sum) {
    double virtualB = sum - a;
    return (a - (sum - virtualB)) + (b - virtualB);
  }

  /**
   * Returns the rounding error of a sum whose first summand is 0 or has at least the exponent of
   * the second (Dekker's FastTwoSum, 3 operations with the sum itself).
   *
   * @param sum the computed larger + smaller
   * @return the exact larger + smaller - sum
   */
  public static double ofOrderedSum(double larger, double smaller, double sum) {
    return smaller - (sum - larger);
  }

  /**
   * Returns the rounding error of a product (TwoProduct with FMA, 2 operations with the product
   * itself).
   *
   * @param product the computed a b
   * @return the exact a b - product
   */
  public static double ofProduct(double a, double b, double product) {
    return Math.fma(a, b, -product);
  }
}
