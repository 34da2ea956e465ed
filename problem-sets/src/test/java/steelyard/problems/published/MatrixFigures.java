package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.solve.ExactVerdict;
import steelyard.problems.solve.LinearSystem;
import steelyard.problems.solve.PublishedMatrices;
import steelyard.problems.solve.RationalInverse;
import steelyard.problems.solve.certificate.CertifiedSolution;

/** Condition numbers in the maximum norm, and determinants. */
final class MatrixFigures implements Figure.Source {
  private static final Pattern ID = Pattern.compile("lin\\.(\\w+)\\.(kappainf|skeel|det)");

  @Override
  public Optional<Figure> figure(String id) {
    Matcher match = ID.matcher(id);
    return match.matches()
        ? Optional.of(Figure.of(value(PublishedMatrices.named(match.group(1)), match.group(2))))
        : Optional.empty();
  }

  private static BigFraction value(PublishedMatrices.Multiple matrix, String quantity) {
    double[][] a = matrix.entries();
    double[] b =
        Arrays.stream(a).mapToDouble(row -> ExactAccumulator.sum(row).doubleValue()).toArray();
    CertifiedSolution solution = ExactVerdict.require(new LinearSystem(a, b));
    RationalInverse exact = new RationalInverse(a);
    return switch (quantity) {
      case "kappainf" -> exact.kappa();
      case "det" -> exact.determinant().divide(matrix.factor().pow(a.length));
      case "skeel" -> {
        requireTwice(solution, exact.skeel(), a);
        yield exact.skeel();
      }
      default -> throw new IllegalArgumentException(quantity);
    };
  }

  // The solution is (1, ..., 1), so that without negative entries |A||x| + |b| is 2 |A||x|, up to
  // the rounding of b.
  private static void requireTwice(CertifiedSolution solution, BigFraction skeel, double[][] a) {
    assertThat(Arrays.stream(a).flatMapToDouble(Arrays::stream).min().orElseThrow())
        .isNotNegative();
    assertThat(solution.componentwise().midpoint() / (2 * skeel.doubleValue()))
        .isBetween(0.99, 1.01);
  }
}
