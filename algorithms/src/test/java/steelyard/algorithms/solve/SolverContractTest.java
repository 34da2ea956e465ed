package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.util.Arrays;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Candidate;

/** What every solver owes its caller, whatever its accuracy. */
class SolverContractTest {

  private static final String ALL = "steelyard.algorithms.solve.Catalogue#all";

  @ParameterizedTest
  @MethodSource(ALL)
  void noEquationsHaveTheEmptySolution(Candidate<LinearSolver> candidate) {
    assertThat(candidate.kernel().solve(new double[0][], new double[0])).isEmpty();
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void oneEquationIsSolvedUpToFourRoundings(Candidate<LinearSolver> candidate) {
    double[][] a = {{3}};
    double[] b = {-2};
    double[] x = candidate.kernel().solve(a, b);
    assertThat(x).hasSize(1);
    assertThat(new ExactSystem(a, b).forwardError(x)).isLessThanOrEqualTo(4 * Catalogue.U);
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void twoEquationsAreSolved(Candidate<LinearSolver> candidate) {
    double[][] a = {{4, 1}, {1, 3}};
    double[] b = {1, 2};
    ExactSystem system = new ExactSystem(a, b);
    assertThat(system.forwardError(candidate.kernel().solve(a, b)))
        .isLessThanOrEqualTo(20 * system.condition() * Catalogue.U);
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void theIdentityGivesTheRightHandSideBack(Candidate<LinearSolver> candidate) {
    double[] b = {1, -0.1, 1e300, 1e-300};
    double[] x = candidate.kernel().solve(Systems.identity(4), b);
    assertThat(x).containsExactly(b).isNotSameAs(b);
  }

  /** A permutation has zeros on its diagonal and is not symmetric. */
  @ParameterizedTest
  @MethodSource(ALL)
  void aPermutationIsUndoneByAllThatPivotOrNeedNotPivot(Candidate<LinearSolver> candidate) {
    double[][] a = Systems.cycle(5);
    double[] b = {0.1, 0.2, 0.3, 0.4, 0.5};
    if (Set.of("gauss-none", "cholesky").contains(candidate.id())) {
      assertThatExceptionOfType(ArithmeticException.class)
          .isThrownBy(() -> candidate.kernel().solve(a, b));
    } else {
      ExactSystem system = new ExactSystem(a, b);
      assertThat(system.forwardError(candidate.kernel().solve(a, b)))
          .isLessThanOrEqualTo(50 * system.condition() * Catalogue.U);
    }
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void theInputStaysAsItIsBitForBit(Candidate<LinearSolver> candidate) {
    double[][] a = Systems.hilbert(6);
    double[] b = {-0.0, 1, 2, 3, 4, 5};
    candidate.kernel().solve(a, b);
    assertThat(Arrays.deepEquals(a, Systems.hilbert(6))).isTrue();
    assertThat(Arrays.equals(b, new double[] {-0.0, 1, 2, 3, 4, 5})).isTrue();
  }

  @ParameterizedTest
  @MethodSource(ALL)
  void theSameInputHasTheSameAnswerBitForBitWhateverCameBetween(Candidate<LinearSolver> candidate) {
    double[][] a = Systems.hilbert(6);
    double[] b = {1, 0.5, 0.25, 0.125, 1, 1};
    double[] first = candidate.kernel().solve(a, b).clone();
    candidate.kernel().solve(new double[][] {{4, 1}, {1, 3}}, new double[] {1, 2});
    assertThat(Arrays.equals(candidate.kernel().solve(a, b), first)).isTrue();
  }
}
