package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.problems.exact.Dyadic;

class TwofoldProductTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(31L);

  // Blocks of 16: a product takes part in 16 sums of its block and one for every block; a
  // correction
  // in two operations for each product of its block, one for each block, and four of its own.
  @ParameterizedTest
  @CsvSource({"1, 17, 37", "16, 17, 37", "17, 18, 38", "400, 41, 61", "1000, 79, 99"})
  void theLongestChainsAreCounted(int size, int sums, int corrections) {
    assertThat(TwofoldProduct.sums(size)).isEqualTo(sums);
    assertThat(TwofoldProduct.corrections(size)).isEqualTo(corrections);
  }

  @Test
  void bothKindsOfRowsAreAsGoodAsTwiceThePrecision() {
    for (int n = 1; n <= 40; n += 3) {
      double[][] x = entries(n, 1);
      double[][] y = entries(n, 0x1p-53);
      double[] high = entries(n, 1)[0];
      double[] low = entries(n, 0x1p-53)[0];
      TwofoldProduct product = new TwofoldProduct(n);
      TwofoldRow left = product.row(0, -1, high, low, x);
      for (int j = 0; j < n; j++) {
        Dyadic exact = j == 0 ? Dyadic.ONE.negate() : Dyadic.ZERO;
        for (int k = 0; k < n; k++) {
          Dyadic factor = Dyadic.of(high[k]).add(Dyadic.of(low[k]));
          exact = exact.add(factor.multiply(Dyadic.of(x[k][j])));
        }
        requireNear(exact, left, j, n);
      }
      TwofoldRow right = product.row(high, x, y);
      for (int j = 0; j < n; j++) {
        Dyadic exact = Dyadic.ZERO;
        for (int k = 0; k < n; k++) {
          Dyadic entry = Dyadic.of(x[k][j]).add(Dyadic.of(y[k][j]));
          exact = exact.add(Dyadic.of(high[k]).multiply(entry));
        }
        requireNear(exact, right, j, n);
      }
    }
  }

  // Every entry of either factor is below 1, so that S is at most n + 1. What remains of an entry
  // after it was rounded is known to twice the precision.
  private static void requireNear(Dyadic exact, TwofoldRow row, int at, int n) {
    Dyadic found = Dyadic.of(row.rounded(at)).add(Dyadic.of(row.rest(at)));
    double error = exact.subtract(found).abs().doubleValue();
    double gammas =
        Allowances.PROVEN.gamma(TwofoldProduct.sums(n) + 4)
            * Allowances.PROVEN.gamma(TwofoldProduct.corrections(n));
    assertThat(error).isLessThanOrEqualTo(gammas * (n + 1));
    assertThat(row.rounded(at)).isEqualTo(found.doubleValue());
  }

  private double[][] entries(int n, double scale) {
    double[][] entries = new double[n][n];
    for (double[] row : entries) {
      for (int j = 0; j < n; j++) {
        row[j] = scale * (2 * random.nextDouble() - 1);
      }
    }
    return entries;
  }
}
