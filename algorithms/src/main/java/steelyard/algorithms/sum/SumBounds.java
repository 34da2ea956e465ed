package steelyard.algorithms.sum;

import static steelyard.algorithms.Bound.gamma;

import java.util.function.IntUnaryOperator;
import steelyard.algorithms.Bound;

/**
 * The published error bounds of the summation methods, relative to the exact sum (forward) or to
 * the sum of magnitudes (backward). All of them presume that no addition overflows; underflow does
 * them no harm, because additions that underflow are exact.
 */
final class SumBounds {

  private static final String HIGHAM =
      "Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, ";
  private static final String ORO =
      "Ogita, Rump, Oishi, Accurate sum and dot product, SIAM J. Sci. Comput. 26 (2005), ";

  private SumBounds() {}

  /** The bound of recursive summation in any order. */
  static Bound anyOrder() {
    return Bound.backward(
        (n, kappa, u) -> Math.max(n - 1, 0) * u,
        "(n-1)u",
        "Jeannerod, Rump, Improved error bounds for inner products in floating-point arithmetic,"
            + " SIAM J. Matrix Anal. Appl. 34 (2013) 338-344");
  }

  /**
   * The bound of a summation tree.
   *
   * @param height the largest number of additions that a term goes through, as a function of n
   * @param text how the height depends on n, for readers
   */
  static Bound tree(IntUnaryOperator height, String text) {
    return Bound.backward(
        (n, kappa, u) -> gamma(height.applyAsInt(n), u),
        "gamma(h), " + text,
        HIGHAM + "section 4.2, the argument of (4.4) and (4.6)");
  }

  /** The bound of compensated summation with the correction apart. */
  static Bound correctionApart() {
    return Bound.backward(
        (n, kappa, u) -> n * u <= 0.1 ? 2 * u + n * u * n * u : Double.POSITIVE_INFINITY,
        "2u + n^2 u^2 for n u <= 0.1",
        HIGHAM + "(4.10)");
  }

  static Bound sum2() {
    return Bound.forward(
        (n, kappa, u) -> u + times(square(gamma(Math.max(n - 1, 0), u)), kappa),
        "u + gamma(n-1)^2 kappa",
        ORO + "Proposition 4.5");
  }

  static Bound sumK(int fold) {
    return Bound.forward(
        (n, kappa, u) -> {
          if (4.0 * n * u > 1) {
            return Double.POSITIVE_INFINITY;
          }
          double vanishing = StrictMath.pow(gamma(Math.max(2.0 * n - 2, 0), u), fold);
          return u + 3 * square(gamma(Math.max(n - 1, 0), u)) + times(vanishing, kappa);
        },
        "u + 3 gamma(n-1)^2 + gamma(2n-2)^" + fold + " kappa for 4 n u <= 1",
        ORO + "Proposition 4.10");
  }

  /**
   * Each addition to a double-double is off by at most 2u^2; the low part is dropped at the end.
   */
  static Bound doubleDouble() {
    return Bound.forward(
        (n, kappa, u) -> u + (1 + u) * times(gamma(Math.max(n - 1, 0), 2 * u * u), kappa),
        "u + (1+u) g/(1-g) kappa, g = 2(n-1)u^2",
        "Joldes, Muller, Popescu, Tight and rigorous error bounds for basic building blocks of"
            + " double-word arithmetic, ACM TOMS 44 (2017) 15, Algorithm 4, applied n-1 times as in "
            + HIGHAM
            + "(4.4)");
  }

  static Bound faithful() {
    return Bound.forward(
        (n, kappa, u) -> 2 * u,
        "2u",
        "Rump, Ogita, Oishi, Accurate floating-point summation part I: faithful rounding, SIAM J."
            + " Sci. Comput. 31 (2008) 189-224, section 4");
  }

  static Bound correctlyRounded() {
    return Bound.forward(
        (n, kappa, u) -> u,
        "u",
        "Neal, Fast exact summation using small and large superaccumulators, arXiv:1505.05571,"
            + " 2015, section 3");
  }

  private static double square(double x) {
    return x * x;
  }

  /** Returns a product in which 0 times an infinite condition number is 0. */
  private static double times(double factor, double kappa) {
    return factor == 0 ? 0 : factor * kappa;
  }
}
