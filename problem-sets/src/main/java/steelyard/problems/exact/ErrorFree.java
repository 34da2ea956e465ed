package steelyard.problems.exact;

/**
 * Error-free transformations: the rounding error of one sum or one product, which is itself a
 * double.
 *
 * @see <a href="https://doi.org/10.1137/030601818">Ogita, Rump and Oishi, Accurate sum and dot
 *     product, SIAM Journal on Scientific Computing 26 (2005), Algorithms 3.1 and 3.5</a>
 */
public final class ErrorFree {

  /**
   * The least magnitude of a computed product, 2^-968, from which on its rounding error is
   * certainly a double: a product is less than 2^106 times its lowest bit, which is then at least
   * 2^-1074.
   */
  public static final double LEAST_SAFE_PRODUCT = 0x1p-968;

  private ErrorFree() {}

  /**
   * Returns (a + b) - fl(a + b), exactly, for any a and b whose sum does not overflow (Knuth's
   * six-operation form, which needs no order of magnitude).
   *
   * @param a first term
   * @param b second term
   * @return the rounding error of {@code a + b}
   */
  public static double sumError(double a, double b) {
    double sum = a + b;
    double bRounded = sum - a;
    double aRounded = sum - bRounded;
    return (a - aRounded) + (b - bRounded);
  }

  /**
   * Returns a b - fl(a b) rounded to a double; exactly that where {@link #isProductSafe} holds for
   * {@code a * b}.
   *
   * @param a first factor
   * @param b second factor
   * @return the rounding error of {@code a * b}
   */
  public static double productError(double a, double b) {
    return Math.fma(a, b, -(a * b));
  }

  /**
   * Says whether a nonzero computed product lies so far from underflow and overflow that its
   * rounding error is certainly a double. A product of zero is not safe by this test, because it
   * may have underflowed.
   *
   * @param product the computed product
   * @return whether 2^-968 &le; |product| &lt; infinity
   */
  public static boolean isProductSafe(double product) {
    double magnitude = Math.abs(product);
    return magnitude >= LEAST_SAFE_PRODUCT && magnitude <= Double.MAX_VALUE;
  }
}
