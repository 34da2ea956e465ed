package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.algorithms.Candidate;

/** Small systems from the literature whose solutions are known exactly. */
class PublishedSystemsTest {

  private static final String ALL = "steelyard.algorithms.solve.Catalogue#all";
  private static final String GENERAL = "steelyard.algorithms.solve.Catalogue#general";

  /** Kahan 1966, in integers; κ = 3.9e8, the solution is (2, −2). */
  @ParameterizedTest
  @MethodSource(GENERAL)
  void kahansSystemSpoilsTheSolutionInProportionToItsConditionNumber(
      Candidate<LinearSolver> candidate) {
    double[][] a = {{12969, 8648}, {2161, 1441}};
    double[] b = {8642, 1440};
    ExactSystem system = new ExactSystem(a, b);
    double allowed = 20 * system.condition() * Catalogue.U;
    double error = system.forwardError(candidate.kernel().solve(a, b));
    if (candidate.id().equals("qr-cgs")) {
      assertThat(error).isGreaterThan(1e4 * allowed);
    } else {
      assertThat(error).isLessThanOrEqualTo(allowed);
    }
  }

  /**
   * Rump's 2 by 2 system; κ = 1.2e17, the solution is (205117922, 83739041). A small backward error
   * with a useless solution is the problem's fault.
   */
  @ParameterizedTest
  @ValueSource(
      strings = {"gauss-partial", "gauss-rook", "gauss-complete", "cramer", "qr-mgs", "ejml-lu"})
  void rumpsSystemIsTooIllConditionedForBackwardStableSolvers(String id) {
    ExactSystem system = new ExactSystem(RUMP, RUMP_RIGHT);
    assertThat(system.forwardError(new double[] {205117922, 83739041})).isZero();
    double[] x = Catalogue.solve(id, RUMP, RUMP_RIGHT);
    assertThat(system.backwardError(x)).isLessThanOrEqualTo(20 * Catalogue.U);
    assertThat(system.forwardError(x)).isGreaterThan(0.1);
  }

  /** The smaller singular value is below the library's threshold and is dropped. */
  @Test
  void rumpsSystemLosesItsSmallSingularValue() {
    double[] x = Catalogue.solve("commons-math-svd", RUMP, RUMP_RIGHT);
    assertThat(new ExactSystem(RUMP, RUMP_RIGHT).backwardError(x)).isGreaterThan(0.1);
  }

  private static final double[][] RUMP = {{64919121, -159018721}, {41869520.5, -102558961}};
  private static final double[] RUMP_RIGHT = {1, 0};

  /** Wilson's matrix (Morris 1946), κ∞(A) = 4488: a small change of b is a large change of x. */
  @ParameterizedTest
  @MethodSource(ALL)
  void wilsonsSystemsAreSolvedAsWellAsTheirConditionNumbersAllow(
      Candidate<LinearSolver> candidate) {
    double[][] a = {{5, 7, 6, 5}, {7, 10, 8, 7}, {6, 8, 10, 9}, {5, 7, 9, 10}};
    // The right-hand sides are (23, 32, 33, 31) and (23.1, 31.9, 32.9, 31.1), in tenths.
    double[][] rights = {{230, 320, 330, 310}, {231, 319, 329, 311}};
    double[][] solutions = {{10, 10, 10, 10}, {146, -72, -25, 31}};
    for (int k = 0; k < rights.length; k++) {
      ExactSystem system = new ExactSystem(a, rights[k]);
      assertThat(system.forwardError(solutions[k])).isZero();
      double kappa = system.condition();
      double allowed = 40 * Catalogue.U * (candidate.id().equals("qr-cgs") ? kappa * kappa : kappa);
      assertThat(system.forwardError(candidate.kernel().solve(a, rights[k])))
          .isLessThanOrEqualTo(allowed);
    }
  }

  /** Higham 2002, section 1.12.1: a tiny pivot wipes out what stood below it. */
  @ParameterizedTest
  @MethodSource(GENERAL)
  void aTinyPivotRuinsEliminationWithoutPivotingAlone(Candidate<LinearSolver> candidate) {
    double[][] a = {{1e-20, 1}, {1, 1}};
    double[] b = {1, 2};
    ExactSystem system = new ExactSystem(a, b);
    double[] x = candidate.kernel().solve(a, b);
    if (candidate.id().equals("gauss-none")) {
      assertThat(x).containsExactly(0, 1);
      assertThat(system.backwardError(x)).isEqualTo(0.25);
    } else {
      assertThat(system.backwardError(x)).isLessThanOrEqualTo(20 * Catalogue.U);
    }
  }

  /**
   * Pascal's matrix is totally positive of determinant 1: no pivoting is needed, none is harmful.
   */
  @Test
  void pascalsMatrixIsEliminatedWithoutRoundingWhereNothingIsInterchanged() {
    double[][] a = {{1, 1, 1, 1}, {1, 2, 3, 4}, {1, 3, 6, 10}, {1, 4, 10, 20}};
    double[] b = Systems.times(a, new double[] {1, -2, 3, -4});
    for (String id : List.of("gauss-none", "cholesky", "cramer")) {
      assertThat(Catalogue.solve(id, a, b)).containsExactly(1, -2, 3, -4);
    }
  }

  /** κ is about 7e13, and the library's threshold of 1e-11 is absolute. */
  @Test
  void commonsMathCallsTheHilbertMatrixOfOrderTenSingular() {
    double[] b = new double[10];
    b[0] = 1;
    assertThatExceptionOfType(ArithmeticException.class)
        .isThrownBy(() -> Catalogue.solve("commons-math-lu", Systems.hilbert(10), b));
  }

  /** Cramer's rule is no longer forward stable beyond two equations; the inverse still is. */
  @Test
  void hilbertMatricesTellForwardStableFromUnstable() {
    double[][] a = Systems.hilbert(8);
    double[] b = new double[8];
    b[0] = 1;
    ExactSystem system = new ExactSystem(a, b);
    double allowed = 80 * system.condition() * Catalogue.U;
    for (String id : Set.of("gauss-jordan", "inverse", "qr-householder", "cholesky")) {
      assertThat(system.forwardError(Catalogue.solve(id, a, b))).isLessThanOrEqualTo(allowed);
    }
    for (String id : Set.of("cramer", "qr-cgs")) {
      assertThat(system.forwardError(Catalogue.solve(id, a, b))).isGreaterThan(100 * allowed);
    }
  }
}
