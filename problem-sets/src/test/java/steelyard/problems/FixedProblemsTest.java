package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Arrays;
import java.util.Objects;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import steelyard.problems.dot.DotProblem;
import steelyard.problems.dot.Vectors;
import steelyard.problems.sum.SumProblem;
import steelyard.problems.sum.Terms;

/** Small fixed sums and dot products with known exact values; the sources stand in the table. */
class FixedProblemsTest {
  private static final MathContext FORTY_DIGITS = new MathContext(40, RoundingMode.HALF_EVEN);

  private static final double[] KULISCH_X = {
    2.718281828, -3.141592654, 1.414213562, 0.5772156649, 0.3010299957
  };
  private static final double[] KULISCH_Y = {
    1486.2497, 878366.9879, -22.37492, 4773714.647, 0.000185049
  };

  @ParameterizedTest(name = "{0} {2}")
  @CsvFileSource(resources = "fixed-problems.csv", numLinesToSkip = 1)
  void referenceAndConditionAreThePublishedOnes(
      String id, String input, String quantity, String value, String source) {
    assertThat(source).isNotBlank();
    Problem<?> problem = problem(id);
    BigDecimal expected = new BigDecimal(value);
    BigDecimal reference = problem.reference().answer(FORTY_DIGITS).get(0);
    if (input.contains("not the stored data")) {
      assertThat(reference).isNotEqualByComparingTo(expected);
      assertThat(decimalDotProduct()).isEqualByComparingTo(expected);
    } else if (quantity.equals("value")) {
      assertThat(reference).isEqualByComparingTo(expected);
    } else {
      assertThat(problem.condition().kappa()).isEqualTo(expected.doubleValue());
    }
  }

  private static BigDecimal decimalDotProduct() {
    String[] x = {"2.718281828", "-3.141592654", "1.414213562", "0.5772156649", "0.3010299957"};
    String[] y = {"1486.2497", "878366.9879", "-22.37492", "4773714.647", "0.000185049"};
    BigDecimal sum = BigDecimal.ZERO;
    for (int i = 0; i < x.length; i++) {
      sum = sum.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])));
    }
    return sum;
  }

  private static Problem<?> problem(String id) {
    double m = 0x1p55;
    return switch (id) {
      case "sum.M4" -> sum(1, m, 2 * m, -3 * m);
      case "sum.M4dec" -> sum(-3 * m, 2 * m, m, 1);
      case "sum.neum" -> sum(1, 1e100, 1, -1e100);
      case "sum.3level" -> sum(1, 0x1p60, 0x1p-60, 0x1p120, -0x1p120, -0x1p60, -1);
      case "sum.halfulp" -> sum(halfUlps(1025));
      case "sum.halfulpneg" -> sum(halfUlps(1026));
      case "sum.overflowinter" -> sum(1e308, 1e308, -1e308);
      case "sum.tenth10" -> sum(tenths(10));
      case "sum.tenth1000000" -> sum(tenths(1_000_000));
      case "sum.harm1e6up" -> sum(harmonic());
      case "dot.kulisch5.bin64", "dot.kulisch5.dec" ->
          new DotProblem(new Vectors(KULISCH_X, KULISCH_Y));
      case "dot.kulisch5.bin32" ->
          new DotProblem(new Vectors(asFloats(KULISCH_X), asFloats(KULISCH_Y)));
      default -> throw new IllegalArgumentException(Objects.toString(id));
    };
  }

  private static Problem<?> sum(double... terms) {
    return new SumProblem(new Terms(terms));
  }

  private static double[] halfUlps(int length) {
    double[] terms = new double[length];
    Arrays.fill(terms, 0x1p-53);
    terms[0] = 1;
    if (length == 1026) {
      terms[1025] = -1;
    }
    return terms;
  }

  private static double[] tenths(int length) {
    double[] terms = new double[length];
    Arrays.fill(terms, 0.1);
    return terms;
  }

  private static double[] harmonic() {
    double[] terms = new double[1_000_000];
    for (int k = 1; k <= terms.length; k++) {
      terms[k - 1] = 1.0 / k;
    }
    return terms;
  }

  private static double[] asFloats(double[] values) {
    return Arrays.stream(values).map(value -> (float) value).toArray();
  }
}
