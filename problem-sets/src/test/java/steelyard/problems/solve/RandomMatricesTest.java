package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;

class RandomMatricesTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(12L);

  @Test
  void orthogonalMatricesAreOrthogonal() {
    for (int n : new int[] {1, 2, 3, 10, 60}) {
      double[][] q = RandomMatrices.orthogonal(n, random);
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          double sum = 0;
          for (int k = 0; k < n; k++) {
            sum += q[i][k] * q[j][k];
          }
          assertThat(sum).isCloseTo(i == j ? 1 : 0, within(1e-14));
        }
      }
    }
  }

  // Under the Haar measure each entry has mean 0, mean square 1/n and, for n = 3, mean fourth power
  // 3/(n (n + 2)) = 1/5, and both determinants are equally likely. Bounds are five deviations.
  @Test
  void momentsAreThoseOfTheHaarMeasure() {
    int samples = 4000;
    double[][] mean = new double[3][3];
    double[][] square = new double[3][3];
    double[][] fourth = new double[3][3];
    int positive = 0;
    for (int sample = 0; sample < samples; sample++) {
      double[][] q = RandomMatrices.orthogonal(3, random);
      positive += determinant(q) > 0 ? 1 : 0;
      for (int i = 0; i < 3; i++) {
        for (int j = 0; j < 3; j++) {
          double s = q[i][j] * q[i][j];
          mean[i][j] += q[i][j] / samples;
          square[i][j] += s / samples;
          fourth[i][j] += s * s / samples;
        }
      }
    }
    assertThat(positive / (double) samples).isCloseTo(0.5, within(5 * 0.5 / Math.sqrt(samples)));
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        assertThat(mean[i][j]).isCloseTo(0, within(5 * 0.578 / Math.sqrt(samples)));
        assertThat(square[i][j]).isCloseTo(1 / 3.0, within(5 * 0.299 / Math.sqrt(samples)));
        assertThat(fourth[i][j]).isCloseTo(0.2, within(5 * 0.267 / Math.sqrt(samples)));
      }
    }
  }

  // Against the singular value decomposition of Apache Commons Math.
  @Test
  void reflectedDiagonalsHaveTheSingularValuesAskedFor() {
    for (int n : new int[] {1, 2, 7, 40}) {
      double[] values = new double[n];
      for (int i = 0; i < n; i++) {
        values[i] = Math.scalb(1.0, -i % 20);
      }
      double[][] a = ReflectedDiagonal.draw(n, random).around(values);
      double[] found =
          new SingularValueDecomposition(new Array2DRowRealMatrix(a)).getSingularValues();
      Arrays.sort(values);
      for (int i = 0; i < n; i++) {
        assertThat(found[n - 1 - i]).isCloseTo(values[i], within(1e-14));
      }
      assertThat(n == 1 || a[0][n - 1] != 0).isTrue();
    }
  }

  private static double determinant(double[][] q) {
    return q[0][0] * (q[1][1] * q[2][2] - q[1][2] * q[2][1])
        - q[0][1] * (q[1][0] * q[2][2] - q[1][2] * q[2][0])
        + q[0][2] * (q[1][0] * q[2][1] - q[1][1] * q[2][0]);
  }
}
