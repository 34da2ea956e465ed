package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.UncertifiedException;
import steelyard.problems.solve.RationalInverse;
import steelyard.problems.solve.rational.PadicLifting;

/** The rational route against fraction-free elimination, and where the others give up. */
class RationalCertificateTest {
  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(31L);

  @Test
  void enclosesWhatFractionFreeEliminationFinds() {
    for (int trial = 0; trial < 40; trial++) {
      int n = 1 + trial % 8;
      double[][] a = new double[n][n];
      double[] b = new double[n];
      for (int i = 0; i < n; i++) {
        b[i] = 2 * random.nextDouble() - 1;
        for (int j = 0; j < n; j++) {
          a[i][j] = Math.scalb(2 * random.nextDouble() - 1, -random.nextInt(1 + trial));
        }
      }
      CertifiedSolution solution = solve(a, b);
      RationalInverse exact = new RationalInverse(a);
      requireInside(solution.inverseNorm(), exact.inverseNorm());
      requireInside(solution.kappa(), exact.normwise(b));
      requireInside(solution.componentwise(), exact.componentwise(b));
      BigFraction[] x = exact.solve(b);
      for (int i = 0; i < n; i++) {
        BigFraction error = RationalInverse.exact(solution.values().get(i)).subtract(x[i]).abs();
        BigFraction radius = RationalInverse.exact(solution.radii().get(i));
        assertThat(error.compareTo(radius)).isNotPositive();
      }
      assertThat(solution.relativeBound()).isLessThan(0x1p-250);
    }
  }

  @Test
  void solutionsThatAreDyadicAreExact() {
    CertifiedSolution solution = solve(new double[][] {{3, 1}, {1, 2}}, new double[] {4.5, 4});
    assertThat(solution.isExact()).isTrue();
    assertThat(solution.route()).isEqualTo("rational");
    assertThat(solve(new double[][] {{3}}, new double[] {1}).isExact()).isFalse();
    assertThat(solve(new double[][] {{3}}, new double[] {0}).isExact()).isTrue();
  }

  // T'T for the unit upper triangular matrix T with -c above the diagonal, whose inverse has the
  // norm (c+1)^(n-1) (Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. (2002),
  // section 8.3): a condition number of about 1e260 where n is 22.
  @Test
  void takesOverWhereFixedPointGivesUp() {
    double[][] a = ill(22);
    int n = 22;
    double[] b = new double[n];
    b[n - 1] = 1;
    CertifiedSolution solution = CertifiedSolver.solve(a, b);
    assertThat(solution.route()).isEqualTo("rational");
    assertThat(solution.inverseNorm().lower()).isGreaterThan(1e240);
    requireInside(solution.inverseNorm(), new RationalInverse(a).inverseNorm());
    assertThat(solution.relativeBound()).isLessThan(0x1p-250);
  }

  @Test
  void conditionNumbersBeyondTheRangeOfDoubleAreRefused() {
    double[][] a = ill(30);
    assertThatThrownBy(() -> CertifiedSolver.solve(a, a[0]))
        .isInstanceOf(UncertifiedException.class)
        .hasMessage(
            "no reference could be certified with 1024 fraction bits, nor in rational numbers: the"
                + " condition number exceeds the range of double");
  }

  private static double[][] ill(int n) {
    double c = 1_000_003;
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        int common = Math.min(i, j);
        a[i][j] = i == j ? common * c * c + 1 : common * c * c - c;
      }
    }
    return a;
  }

  private static CertifiedSolution solve(double[][] a, double[] b) {
    ScaledSystem system = new ScaledSystem(a, b);
    PadicLifting lifting = PadicLifting.of(system.size, system.matrix).orElseThrow();
    return RationalCertificate.attempt(system, lifting).orElseThrow();
  }

  private static void requireInside(Enclosure enclosure, BigFraction exact) {
    assertThat(RationalInverse.exact(enclosure.lower()).compareTo(exact)).isNotPositive();
    assertThat(RationalInverse.exact(enclosure.upper()).compareTo(exact)).isNotNegative();
    assertThat(enclosure.isWithin(1e-12)).isTrue();
  }
}
