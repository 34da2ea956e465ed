package steelyard.problems.sum;

import static org.assertj.core.api.Assertions.assertThat;

import ch.obermuhlner.math.big.BigDecimalMath;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.exact.Binary64;

/** The series against an independent exponential function, that of big-math at 60 digits. */
final class ExponentialSeriesTest {

  private static final MathContext DIGITS = new MathContext(60);

  @ParameterizedTest
  @CsvSource({"10, 30", "1e4, 77", "1e8, 100", "1e12, 200", "1e16, 1000"})
  void theTermsAddUpToTheExponentialWithinTheirRoundings(double condition, int size) {
    ProblemId id = new ProblemId("sum", "exp-series", OptionalDouble.of(condition), size, 1, 1);
    Problem<Terms> problem =
        SumFamilies.all().stream()
            .filter(family -> family.profile().id().equals(id.family()))
            .findFirst()
            .orElseThrow()
            .generate(id.request(), id.randomness());
    BigDecimal minusT = new BigDecimal(problem.data().values()[1]);
    BigDecimal truth = BigDecimalMath.exp(minusT, DIGITS);
    BigDecimal total = BigDecimal.ZERO;
    BigDecimal magnitudes = BigDecimal.ZERO;
    for (double term : problem.data().values()) {
      total = total.add(new BigDecimal(term));
      magnitudes = magnitudes.add(new BigDecimal(Math.abs(term)));
    }
    // Each term is rounded once; what the series leaves out is below an eighth of exp(-t).
    BigDecimal roundings = magnitudes.multiply(new BigDecimal(Binary64.UNIT_ROUNDOFF));
    BigDecimal tail = truth.multiply(new BigDecimal("0.125"));
    assertThat(total.subtract(truth).abs()).isLessThanOrEqualTo(roundings.add(tail));
    assertThat(problem.reference().answer(DIGITS).get(0)).isEqualByComparingTo(total.round(DIGITS));

    BigDecimal expected = BigDecimalMath.exp(minusT.negate(), DIGITS).divide(truth, DIGITS);
    assertThat(problem.condition().kappa() / expected.doubleValue()).isBetween(0.5, 2.0);
  }
}
