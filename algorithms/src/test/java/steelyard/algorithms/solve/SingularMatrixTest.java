package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.linear.SingularMatrixException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.algorithms.Candidate;

/**
 * What each solver makes of exactly singular matrices. Elimination meets an exact zero only where
 * its arithmetic happens to be exact; elsewhere a finite answer is what the method gives.
 */
class SingularMatrixTest {

  private static final double[][] ZERO = new double[2][2];
  private static final double[][] RANK_ONE = {{1, 2}, {2, 4}};
  private static final double[][] RANK_TWO = {{1, 2, 3}, {4, 5, 6}, {7, 8, 9}};

  @ParameterizedTest
  @CsvSource({
    "gauss-partial,          DECLINES,   DECLINES,   FINITE",
    "gauss-none,             DECLINES,   DECLINES,   DECLINES",
    "gauss-rook,             DECLINES,   DECLINES,   DECLINES",
    "gauss-complete,         DECLINES,   DECLINES,   DECLINES",
    "gauss-jordan,           DECLINES,   DECLINES,   FINITE",
    "cramer,                 DECLINES,   DECLINES,   DECLINES",
    "inverse,                DECLINES,   DECLINES,   FINITE",
    "qr-householder,         DECLINES,   FINITE,     FINITE",
    "qr-mgs,                 DECLINES,   DECLINES,   DECLINES",
    "qr-cgs,                 DECLINES,   DECLINES,   FINITE",
    "cholesky,               DECLINES,   DECLINES,   DECLINES",
    "gauss-refined,          DECLINES,   DECLINES,   FINITE",
    "gauss-refined-extended, DECLINES,   DECLINES,   FINITE",
    "gauss-equilibrated,     DECLINES,   DECLINES,   DECLINES",
    "commons-math-lu,        DECLINES,   DECLINES,   DECLINES",
    "commons-math-qr,        DECLINES,   FINITE,     FINITE",
    "commons-math-svd,       FINITE,     FINITE,     FINITE",
    "ejml-lu,                NOT_FINITE, NOT_FINITE, NOT_FINITE",
    "ejml-qr,                DECLINES,   FINITE,     FINITE",
  })
  void everySolverHasItsOwnWay(String id, Outcome zero, Outcome rankOne, Outcome rankTwo) {
    LinearSolver solver = Catalogue.candidate(id).kernel();
    double[] two = {1, 1};
    double[] three = {1, 1, 2};
    assertThat(
            List.of(
                Outcome.of(solver, ZERO, two),
                Outcome.of(solver, RANK_ONE, two),
                Outcome.of(solver, RANK_TWO, three)))
        .containsExactly(zero, rankOne, rankTwo);
  }

  @Test
  void theTableAboveLeavesNobodyOut() {
    assertThat(LinearSolvers.all()).hasSize(19);
  }

  /** (1,2)ᵀ(1,2) x = (1,1) has the least squares solution (3/25)(1,2) of smallest norm. */
  @Test
  void singularValuesAnswerWithTheSmallestLeastSquaresSolution() {
    double[] x = Catalogue.solve("commons-math-svd", RANK_ONE, new double[] {1, 1});
    assertThat(x[0]).isCloseTo(0.12, within(1e-15));
    assertThat(x[1]).isCloseTo(0.24, within(1e-15));
  }

  @Test
  void aLibrarysExceptionIsKeptAsTheCause() {
    for (String id : List.of("commons-math-lu", "commons-math-qr")) {
      assertThatExceptionOfType(ArithmeticException.class)
          .isThrownBy(() -> Catalogue.solve(id, ZERO, new double[] {1, 1}))
          .withMessageStartingWith("the library declines the matrix")
          .withCauseInstanceOf(SingularMatrixException.class);
    }
  }

  /** The library's absolute threshold is part of what is compared. */
  @Test
  void commonsMathCallsATinyMultipleOfTheIdentitySingular() {
    double[] b = {1, 1};
    double[][] tiny = {{1e-12, 0}, {0, 1e-12}};
    assertThat(Outcome.of(CommonsMath.LU, tiny, b)).isEqualTo(Outcome.DECLINES);
    assertThat(Catalogue.solve("gauss-partial", tiny, b)).containsExactly(1 / 1e-12, 1 / 1e-12);
  }

  @Test
  void theSentenceSaysWhichColumn() {
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> Catalogue.solve("gauss-partial", RANK_ONE, new double[] {1, 1}))
        .withMessage(
            "the matrix is singular to this candidate:"
                + " the pivot of column 2 is zero, and it must not be");
  }

  @Test
  void choleskyDeclinesWhatIsNotSymmetricOrNotPositiveDefinite() {
    double[] b = {1, 1};
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> Catalogue.solve("cholesky", new double[][] {{2, 1}, {0, 2}}, b))
        .withMessageContaining("not symmetric: entry (2, 1)");
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> Catalogue.solve("cholesky", new double[][] {{1, 2}, {2, 1}}, b))
        .withMessageContaining("not positive definite to this candidate: the pivot of column 2");
  }

  @Test
  void cramerDeclinesMoreThanTenEquations() {
    Candidate<LinearSolver> cramer = Catalogue.candidate("cramer");
    assertThat(cramer.kernel().solve(Systems.identity(10), new double[10])).hasSize(10);
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> cramer.kernel().solve(Systems.identity(11), new double[11]))
        .withMessageContaining("at most 10 equations, and there are 11");
  }
}
