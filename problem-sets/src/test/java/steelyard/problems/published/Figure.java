package steelyard.problems.published;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.Optional;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.exact.Dyadic;

/**
 * A value as this module computes it.
 *
 * @param value the value
 * @param accuracy an upper bound on its relative error; less than any printed digit shows where the
 *     value is exact
 */
record Figure(BigDecimal value, BigDecimal accuracy) {

  /** More digits than any row prints. */
  static final MathContext DIGITS = new MathContext(70);

  private static final BigDecimal EXACT = new BigDecimal("1e-60");

  /** Computes the values of some rows. */
  @FunctionalInterface
  interface Source {
    /** Returns the figure for a row, or empty where the row is of another kind. */
    Optional<Figure> figure(String id);
  }

  static Figure of(BigDecimal value) {
    return new Figure(value, EXACT);
  }

  static Figure of(BigFraction value) {
    return of(ratio(value.getNumerator(), value.getDenominator()));
  }

  static Figure of(Dyadic value) {
    return of(value.toBigDecimal(DIGITS));
  }

  static BigDecimal ratio(BigInteger top, BigInteger bottom) {
    return new BigDecimal(top).divide(new BigDecimal(bottom), DIGITS);
  }

  static BigDecimal ratio(Dyadic top, Dyadic bottom) {
    return top.toBigDecimal().divide(bottom.toBigDecimal(), DIGITS);
  }
}
