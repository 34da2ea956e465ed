package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;

class ScaledSystemTest {
  @Test
  void scalesWithoutRoundingToRowsOfSizeOne() {
    UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(4L);
    for (int trial = 0; trial < 200; trial++) {
      int n = 1 + random.nextInt(5);
      double[][] a = new double[n][n];
      double[] b = new double[n];
      for (int i = 0; i < n; i++) {
        b[i] = random.nextDouble();
        for (int j = 0; j < n; j++) {
          a[i][j] = Math.scalb(random.nextDouble() + 0.1, random.nextInt(600) - 300);
        }
      }
      ScaledSystem scaled = new ScaledSystem(a, b);
      for (int i = 0; i < n; i++) {
        double largest = 0;
        for (int j = 0; j < n; j++) {
          double entry = scaled.matrix[i * n + j];
          int shift = scaled.matrixShift + scaled.rowShift[i] + scaled.columnShift[j];
          assertThat(Math.scalb(entry, -shift)).isEqualTo(a[i][j]);
          largest = Math.max(largest, entry);
        }
        assertThat(largest).isLessThan(1);
        assertThat(scaled.rowShift[i]).isBetween(0, 400);
      }
    }
  }

  @Test
  void magnitudeIsTheExponentOfTheNextPowerOfTwo() {
    assertThat(ScaledSystem.magnitude(1)).isEqualTo(1);
    assertThat(ScaledSystem.magnitude(Math.nextDown(1.0))).isZero();
    assertThat(ScaledSystem.magnitude(Double.MIN_VALUE)).isEqualTo(-1073);
    assertThat(ScaledSystem.magnitude(-Double.MAX_VALUE)).isEqualTo(1024);
  }
}
