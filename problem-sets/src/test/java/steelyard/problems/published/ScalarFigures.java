package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import steelyard.problems.Problem;
import steelyard.problems.dot.DotProblem;
import steelyard.problems.dot.Vectors;
import steelyard.problems.exact.ExactSums;
import steelyard.problems.sum.SumProblem;
import steelyard.problems.sum.Terms;

/** Small fixed sums and dot products, and their condition numbers. */
final class ScalarFigures implements Figure.Source {
  private static final String CONDITION = ".cond";

  private static final double M = 0x1p55;
  private static final Map<String, double[]> SUMS =
      Map.of(
          "sum.M4",
          new double[] {1, M, 2 * M, -3 * M},
          "sum.M4dec",
          new double[] {-3 * M, 2 * M, M, 1},
          "sum.neum",
          new double[] {1, 1e100, 1, -1e100},
          "sum.3level",
          new double[] {1, 0x1p60, 0x1p-60, 0x1p120, -0x1p120, -0x1p60, -1},
          "sum.halfulp",
          halfUlps(1025),
          "sum.halfulpneg",
          halfUlps(1026),
          "sum.overflowinter",
          new double[] {1e308, 1e308, -1e308},
          "sum.tenth10",
          tenths(10),
          "sum.tenth1000000",
          tenths(1_000_000),
          "sum.harm1e6up",
          IntStream.rangeClosed(1, 1_000_000).mapToDouble(k -> 1.0 / k).toArray());

  private static final double[] X = {
    2.718281828, -3.141592654, 1.414213562, 0.5772156649, 0.3010299957
  };
  private static final double[] Y = {1486.2497, 878366.9879, -22.37492, 4773714.647, 0.000185049};

  @Override
  public Optional<Figure> figure(String id) {
    if (id.endsWith(CONDITION)) {
      return Optional.ofNullable(SUMS.get(id.substring(0, id.length() - CONDITION.length())))
          .map(ScalarFigures::condition);
    }
    return switch (id) {
      case "dot.kulisch5.bin64" -> Optional.of(dot(X, Y, 0));
      case "dot.kulisch5.bin32" -> Optional.of(dot(asFloats(X), asFloats(Y), 0));
      // Integers after multiplication by powers of ten: the decimals themselves, exactly.
      case "dot.kulisch5.dec" -> Optional.of(dot(shifted(X, 10), shifted(Y, 9), 19));
      default -> Optional.ofNullable(SUMS.get(id)).map(ScalarFigures::sum);
    };
  }

  private static Figure sum(double[] terms) {
    return Figure.of(answer(new SumProblem(new Terms(terms))));
  }

  private static Figure dot(double[] x, double[] y, int decimals) {
    return Figure.of(answer(new DotProblem(new Vectors(x, y))).movePointLeft(decimals));
  }

  private static BigDecimal answer(Problem<?> problem) {
    return problem.reference().answer(MathContext.UNLIMITED).get(0);
  }

  private static Figure condition(double[] terms) {
    ExactSums sums = ExactSums.of(terms);
    BigDecimal kappa = Figure.ratio(sums.absoluteSum(), sums.sum().abs());
    assertThat(new SumProblem(new Terms(terms)).condition().kappa()).isEqualTo(kappa.doubleValue());
    return Figure.of(kappa);
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

  private static double[] asFloats(double[] values) {
    return Arrays.stream(values).map(value -> (float) value).toArray();
  }

  private static double[] shifted(double[] values, int digits) {
    return Arrays.stream(values)
        .map(value -> BigDecimal.valueOf(value).movePointRight(digits).longValueExact())
        .toArray();
  }
}
