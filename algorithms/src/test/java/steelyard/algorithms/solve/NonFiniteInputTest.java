package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Candidate;

/** NaN and infinity at every place of a small positive definite system. */
class NonFiniteInputTest {

  private static final String ALL = "steelyard.algorithms.solve.Catalogue#all";

  /**
   * Those that divide by an infinite pivot and so lose it: x/∞ = 0. They answer some infinite
   * coefficients as if these were very large, which is the limit of the solution.
   */
  private static final Set<String> DIVIDING_BY_INFINITY =
      Set.of(
          "gauss-partial",
          "gauss-none",
          "gauss-rook",
          "gauss-complete",
          "gauss-jordan",
          "inverse",
          "cholesky",
          "gauss-refined",
          "gauss-refined-extended",
          "gauss-equilibrated",
          "commons-math-lu",
          "ejml-lu");

  @ParameterizedTest
  @MethodSource(ALL)
  void aNanNeverHasAFiniteAnswer(Candidate<LinearSolver> candidate) {
    assertThat(withBadCoefficient(candidate, Double.NaN)).doesNotContain(Outcome.FINITE);
    assertThat(withBadRightHandSide(candidate, Double.NaN)).doesNotContain(Outcome.FINITE);
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void anInfiniteRightHandSideNeverHasAFiniteAnswer(Candidate<LinearSolver> candidate) {
    assertThat(withBadRightHandSide(candidate, Double.POSITIVE_INFINITY))
        .containsOnly(Outcome.NOT_FINITE);
    assertThat(withBadRightHandSide(candidate, Double.NEGATIVE_INFINITY))
        .containsOnly(Outcome.NOT_FINITE);
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void anInfiniteCoefficientHasAFiniteAnswerOnlyFromThoseThatDivideByIt(
      Candidate<LinearSolver> candidate) {
    List<Outcome> outcomes = withBadCoefficient(candidate, Double.POSITIVE_INFINITY);
    outcomes.addAll(withBadCoefficient(candidate, Double.NEGATIVE_INFINITY));
    assertThat(outcomes.contains(Outcome.FINITE))
        .isEqualTo(DIVIDING_BY_INFINITY.contains(candidate.id()));
  }

  private static List<Outcome> withBadCoefficient(Candidate<LinearSolver> candidate, double bad) {
    List<Outcome> outcomes = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        double[][] a = matrix();
        a[i][j] = bad;
        outcomes.add(outcome(candidate, a, new double[] {1, 2, 3}));
      }
    }
    return outcomes;
  }

  private static List<Outcome> withBadRightHandSide(Candidate<LinearSolver> candidate, double bad) {
    List<Outcome> outcomes = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      double[] b = {1, 2, 3};
      b[i] = bad;
      outcomes.add(outcome(candidate, matrix(), b));
    }
    return outcomes;
  }

  /** An endless loop must fail the test rather than hang it. */
  private static Outcome outcome(Candidate<LinearSolver> candidate, double[][] a, double[] b) {
    return assertTimeoutPreemptively(
        Duration.ofSeconds(20), () -> Outcome.of(candidate.kernel(), a, b));
  }

  private static double[][] matrix() {
    return new double[][] {{4, 1, 0}, {1, 5, 2}, {0, 2, 6}};
  }
}
