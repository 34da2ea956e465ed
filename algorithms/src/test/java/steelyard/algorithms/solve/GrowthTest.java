package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Wilkinson's matrix of order 48: well-conditioned, and its elements grow by 2⁴⁷ under partial
 * pivoting.
 */
class GrowthTest {

  private static final int N = 48;
  private static final double[][] A = Systems.wilkinsonGrowth(N);
  private static final double[] B = Systems.uniform(N, new SplittableRandom(3));
  private static final ExactSystem SYSTEM = new ExactSystem(A, B);
  private static final double STABLE = 10 * N * Catalogue.U;

  @Test
  void theConditionNumberIsHarmless() {
    assertThat(SYSTEM.condition()).isLessThan(2 * N);
  }

  @Test
  void theLastElementGrowsAsPublished() {
    double[][] lu = LuFactors.of(A, Pivoting.PARTIAL).lu();
    assertThat(lu[N - 1][N - 1]).isEqualTo(0x1p47).isEqualTo(SolverBounds.partialGrowth(N));
    for (Pivoting pivoting : new Pivoting[] {Pivoting.ROOK, Pivoting.COMPLETE}) {
      for (double[] row : LuFactors.of(A, pivoting).lu()) {
        assertThat(Vectors.largest(row)).isLessThanOrEqualTo(2);
      }
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "gauss-partial",
        "gauss-none",
        "gauss-jordan",
        "gauss-equilibrated",
        "commons-math-lu",
        "ejml-lu"
      })
  void eliminationByColumnsLosesMostDigits(String id) {
    assertThat(SYSTEM.backwardError(Catalogue.solve(id, A, B))).isGreaterThan(1e8 * STABLE);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "gauss-rook",
        "gauss-complete",
        "qr-householder",
        "qr-mgs",
        "commons-math-qr",
        "commons-math-svd",
        "ejml-qr",
        "gauss-refined",
        "gauss-refined-extended"
      })
  void otherPivotsReflectionsAndRefinementLoseNothing(String id) {
    assertThat(SYSTEM.backwardError(Catalogue.solve(id, A, B))).isLessThanOrEqualTo(STABLE);
  }
}
