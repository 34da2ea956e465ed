package steelyard.algorithms.dot;

import static steelyard.algorithms.Bound.gamma;

import java.util.function.IntUnaryOperator;
import steelyard.algorithms.Bound;

/**
 * The published error bounds of the inner product methods.
 *
 * <p>The sources bound the error in terms of |x|'|y|. The condition number is twice that over the
 * exact value, because both vectors may be perturbed, and the backward error is the error over
 * twice that: hence the factors 1/2. All bounds presume that no product and no error of a product
 * underflows, and that nothing overflows.
 */
final class DotBounds {

  private static final String NO_UNDERFLOW = "no-underflow";

  private static final String HIGHAM =
      "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, ";
  private static final String ORO =
      "Ogita, Rump, Oishi, Accurate sum and dot product, SIAM J. Sci. Comput. 26 (2005), ";

  private DotBounds() {}

  /** The bound of rounded products that are added in any order. */
  static Bound anyOrder() {
    return Bound.backward(
        (n, kappa, u) -> n * u / 2,
        "n u / 2",
        "Jeannerod, Rump, Improved error bounds for inner products in floating-point arithmetic,"
            + " SIAM J. Matrix Anal. Appl. 34 (2013) 338-344",
        NO_UNDERFLOW);
  }

  /**
   * The bound of a tree of products and sums.
   *
   * @param roundings the largest number of roundings that a product goes through
   * @param text how that number depends on n, for readers
   */
  static Bound tree(IntUnaryOperator roundings, String text) {
    return Bound.backward(
        (n, kappa, u) -> gamma(roundings.applyAsInt(n), u) / 2,
        "gamma(h) / 2, " + text,
        HIGHAM + "Lemma 3.1 and section 3.1",
        NO_UNDERFLOW);
  }

  static Bound dot2() {
    return Bound.forward(
        (n, kappa, u) -> u + times(power(gamma(n, u), 2), kappa) / 2,
        "u + gamma(n)^2 kappa / 2",
        ORO + "Proposition 5.5",
        NO_UNDERFLOW);
  }

  static Bound dotK(int fold) {
    return Bound.forward(
        (n, kappa, u) -> {
          if (8.0 * n * u > 1) {
            return Double.POSITIVE_INFINITY;
          }
          double g = gamma(Math.max(4.0 * n - 2, 0), u);
          return u + 2 * power(g, 2) + times(power(g, fold), kappa) / 2;
        },
        "u + 2 gamma(4n-2)^2 + gamma(4n-2)^" + fold + " kappa / 2 for 8 n u <= 1",
        ORO + "Proposition 5.11",
        NO_UNDERFLOW);
  }

  /** Each addition to a double-double is off by at most 3u^2/(1-4u); the low part is dropped. */
  static Bound doubleDouble() {
    return Bound.forward(
        (n, kappa, u) -> {
          double perAddition = 3 * u * u / (1 - 4 * u);
          return u + (1 + u) * times(gamma(Math.max(n - 1, 0), perAddition), kappa) / 2;
        },
        "u + (1+u) g/(1-g) kappa / 2, g = 3(n-1)u^2/(1-4u)",
        "Joldes, Muller, Popescu, Tight and rigorous error bounds for basic building blocks of"
            + " double-word arithmetic, ACM TOMS 44 (2017) 15, Algorithm 6, applied n-1 times as in "
            + HIGHAM
            + "(4.4)",
        NO_UNDERFLOW);
  }

  static Bound correctlyRounded() {
    return Bound.forward(
        (n, kappa, u) -> u,
        "u",
        "Kulisch, Miranker, Computer Arithmetic in Theory and Practice, 1981",
        NO_UNDERFLOW);
  }

  private static double power(double x, int exponent) {
    return StrictMath.pow(x, exponent);
  }

  /** Returns a product in which 0 times an infinite condition number is 0. */
  private static double times(double factor, double kappa) {
    return factor == 0 ? 0 : factor * kappa;
  }
}
