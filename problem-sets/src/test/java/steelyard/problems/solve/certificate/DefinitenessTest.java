package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.solve.RationalInverse;

class DefinitenessTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(17L);

  // Sylvester: positive definite if and only if every leading principal minor is positive. These
  // matrices of small integers are either singular, indefinite, or definite by a margin.
  @Test
  void agreesWithExactLeadingMinors() {
    int definite = 0;
    for (int trial = 0; trial < 600; trial++) {
      double[][] a = gramMatrix(2 + random.nextInt(4), random.nextInt(3) - 1);
      boolean expected = hasPositiveMinors(a);
      definite += expected ? 1 : 0;
      assertThat(Definiteness.isProved(a)).as(Arrays.deepToString(a)).isEqualTo(expected);
    }
    assertThat(definite).isBetween(100, 500);
  }

  @Test
  void decidesWithinAFewRoundingsOfSingularity() {
    assertThat(Definiteness.isProved(new double[][] {{1, 1}, {1, Math.nextUp(1.0)}})).isTrue();
    assertThat(Definiteness.isProved(new double[][] {{1, 1}, {1, 1}})).isFalse();
    assertThat(Definiteness.isProved(new double[][] {{1, 1}, {1, Math.nextDown(1.0)}})).isFalse();
  }

  @Test
  void scaleDoesNotMatter() {
    for (double scale : new double[] {0x1p-1000, 0x1p-3, 0x1p1000}) {
      assertThat(Definiteness.isProved(new double[][] {{2 * scale, scale}, {scale, 2 * scale}}))
          .isTrue();
      assertThat(Definiteness.isProved(new double[][] {{scale, 2 * scale}, {2 * scale, scale}}))
          .isFalse();
    }
  }

  @Test
  void nonpositiveDiagonalIsRefuted() {
    assertThat(Definiteness.isProved(new double[][] {{1, 0}, {0, 0}})).isFalse();
    assertThat(Definiteness.isProved(new double[][] {{-1}})).isFalse();
  }

  private double[][] gramMatrix(int n, int shift) {
    double[][] factor = new double[n][n];
    for (double[] row : factor) {
      Arrays.setAll(row, j -> random.nextInt(5) - 2);
    }
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = i == j ? shift : 0;
        for (int k = 0; k < n; k++) {
          a[i][j] += factor[i][k] * factor[j][k];
        }
      }
    }
    return a;
  }

  private static boolean hasPositiveMinors(double[][] a) {
    for (int n = 1; n <= a.length; n++) {
      double[][] leading = new double[n][];
      for (int i = 0; i < n; i++) {
        leading[i] = Arrays.copyOf(a[i], n);
      }
      if (determinant(leading).compareTo(BigFraction.ZERO) <= 0) {
        return false;
      }
    }
    return true;
  }

  private static BigFraction determinant(double[][] a) {
    try {
      return new RationalInverse(a).determinant();
    } catch (ArithmeticException singular) {
      return BigFraction.ZERO;
    }
  }
}
