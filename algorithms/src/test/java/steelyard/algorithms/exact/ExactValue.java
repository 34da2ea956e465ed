package steelyard.algorithms.exact;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * Exact sums and inner products by decimal arithmetic, and what a double has to do with them. Every
 * double is a finite decimal, so nothing here rounds; doubles are compared with their neighbours
 * instead of being converted to.
 */
public final class ExactValue {

  private static final BigDecimal TWO = BigDecimal.valueOf(2);

  private ExactValue() {}

  public static BigDecimal sum(double... terms) {
    BigDecimal sum = BigDecimal.ZERO;
    for (double term : terms) {
      sum = sum.add(new BigDecimal(term));
    }
    return sum;
  }

  public static BigDecimal sumOfMagnitudes(double... terms) {
    BigDecimal sum = BigDecimal.ZERO;
    for (double term : terms) {
      sum = sum.add(new BigDecimal(Math.abs(term)));
    }
    return sum;
  }

  public static BigDecimal dot(double[] x, double[] y) {
    BigDecimal sum = BigDecimal.ZERO;
    for (int i = 0; i < x.length; i++) {
      sum = sum.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])));
    }
    return sum;
  }

  public static BigDecimal dotOfMagnitudes(double[] x, double[] y) {
    BigDecimal sum = BigDecimal.ZERO;
    for (int i = 0; i < x.length; i++) {
      sum = sum.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])).abs());
    }
    return sum;
  }

  /** Says whether a double is nearest to an exact value, with an even significand in a tie. */
  public static boolean isNearest(double candidate, BigDecimal exact) {
    if (Double.isNaN(candidate)) {
      return false;
    }
    BigDecimal distance = position(candidate).subtract(exact).abs();
    int above = distance.compareTo(position(Math.nextUp(candidate)).subtract(exact).abs());
    int below = distance.compareTo(position(Math.nextDown(candidate)).subtract(exact).abs());
    if (Double.isInfinite(candidate)) {
      // Infinity stands at 2^1024 and beyond; half way to it rounds away, for 2^1024 is even.
      return exact.signum() == Math.signum(candidate)
          && exact.abs().compareTo(halfWayToInfinity()) >= 0;
    }
    boolean even = (Double.doubleToRawLongBits(candidate) & 1) == 0;
    return above <= 0 && below <= 0 && (even || (above != 0 && below != 0));
  }

  /** Says whether a double is the exact value or next to it on either side. */
  public static boolean isFaithful(double candidate, BigDecimal exact) {
    if (!Double.isFinite(candidate)) {
      return Double.isInfinite(candidate)
          && exact.signum() == Math.signum(candidate)
          && exact.abs().compareTo(new BigDecimal(Double.MAX_VALUE)) > 0;
    }
    return new BigDecimal(candidate).compareTo(exact) == 0
        || (position(Math.nextUp(candidate)).compareTo(exact) > 0
            && position(Math.nextDown(candidate)).compareTo(exact) < 0);
  }

  /** Returns |computed - exact| / scale, rounded only at the end; infinite for a zero scale. */
  public static double error(double computed, BigDecimal exact, BigDecimal scale) {
    BigDecimal error = new BigDecimal(computed).subtract(exact).abs();
    return ratio(error, scale.abs());
  }

  /** Returns a quotient; 0/0 is 0, and anything else over 0 is infinite. */
  public static double ratio(BigDecimal numerator, BigDecimal denominator) {
    if (numerator.signum() == 0) {
      return 0;
    }
    return denominator.signum() == 0
        ? Double.POSITIVE_INFINITY
        : numerator.divide(denominator, MathContext.DECIMAL128).doubleValue();
  }

  private static BigDecimal position(double x) {
    return Double.isInfinite(x)
        ? BigDecimal.valueOf(Math.signum(x)).multiply(TWO.pow(1024))
        : new BigDecimal(x);
  }

  private static BigDecimal halfWayToInfinity() {
    return TWO.pow(1024).subtract(TWO.pow(970));
  }
}
