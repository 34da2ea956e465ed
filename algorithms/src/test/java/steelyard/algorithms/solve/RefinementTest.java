package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.algorithms.Bound;

/** What refinement repairs, and what it cannot. */
class RefinementTest {

  /** κ u is 7e-6 for order 8 and 8e-3 for order 10. */
  @ParameterizedTest
  @ValueSource(ints = {8, 9, 10})
  void extendedResidualsMakeHilbertSystemsAccurateToWorkingPrecision(int n) {
    double[][] a = Systems.hilbert(n);
    double[] b = Systems.uniform(n, new SplittableRandom(n));
    ExactSystem system = new ExactSystem(a, b);
    double[] refined = Catalogue.solve("gauss-refined-extended", a, b);
    assertThat(system.forwardError(refined)).isLessThanOrEqualTo(2 * Catalogue.U);
    for (String id : new String[] {"gauss-partial", "gauss-refined"}) {
      assertThat(system.forwardError(Catalogue.solve(id, a, b))).isGreaterThan(1e4 * Catalogue.U);
    }
  }

  /** Higham 2002, Theorem 12.4: at most 2γₙ₊₁, unless conditioning or scaling are extreme. */
  @ParameterizedTest
  @ValueSource(ints = {16, 24, 32, 40})
  void workingPrecisionMakesTheComponentwiseBackwardErrorSmall(int n) {
    double[][] a = Systems.wilkinsonGrowth(n);
    double[] b = Systems.uniform(n, new SplittableRandom(n));
    ExactSystem system = new ExactSystem(a, b);
    double limit = 2 * Bound.gamma(n + 1, Catalogue.U);
    assertThat(omega(system, "gauss-refined", a, b)).isLessThanOrEqualTo(limit);
    assertThat(omega(system, "gauss-partial", a, b)).isGreaterThan(limit);
  }

  private static double omega(ExactSystem system, String id, double[][] a, double[] b) {
    return system.componentwiseBackwardError(Catalogue.solve(id, a, b));
  }

  /** Nothing converges when κ u exceeds 1; refinement ends all the same, with some answer. */
  @ParameterizedTest
  @ValueSource(strings = {"gauss-refined", "gauss-refined-extended"})
  void refinementEndsWhereItCannotConverge(String id) {
    double[][] a = Systems.hilbert(14);
    double[] b = new double[14];
    b[0] = 1;
    double[] x = Catalogue.solve(id, a, b);
    assertThat(Arrays.stream(x)).allMatch(Double::isFinite);
    assertThat(new ExactSystem(a, b).forwardError(x)).isGreaterThan(0.01);
  }

  /**
   * Kahan's system, which elimination solves exactly: an exact solution has no residual, so that
   * there is nothing to correct.
   */
  @ParameterizedTest
  @ValueSource(strings = {"gauss-refined", "gauss-refined-extended"})
  void anExactSolutionIsLeftAlone(String id) {
    double[][] a = {{12969, 8648}, {2161, 1441}};
    double[] b = {8642, 1440};
    assertThat(Catalogue.solve("gauss-partial", a, b)).containsExactly(2, -2);
    assertThat(Catalogue.solve(id, a, b)).containsExactly(2, -2);
  }
}
