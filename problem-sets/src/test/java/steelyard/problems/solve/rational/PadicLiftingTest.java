package steelyard.problems.solve.rational;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigInteger;
import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.RationalInverse;

class PadicLiftingTest {
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
      assertThat(PadicLifting.of(n, a)).isEmpty();
      a[n - 1] = Math.nextUp(a[n - 1]);
      assertThat(PadicLifting.of(n, a)).isPresent();
    }
  }

  @Test
  void multiplesOfTheFirstPrimesAreNotTakenForZero() {
    double first = PrimeField.largest().prime();
    double second = PrimeField.largest().next().prime();
    assertThat(first).isEqualTo(268435399).isGreaterThan(second);
    requireSolved(new double[][] {{3 * first}}, new double[] {7});
    requireSolved(new double[][] {{first, 0}, {5, second}}, new double[] {1, first});
  }

  // S. M. Rump, Verification methods, Acta Numerica 19 (2010), 287-449: determinant -1/2, and a
  // solution of integers (values from memory, confirmed by exact arithmetic).
  @Test
  void solvesRumpsSystem() {
    double[] a = {64919121, -159018721, 41869520.5, -102558961};
    RationalVector x = PadicLifting.of(2, a).orElseThrow().solve(new double[] {1, 0});
    assertThat(x.numerators())
        .containsExactly(BigInteger.valueOf(205117922), BigInteger.valueOf(83739041));
    assertThat(x.denominator()).isEqualTo(BigInteger.ONE);
  }

  @Test
  void solvesRandomSystemsAsFractionFreeEliminationDoes() {
    for (int trial = 0; trial < 120; trial++) {
      int n = 1 + trial % 12;
      int spread = 1 + random.nextInt(trial % 3 == 0 ? 900 : 40);
      double[][] a = new double[n][n];
      double[] b = new double[n];
      for (int i = 0; i < n; i++) {
        b[i] = trial % 7 == 0 ? 0 : entry(spread);
        for (int j = 0; j < n; j++) {
          a[i][j] = random.nextInt(5) == 0 && i != j ? 0 : entry(spread);
        }
      }
      requireSolved(a, b);
    }
  }

  @Test
  void roundsDownAndToTheNearestDouble() {
    RationalVector thirds =
        new RationalVector(
            new BigInteger[] {BigInteger.ONE, BigInteger.valueOf(-1), BigInteger.valueOf(-6)},
            BigInteger.valueOf(3));
    assertThat(thirds.nearest(0)).isEqualTo(1.0 / 3);
    assertThat(thirds.floor(0, -2)).isEqualTo(Dyadic.of(0.25));
    assertThat(thirds.floor(1, -2)).isEqualTo(Dyadic.of(-0.5));
    assertThat(thirds.floor(1, 1)).isEqualTo(Dyadic.of(-2.0));
    assertThat(thirds.floor(2, 0)).isEqualTo(Dyadic.of(-2.0));
    assertThat(thirds.floor(2, 1)).isEqualTo(Dyadic.of(-2.0));
    assertThat(thirds.size()).isEqualTo(3);
  }

  @Test
  void sizesBeyondTheRangeOfItsSumsAreRefused() {
    assertThatThrownBy(() -> PadicLifting.of(2049, new double[0]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("n is 2049; it must be at most 2048");
  }

  private double entry(int spread) {
    return Math.scalb(2 * random.nextDouble() - 1, -random.nextInt(spread));
  }

  private static void requireSolved(double[][] a, double[] b) {
    RationalVector x =
        PadicLifting.of(b.length, Arrays.stream(a).flatMapToDouble(Arrays::stream).toArray())
            .orElseThrow()
            .solve(b);
    BigFraction[] exact = new RationalInverse(a).solve(b);
    for (int i = 0; i < b.length; i++) {
      assertThat(new BigFraction(x.numerators()[i], x.denominator())).isEqualTo(exact[i]);
      assertThat(x.nearest(i)).isEqualTo(nearest(exact[i]));
    }
  }

  private static double nearest(BigFraction fraction) {
    return Dyadic.quotient(
        new Dyadic(fraction.getNumerator(), 0), new Dyadic(fraction.getDenominator(), 0));
  }
}
