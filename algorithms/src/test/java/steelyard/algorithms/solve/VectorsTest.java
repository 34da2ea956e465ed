package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class VectorsTest {

  /**
   * Both ends of the range, where the squares are infinite or zero; powers of two round nothing.
   */
  @ParameterizedTest
  @ValueSource(ints = {0, 1020, -1022, -1074})
  void lengthsNeitherOverflowNorUnderflow(int exponent) {
    double unit = Math.scalb(1.0, exponent);
    assertThat(Vectors.length(new double[] {3 * unit, -4 * unit})).isEqualTo(5 * unit);
  }

  @Test
  void lengthsOfNothingAndOfNoNumbers() {
    assertThat(Vectors.length(new double[0])).isZero();
    assertThat(Vectors.length(new double[] {0, -0.0})).isZero();
    assertThat(Vectors.length(new double[] {1, Double.NEGATIVE_INFINITY}))
        .isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(Vectors.length(new double[] {Double.POSITIVE_INFINITY, Double.NaN})).isNaN();
  }

  @ParameterizedTest
  @ValueSource(strings = {"qr-householder", "qr-mgs", "qr-cgs"})
  void orthogonalSolversWorkNearTheEndsOfTheRange(String id) {
    for (double unit : new double[] {0x1p600, 0x1p-600}) {
      double[][] a = {{3 * unit, 1 * unit}, {4 * unit, 2 * unit}};
      double[] b = {4 * unit, 6 * unit};
      ExactSystem system = new ExactSystem(a, b);
      assertThat(system.forwardError(Catalogue.solve(id, a, b)))
          .isLessThanOrEqualTo(20 * system.condition() * Catalogue.U);
    }
  }
}
