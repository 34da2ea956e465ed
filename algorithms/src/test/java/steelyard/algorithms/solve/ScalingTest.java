package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Badly scaled rows: small normwise backward errors, componentwise ones that differ widely. */
class ScalingTest {

  /**
   * A well-conditioned system whose first row is multiplied by 2⁶⁴, which misleads the pivoting.
   */
  private static final double[][] ROW_SCALED = {{1, 0x1p64}, {1, 1}};

  private static final double[] RIGHT = {0x1p64, 2};
  private static final ExactSystem SYSTEM = new ExactSystem(ROW_SCALED, RIGHT);
  private static final double STABLE = 20 * Catalogue.U;

  @ParameterizedTest
  @ValueSource(
      strings = {
        "gauss-partial",
        "gauss-jordan",
        "inverse",
        "qr-householder",
        "qr-mgs",
        "commons-math-lu",
        "commons-math-qr",
        "commons-math-svd",
        "ejml-lu",
        "ejml-qr"
      })
  void aLargeRowDrownsTheOther(String id) {
    double[] x = Catalogue.solve(id, ROW_SCALED, RIGHT);
    assertThat(SYSTEM.backwardError(x)).isLessThanOrEqualTo(STABLE);
    assertThat(SYSTEM.componentwiseBackwardError(x)).isGreaterThan(0.1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "gauss-equilibrated",
        "gauss-refined",
        "gauss-refined-extended",
        "gauss-rook",
        "gauss-complete"
      })
  void scalingRefinementAndWiderSearchesCopeWithIt(String id) {
    double[] x = Catalogue.solve(id, ROW_SCALED, RIGHT);
    assertThat(SYSTEM.componentwiseBackwardError(x)).isLessThanOrEqualTo(STABLE);
    assertThat(SYSTEM.forwardError(x)).isLessThanOrEqualTo(STABLE);
  }

  /** Powers of two round nothing, so that equilibration undoes a scaling of rows completely. */
  @Test
  void onlyEquilibrationIsBlindToTheScalesOfRows() {
    SplittableRandom random = new SplittableRandom(6);
    int n = 10;
    double[][] a = new double[n][];
    double[] b = Systems.uniform(n, random);
    double[][] scaled = new double[n][n];
    double[] scaledRight = new double[n];
    for (int i = 0; i < n; i++) {
      a[i] = Systems.uniform(n, random);
      double scale = Math.scalb(1.0, random.nextInt(-40, 40));
      Vectors.add(scale, a[i], scaled[i]);
      scaledRight[i] = scale * b[i];
    }
    assertThat(sameBits("gauss-equilibrated", a, b, scaled, scaledRight)).isTrue();
    assertThat(sameBits("gauss-partial", a, b, scaled, scaledRight)).isFalse();
    assertThat(sameBits("qr-householder", a, b, scaled, scaledRight)).isFalse();
  }

  private static boolean sameBits(
      String id, double[][] a, double[] b, double[][] scaled, double[] scaledRight) {
    return Arrays.equals(Catalogue.solve(id, a, b), Catalogue.solve(id, scaled, scaledRight));
  }

  /** Entries near the ends of the range are brought to the middle before anything is multiplied. */
  @Test
  void equilibrationSolvesWhereOthersOverflow() {
    double[][] a = {{1e300, 1e-300}, {1e-300, 1e300}};
    double[] b = {1e300, 1e300};
    assertThat(Catalogue.solve("gauss-equilibrated", a, b)).containsExactly(1, 1);
    assertThat(Outcome.of(Catalogue.candidate("cramer").kernel(), a, b))
        .isEqualTo(Outcome.NOT_FINITE);
  }
}
