package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.certificate.Enclosure;

/** Published condition numbers, exact to all printed digits, lie in the certified enclosures. */
class PublishedConditionTest {
  private static final MathContext DIGITS = new MathContext(60);
  private static final BigDecimal PRINTED = new BigDecimal("1e-28");

  @ParameterizedTest(name = "{0} {1}")
  @CsvFileSource(resources = "condition-numbers.csv", useHeadersInDisplayName = true)
  void isEnclosed(String name, int n, BigDecimal kappa, BigDecimal skeel, String source) {
    double[][] a = PublishedMatrices.of(name, n);
    double[] ones = new double[n];
    Arrays.fill(ones, 1);
    double[] b = new double[n];
    for (int i = 0; i < n; i++) {
      b[i] = ExactAccumulator.dot(a[i], ones).doubleValue();
    }
    RationalInverse exact = new RationalInverse(a);
    requireEqual(exact.kappa(), kappa, source);
    if (skeel != null) {
      requireEqual(exact.skeel(), skeel, source);
    }
    CertifiedSolution solution = CertifiedSolver.solve(a, b);
    Enclosure matrixNorm = Enclosure.of(exact.matrixNorm().doubleValue());
    requireInside(solution.inverseNorm().times(matrixNorm), kappa);
    requireInside(solution.kappa(), decimal(exact.normwise(b)));
    requireInside(solution.componentwise(), decimal(exact.componentwise(b)));
    if (skeel != null && Arrays.stream(a).flatMapToDouble(Arrays::stream).allMatch(x -> x >= 0)) {
      // With x = (1, ..., 1) and A >= 0, |A||x| + |b| is 2 |A||x| up to the rounding of b.
      assertThat(solution.componentwise().midpoint() / (2 * skeel.doubleValue()))
          .isBetween(0.99, 1.01);
    }
  }

  private static void requireEqual(BigFraction exact, BigDecimal printed, String source) {
    BigDecimal distance = decimal(exact).subtract(printed).abs();
    assertThat(distance).as(source).isLessThanOrEqualTo(printed.multiply(PRINTED));
  }

  private static void requireInside(Enclosure enclosure, BigDecimal value) {
    assertThat(new BigDecimal(enclosure.lower())).isLessThanOrEqualTo(value);
    assertThat(new BigDecimal(enclosure.upper())).isGreaterThanOrEqualTo(value);
    assertThat(enclosure.isWithin(0.01)).isTrue();
  }

  private static BigDecimal decimal(BigFraction fraction) {
    return new BigDecimal(fraction.getNumerator())
        .divide(new BigDecimal(fraction.getDenominator()), DIGITS);
  }
}
