package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;

class ModularDeterminantTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(9L);

  @Test
  void singularByConstructionIsZeroAndOneBitMoreIsNot() {
    for (int n = 2; n <= 12; n++) {
      double[] a = new double[n * n];
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n - 1; j++) {
          a[i * n + j] = Math.scalb(random.nextInt(1 << 20) + 1.0, -random.nextInt(20));
          a[i * n + n - 1] += a[i * n + j];
        }
      }
      assertThat(ModularDeterminant.isZero(n, a)).isTrue();
      a[n - 1] = Math.nextUp(a[n - 1]);
      assertThat(ModularDeterminant.isZero(n, a)).isFalse();
    }
  }

  @Test
  void multipleOfTheFirstPrimeIsNotTakenForZero() {
    assertThat(ModularDeterminant.isZero(1, new double[] {Integer.MAX_VALUE})).isFalse();
    assertThat(ModularDeterminant.isZero(2, new double[] {Integer.MAX_VALUE, 0, 5, 1})).isFalse();
  }
}
