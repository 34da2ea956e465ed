package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Bound.Limits;

class SolverBoundsTest {

  @Test
  void allLimitTheNormwiseBackwardError() {
    assertThat(LinearSolvers.all())
        .flatExtracting(candidate -> candidate.bound().stream().toList())
        .extracting(Bound::limits)
        .hasSize(4)
        .containsOnly(Limits.BACKWARD_ERROR);
  }

  /** For n = 3: 2², and the square root of 3 · 2 · 3^(1/2), worked out by hand. */
  @Test
  void growthFactorsAreThePublishedOnes() {
    assertThat(SolverBounds.partialGrowth(3)).isEqualTo(4);
    assertThat(SolverBounds.completeGrowth(1)).isEqualTo(1);
    assertThat(SolverBounds.completeGrowth(2)).isCloseTo(2, withinPercentage(1e-12));
    assertThat(SolverBounds.completeGrowth(3))
        .isCloseTo(Math.sqrt(6 * Math.sqrt(3)), withinPercentage(1e-12));
  }

  /**
   * Rook pivoting is partial pivoting too, and 1.5 n^(¾ ln n) is the smaller bound from n = 3 on.
   */
  @Test
  void rookGrowthIsTheSmallerOfItsTwoBounds() {
    assertThat(SolverBounds.rookGrowth(2)).isEqualTo(2);
    assertThat(SolverBounds.rookGrowth(3)).isLessThan(4).isGreaterThan(3.7);
    // ln 100 = 4.60517, so the exponent of 100 is 3.453878 and 1.5 · 100^3.453878 = 1.21296e7.
    assertThat(SolverBounds.rookGrowth(100)).isCloseTo(1.21296e7, withinPercentage(1e-3));
  }

  /** n² γ₃ₙ 2ⁿ⁻¹ and n γ₃ₙ₊₁/(1−γₙ₊₁) for n = 10, to first order in u. */
  @Test
  void claimsHaveTheStatedSize() {
    double u = Catalogue.U;
    assertThat(at("gauss-partial", 10)).isCloseTo(100 * 30 * u * 512, withinPercentage(1e-10));
    assertThat(at("cholesky", 10)).isCloseTo(10 * 31 * u, withinPercentage(1e-10));
    assertThat(at("gauss-complete", 10)).isLessThan(at("gauss-rook", 10));
    assertThat(at("gauss-rook", 10)).isLessThan(at("gauss-partial", 10));
  }

  @Test
  void aVacuousClaimIsInfiniteAndNeverNan() {
    assertThat(at("gauss-partial", 2000)).isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(SolverBounds.cholesky().formula().at(100, 1, 0.01))
        .isEqualTo(Double.POSITIVE_INFINITY);
  }

  @ParameterizedTest
  @ValueSource(strings = {"gauss-partial", "gauss-rook", "gauss-complete"})
  void eliminationKeepsItsClaimOnRandomAndOnWorstCases(String id) {
    SplittableRandom random = new SplittableRandom(4);
    for (int n : new int[] {1, 2, 5, 20, 40}) {
      double[][] uniform = new double[n][];
      for (int i = 0; i < n; i++) {
        uniform[i] = Systems.uniform(n, random);
      }
      for (double[][] a : new double[][][] {uniform, Systems.wilkinsonGrowth(n)}) {
        assertKept(id, a, Systems.uniform(n, random));
      }
    }
  }

  @Test
  void choleskyKeepsItsClaimOnHilbertMatrices() {
    for (int n = 1; n <= 11; n++) {
      assertKept("cholesky", Systems.hilbert(n), Systems.uniform(n, new SplittableRandom(n)));
    }
  }

  /** What is claimed for one candidate is not true of all: the claims can fail. */
  @Test
  void theClaimForCompletePivotingIsFalseOfPartialPivoting() {
    int n = 48;
    double[][] a = Systems.wilkinsonGrowth(n);
    double[] b = Systems.uniform(n, new SplittableRandom(5));
    assertThat(new ExactSystem(a, b).backwardError(Catalogue.solve("gauss-partial", a, b)))
        .isGreaterThan(at("gauss-complete", n))
        .isLessThanOrEqualTo(at("gauss-partial", n));
  }

  private static void assertKept(String id, double[][] a, double[] b) {
    double error = new ExactSystem(a, b).backwardError(Catalogue.solve(id, a, b));
    assertThat(error).as("n = %d", b.length).isLessThanOrEqualTo(at(id, b.length));
  }

  private static double at(String id, int n) {
    return Catalogue.candidate(id).bound().orElseThrow().formula().at(n, 1, Catalogue.U);
  }
}
