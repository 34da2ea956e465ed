package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import java.util.function.IntFunction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;

/** Each arithmetic's bound on the row sums of |I - R A| against their exact values, for any R. */
class ResidualBoundTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(21L);

  @Test
  void holdsInDoubleForInversesGoodAndBad() {
    for (int trial = 0; trial < 200; trial++) {
      int n = 1 + random.nextInt(11);
      ScaledSystem system = randomSystem(n);
      double[][] inverse = system.rows();
      if (GaussJordan.invert(new DoubleRows(inverse))) {
        disturb(inverse[random.nextInt(n)], trial);
        requireBound(
            system,
            new DoubleInverse(system, inverse, Allowances.PROVEN),
            at -> Dyadic.of(inverse[at / n][at % n]),
            1e-13);
      }
    }
  }

  @Test
  void holdsInDoubleDoubleForInversesGoodAndBad() {
    for (int trial = 0; trial < 200; trial++) {
      int n = 1 + random.nextInt(11);
      ScaledSystem system = randomSystem(n);
      double[][] high = system.rows();
      double[][] low = new double[n][n];
      if (GaussJordan.invert(new DoubleRows(high))) {
        for (int at = 0; at < n * n; at++) {
          low[at / n][at % n] = Math.ulp(high[at / n][at % n]) * (random.nextDouble() - 0.5);
        }
        disturb((trial % 2 == 0 ? high : low)[random.nextInt(n)], trial);
        requireBound(
            system,
            new DoubleDoubleInverse(system, high, low, Allowances.PROVEN),
            at -> Dyadic.of(high[at / n][at % n]).add(Dyadic.of(low[at / n][at % n])),
            1e-28);
      }
    }
  }

  @Test
  void holdsInFixedPointForInversesGoodAndBad() {
    int bits = 128;
    for (int trial = 0; trial < 50; trial++) {
      int n = 1 + random.nextInt(11);
      ScaledSystem system = randomSystem(n);
      BigInteger[] inverse = new BigInteger[n * n];
      for (int i = 0; i < inverse.length; i++) {
        Dyadic entry = Dyadic.of(system.matrix[i]).scalb(bits);
        inverse[i] = entry.significand().shiftLeft(entry.exponent());
      }
      if (GaussJordan.invert(new FixedPointRows(n, bits, inverse))) {
        inverse[0] = inverse[0].add(BigInteger.ONE.shiftLeft(random.nextInt(bits)));
        requireBound(
            system,
            new FixedPointInverse(bits, system, inverse),
            at -> new Dyadic(inverse[at], -bits),
            0);
      }
    }
  }

  // The bound exceeds the exact row sum by no more than rounding explains, which is relative to the
  // size of the inverse.
  private static void requireBound(
      ScaledSystem system, ApproximateInverse inverse, IntFunction<Dyadic> entry, double slack) {
    int n = system.size;
    double[] bounds = inverse.residualRowSums();
    for (int i = 0; i < n; i++) {
      Dyadic sum = Dyadic.ZERO;
      Dyadic size = Dyadic.ONE;
      for (int j = 0; j < n; j++) {
        Dyadic g = i == j ? Dyadic.ONE : Dyadic.ZERO;
        for (int k = 0; k < n; k++) {
          Dyadic product = entry.apply(i * n + k).multiply(Dyadic.of(system.matrix[k * n + j]));
          g = g.subtract(product);
          size = size.add(product.abs());
        }
        sum = sum.add(g.abs());
      }
      assertThat(Dyadic.of(bounds[i])).as("row %s of %s", i, n).isGreaterThanOrEqualTo(sum);
      double excess = Dyadic.of(bounds[i]).subtract(sum).doubleValue();
      assertThat(excess)
          .isLessThanOrEqualTo(slack * size.doubleValue() + 1e-13 * sum.doubleValue() + 1e-300);
    }
  }

  private void disturb(double[] entries, int trial) {
    int at = random.nextInt(entries.length);
    if (trial % 3 == 0) {
      entries[at] += Math.scalb(entries[at], -random.nextInt(100));
    } else if (trial % 3 == 1) {
      entries[at] = Math.scalb(entries[at], -900);
    }
  }

  private ScaledSystem randomSystem(int n) {
    double[][] a = new double[n][n];
    double[] b = new double[n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = Math.scalb(2 * random.nextDouble() - 1, -random.nextInt(1 + random.nextInt(300)));
      }
    }
    return new ScaledSystem(a, b);
  }
}
