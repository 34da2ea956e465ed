package steelyard.problems.solve;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.fraction.BigFraction;

/**
 * What can be said of a system and one answer to it, to many decimal digits.
 *
 * @param solution the solution
 * @param inverseNorm the norm of the inverse
 * @param normwise the normwise condition number
 * @param componentwise the componentwise one
 * @param residuals |b - A y|, exactly
 * @param normwiseError the normwise backward error of Rigal and Gaches
 * @param componentwiseError the componentwise one of Oettli and Prager
 * @param forwardError the forward error
 */
record Measures(
    List<BigDecimal> solution,
    BigDecimal inverseNorm,
    BigDecimal normwise,
    BigDecimal componentwise,
    List<BigDecimal> residuals,
    BigDecimal normwiseError,
    BigDecimal componentwiseError,
    BigDecimal forwardError) {

  private static final MathContext DIGITS = new MathContext(80);

  /** Returns the measures in exact fractions. */
  static Measures inFractions(LinearSystem system, double[] answer) {
    RationalInverse inverse = new RationalInverse(system.a());
    BigFraction[] x = inverse.solve(system.b());
    ExactErrors errors = new ExactErrors(system, x, answer);
    return new Measures(
        Arrays.stream(x).map(Measures::decimal).toList(),
        decimal(inverse.inverseNorm()),
        decimal(inverse.normwise(system.b())),
        decimal(inverse.componentwise(system.b())),
        Arrays.stream(errors.residuals()).map(Measures::decimal).toList(),
        decimal(errors.normwise()),
        decimal(errors.componentwise()),
        decimal(errors.forward()));
  }

  // Dyadic fractions are decimal ones.
  private static BigDecimal decimal(BigFraction fraction) {
    BigDecimal top = new BigDecimal(fraction.getNumerator());
    BigDecimal bottom = new BigDecimal(fraction.getDenominator());
    return fraction.getDenominator().bitCount() == 1
        ? top.divide(bottom)
        : top.divide(bottom, DIGITS);
  }
}
