package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Candidate;

/**
 * Systems of small integers with determinant 1 and a solution of integers from −9 to 9, so that
 * input and solution are exact.
 *
 * <p>A backward error of c u is a forward error of at most c κ u to first order (Higham 2002,
 * Theorem 7.2), and c = 10n holds the product of a low-degree polynomial in n and a growth factor
 * that stays near 1 here. Classical Gram-Schmidt loses orthogonality as κ² u instead (Giraud,
 * Langou and Rozložník, The loss of orthogonality in the Gram-Schmidt orthogonalization process,
 * 2005), and is allowed 10n κ² u.
 */
class WellConditionedSystemsTest {

  private static final int LARGEST = 9;

  @ParameterizedTest
  @MethodSource("steelyard.algorithms.solve.Catalogue#all")
  void everySolverIsAsAccurateAsThePositiveDefiniteSystemsAllow(Candidate<LinearSolver> candidate) {
    SplittableRandom random = new SplittableRandom(17);
    for (int n = 1; n <= LARGEST; n++) {
      check(candidate, Systems.unimodular(n, true, random), random);
    }
  }

  @ParameterizedTest
  @MethodSource("steelyard.algorithms.solve.Catalogue#general")
  void everySolverIsAsAccurateAsTheUnsymmetricSystemsAllow(Candidate<LinearSolver> candidate) {
    SplittableRandom random = new SplittableRandom(18);
    for (int n = 1; n <= LARGEST; n++) {
      check(candidate, Systems.unimodular(n, false, random), random);
    }
  }

  private static void check(
      Candidate<LinearSolver> candidate, double[][] a, SplittableRandom random) {
    int n = a.length;
    double[] x = Systems.digits(n, random);
    x[0] = 9;
    double[] b = Systems.times(a, x);
    ExactSystem system = new ExactSystem(a, b);
    assertThat(system.forwardError(x)).isZero();
    double kappa = system.condition();
    double allowed =
        10 * n * Catalogue.U * (candidate.id().equals("qr-cgs") ? kappa * kappa : kappa);
    double[] answer = candidate.kernel().solve(a, b);
    assertThat(system.forwardError(answer)).as("n = %d", n).isLessThanOrEqualTo(allowed);
    candidate
        .bound()
        .ifPresent(
            bound ->
                assertThat(system.backwardError(answer))
                    .as("claimed, n = %d", n)
                    .isLessThanOrEqualTo(bound.formula().at(n, kappa, Catalogue.U)));
  }
}
