package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.problems.solve.PublishedMatrices.Multiple;
import steelyard.problems.solve.certificate.CertifiedSolver;

/** The exact inverses agree with published formulas, and the certified norms with both. */
class PublishedInverseTest {

  /** A formula for an entry, for indices from 1. */
  @FunctionalInterface
  private interface Formula {
    BigFraction at(int i, int j);
  }

  // Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. (2002), equation (28.1).
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 5, 9, 12})
  void hilbert(int n) {
    Multiple hilbert = PublishedMatrices.named("hilbert" + n);
    requireInverse(
        hilbert.entries(),
        (i, j) ->
            new BigFraction(
                PublishedMatrices.choose(n + i - 1, n - j)
                    .multiply(PublishedMatrices.choose(n + j - 1, n - i))
                    .multiply(PublishedMatrices.choose(i + j - 2, i - 1).pow(2))
                    .multiply(BigInteger.valueOf((i + j - 1L) * sign(i + j))),
                hilbert.factor()));
  }

  // Higham, section 28.4.
  @ParameterizedTest
  @ValueSource(ints = {2, 6, 11, 17})
  void pascal(int n) {
    RationalInverse inverse =
        requireInverse(
            PublishedMatrices.named("pascal" + n).entries(),
            (i, j) -> {
              int row = Math.max(i, j);
              int column = Math.min(i, j);
              BigInteger sum = BigInteger.ZERO;
              for (int k = 0; k <= n - row; k++) {
                sum =
                    sum.add(
                        PublishedMatrices.choose(row + k - 1, k)
                            .multiply(PublishedMatrices.choose(row + k - 1, row + k - column)));
              }
              return new BigFraction(sum.multiply(BigInteger.valueOf(sign(i - j))));
            });
    assertThat(inverse.determinant()).isEqualTo(BigFraction.ONE);
  }

  // Newman and Todd, J. SIAM 6 (1958), 466-476 (formula from memory, verified here).
  @ParameterizedTest
  @ValueSource(ints = {2, 7, 15})
  void lehmer(int n) {
    Multiple lehmer = PublishedMatrices.named("lehmer" + n);
    requireInverse(
        lehmer.entries(),
        (i, j) -> {
          int low = Math.min(i, j);
          BigFraction unscaled = BigFraction.ZERO;
          if (i == j) {
            unscaled =
                i == n
                    ? new BigFraction(n * n, 2 * n - 1)
                    : new BigFraction(4 * i * i * i, 4 * i * i - 1);
          } else if (Math.abs(i - j) == 1) {
            unscaled = new BigFraction(-low * (low + 1), 2 * low + 1);
          }
          return unscaled.divide(lehmer.factor());
        });
  }

  // Higham, What Is the Frank Matrix? (2022): determinant 1, integer inverse.
  @ParameterizedTest
  @ValueSource(ints = {3, 8, 14})
  void frank(int n) {
    RationalInverse inverse = new RationalInverse(PublishedMatrices.named("frank" + n).entries());
    assertThat(inverse.determinant()).isEqualTo(BigFraction.ONE);
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        assertThat(inverse.entry(i, j).getDenominator()).isEqualTo(BigInteger.ONE);
      }
    }
  }

  // Higham, equation (8.11): the formula holds for any s and c; 1/2 and 3/4 are doubles.
  @ParameterizedTest
  @ValueSource(ints = {2, 6, 12})
  void kahanTriangle(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        a[i][j] = Math.scalb(i == j ? 1 : -0.75, -i);
      }
    }
    BigFraction c = new BigFraction(3, 4);
    requireInverse(
        a,
        (i, j) -> {
          BigFraction scale = new BigFraction(BigInteger.TWO.pow(j - 1));
          if (i == j) {
            return scale;
          }
          return i > j
              ? BigFraction.ZERO
              : scale.multiply(c).multiply(c.add(BigInteger.ONE).pow(j - i - 1));
        });
  }

  // Higham, What Is the Second Difference Matrix? (2022); the sign is positive.
  @ParameterizedTest
  @ValueSource(ints = {2, 5, 20})
  void secondDifference(int n) {
    RationalInverse inverse =
        requireInverse(
            PublishedMatrices.named("tridiag" + n).entries(),
            (i, j) -> new BigFraction(Math.min(i, j) * (n - Math.max(i, j) + 1), n + 1));
    assertThat(inverse.determinant()).isEqualTo(new BigFraction(n + 1));
  }

  // Higham, What Is the Wilson Matrix? (2021).
  @Test
  void wilson() {
    int[][] inverse = {{68, -41, -17, 10}, {-41, 25, 10, -6}, {-17, 10, 5, -3}, {10, -6, -3, 2}};
    requireInverse(
        PublishedMatrices.named("wilson").entries(),
        (i, j) -> new BigFraction(inverse[i - 1][j - 1]));
  }

  // Higham, equation (8.9): the norm of the inverse is 2^(n-1).
  @ParameterizedTest
  @ValueSource(ints = {2, 10, 50, 100})
  void triangularExponential(int n) {
    double[] b = new double[n];
    b[n - 1] = 1;
    assertThat(
            CertifiedSolver.solve(ClassicalFamilies.triangular(n), b)
                .inverseNorm()
                .contains(Math.scalb(1.0, n - 1)))
        .isTrue();
  }

  private static RationalInverse requireInverse(double[][] a, Formula formula) {
    RationalInverse inverse = new RationalInverse(a);
    BigFraction norm = BigFraction.ZERO;
    for (int i = 1; i <= a.length; i++) {
      BigFraction sum = BigFraction.ZERO;
      for (int j = 1; j <= a.length; j++) {
        BigFraction expected = formula.at(i, j);
        assertThat(inverse.entry(i - 1, j - 1)).as("entry (%s, %s)", i, j).isEqualTo(expected);
        sum = sum.add(expected.abs());
      }
      norm = norm.compareTo(sum) >= 0 ? norm : sum;
    }
    double[] b = new double[a.length];
    Arrays.fill(b, 1);
    assertThat(ExactVerdict.contains(CertifiedSolver.solve(a, b).inverseNorm(), norm)).isTrue();
    return inverse;
  }

  private static long sign(int exponent) {
    return exponent % 2 == 0 ? 1 : -1;
  }
}
