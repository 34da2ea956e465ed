package steelyard.problems.published;

import java.math.BigDecimal;
import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.solve.RationalInverse;

/**
 * The moments of data as fractions, made of exact sums and exact dot products alone: nothing is
 * rounded before the root of a deviation.
 *
 * @param mean the mean
 * @param squares the sum of the squares of the deviations from the mean
 * @param lagged the sum of the products of neighbouring deviations
 * @param length the sum of the squares of the data
 * @param n how many data there are
 */
record Moments(
    BigFraction mean, BigFraction squares, BigFraction lagged, BigFraction length, int n) {

  /**
   * Returns the moments of data in some unit.
   *
   * @param x the data
   * @param unit what a datum of 1 stands for
   */
  static Moments of(double[] x, BigFraction unit) {
    int n = x.length;
    BigFraction sum = RationalInverse.exact(ExactAccumulator.sum(x));
    BigFraction length = RationalInverse.exact(ExactAccumulator.dot(x, x));
    BigFraction neighbours =
        RationalInverse.exact(
            ExactAccumulator.dot(Arrays.copyOf(x, n - 1), Arrays.copyOfRange(x, 1, n)));
    BigFraction mean = sum.divide(n);
    BigFraction ends = RationalInverse.exact(x[0]).add(RationalInverse.exact(x[n - 1]));
    BigFraction lagged =
        neighbours
            .subtract(mean.multiply(sum.multiply(2).subtract(ends)))
            .add(mean.multiply(mean).multiply(n - 1));
    BigFraction area = unit.multiply(unit);
    return new Moments(
        mean.multiply(unit),
        length.subtract(mean.multiply(sum)).multiply(area),
        lagged.multiply(area),
        length.multiply(area),
        n);
  }

  BigFraction variance() {
    return squares.divide(n - 1);
  }

  BigDecimal deviation() {
    return root(variance());
  }

  BigFraction autocorrelation() {
    return lagged.divide(squares);
  }

  /** Returns the condition number of Chan, Golub and LeVeque, the length over the deviations'. */
  BigDecimal condition() {
    return root(length.divide(squares));
  }

  static BigDecimal decimal(BigFraction fraction) {
    return Figure.ratio(fraction.getNumerator(), fraction.getDenominator());
  }

  private static BigDecimal root(BigFraction fraction) {
    return decimal(fraction).sqrt(Figure.DIGITS);
  }
}
