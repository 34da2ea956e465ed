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
  void matrixAndRightHandSideAreBroughtToTheSizeOfOne() {
    ScaledSystem scaled =
        new ScaledSystem(new double[][] {{3, 24}, {0x1p-20, 1}}, new double[] {0, 0x1.8p40});
    assertThat(scaled.matrixShift).isEqualTo(-5);
    assertThat(scaled.vectorShift).isEqualTo(-41);
    assertThat(scaled.columnShift).containsExactly(3, 0);
    assertThat(scaled.rowShift).containsExactly(0, 4);
    assertThat(scaled.matrix).containsExactly(0.75, 0.75, 0x1p-18, 0.5);
    assertThat(scaled.rightHandSide).containsExactly(0, 12);
    assertThat(new ScaledSystem(new double[][] {{3}}, new double[] {0}).vectorShift).isZero();
  }

  // Beyond 400 powers of two the units stay as they are, and nothing overflows.
  @Test
  void rowsAndColumnsFarApartAreLeftAlone() {
    for (int spread : new int[] {400, 401}) {
      double least = Math.scalb(0.5, -spread);
      ScaledSystem scaled =
          new ScaledSystem(new double[][] {{0.5, 0}, {0, least}}, new double[] {0.5, 0.5});
      assertThat(scaled.columnShift[1]).isEqualTo(spread == 400 ? 400 : 0);
      assertThat(scaled.rowShift).containsExactly(0, 0);
      assertThat(scaled.matrix[3]).isEqualTo(spread == 400 ? 0.5 : least);
    }
  }

  @Test
  void magnitudeIsTheExponentOfTheNextPowerOfTwo() {
    assertThat(ScaledSystem.magnitude(1)).isEqualTo(1);
    assertThat(ScaledSystem.magnitude(Math.nextDown(1.0))).isZero();
    assertThat(ScaledSystem.magnitude(Double.MIN_VALUE)).isEqualTo(-1073);
    assertThat(ScaledSystem.magnitude(-Double.MAX_VALUE)).isEqualTo(1024);
  }

  @Test
  void addsUpTheMagnitudesOfEachRow() {
    double[][] a = {{0.5, -0.25, 0}, {0.5, 0.5, -0.75}, {0, 0.625, 0.5}};
    ScaledSystem scaled = new ScaledSystem(a, new double[] {0.5, 0.5, 0.5});
    assertThat(scaled.matrix).containsExactly(0.5, -0.25, 0, 0.5, 0.5, -0.75, 0, 0.625, 0.5);
    assertThat(scaled.absoluteRowSums()).containsExactly(0.75, 1.75, 1.125);
  }
}
