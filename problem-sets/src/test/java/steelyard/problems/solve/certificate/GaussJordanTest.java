package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;

/** The elimination says when it broke down, and otherwise is as good as its arithmetic. */
class GaussJordanTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(17L);

  @Test
  void pivotsThatAreZeroOrNotFiniteAreRefused() {
    for (int n = 1; n <= 9; n++) {
      double[][] zeroColumn = random(n);
      for (double[] row : zeroColumn) {
        row[n - 1] = 0;
      }
      assertThat(GaussJordan.invert(new DoubleRows(zeroColumn))).isFalse();
      double[][] infinite = random(n);
      infinite[n - 1][0] = Double.POSITIVE_INFINITY;
      assertThat(GaussJordan.invert(new DoubleRows(infinite))).isFalse();
    }
  }

  @Test
  void inversesAreAsGoodAsTheirArithmetic() {
    for (int n = 1; n <= 25; n += 3) {
      ScaledSystem system = new ScaledSystem(random(n), new double[n]);
      assertThat(worst(new DoubleInverse.DoubleRoute(), system)).isLessThan(1e-9);
      assertThat(worst(new FixedPointInverse.FixedPointRoute(256), system)).isLessThan(1e-70);
    }
  }

  @Test
  void doubleDoubleInvertsWhatDoubleCannot() {
    for (int n = 12; n <= 20; n++) {
      double[][] hilbert = new double[n][n];
      for (int i = 0; i < n; i++) {
        int row = i;
        Arrays.setAll(hilbert[i], j -> 1.0 / (row + j + 1));
      }
      ScaledSystem system = new ScaledSystem(hilbert, new double[n]);
      assertThat(worst(new DoubleInverse.DoubleRoute(), system)).isGreaterThan(1);
      assertThat(worst(new DoubleDoubleInverse.DoubleDoubleRoute(), system)).isLessThan(0x1p-12);
    }
  }

  private static double worst(Route route, ScaledSystem system) {
    return Arrays.stream(route.invert(system).orElseThrow().residualRowSums()).max().orElseThrow();
  }

  private double[][] random(int n) {
    double[][] a = new double[n][n];
    for (double[] row : a) {
      Arrays.setAll(row, j -> 2 * random.nextDouble() - 1);
    }
    return a;
  }
}
