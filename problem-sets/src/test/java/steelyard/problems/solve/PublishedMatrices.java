package steelyard.problems.solve;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.function.IntBinaryOperator;
import java.util.stream.LongStream;

/**
 * Matrices of the literature, multiplied by a common integer where that is needed to store every
 * entry exactly; condition numbers do not change by it.
 */
final class PublishedMatrices {
  private PublishedMatrices() {}

  static double[][] of(String name, int n) {
    return switch (name) {
      case "hilbert" -> hilbert(n, lcm(2 * n - 1));
      case "lotkin" -> lotkin(n);
      case "frank" -> of(n, (i, j) -> j >= i - 1 ? n + 1 - Math.max(i, j) : 0);
      case "wilson" -> new double[][] {{5, 7, 6, 5}, {7, 10, 8, 7}, {6, 8, 10, 9}, {5, 7, 9, 10}};
      case "rutishauser" ->
          new double[][] {{10, 1, 4, 0}, {1, 10, 5, -1}, {4, 5, 10, 7}, {0, -1, 7, 9}};
      case "moler" -> new double[][] {{1, 3, 10, 10}, {3, 4, 8, 9}, {10, 8, 3, 9}, {10, 9, 9, 3}};
      case "worst-symmetric" ->
          new double[][] {{2, 7, 10, 10}, {7, 10, 10, 9}, {10, 10, 10, 1}, {10, 9, 1, 9}};
      case "worst-definite" ->
          new double[][] {{9, 1, 1, 5}, {1, 10, 1, 9}, {1, 1, 10, 1}, {5, 9, 1, 10}};
      case "powers" -> of(n, (i, j) -> (int) StrictMath.pow(j, 2.0 * (i - 1)));
      case "vandermonde-reciprocal" -> vandermondeReciprocal(n);
      default -> throw new IllegalArgumentException("no matrix is named " + name);
    };
  }

  /** Returns the matrix with the given integers, for indices from 1. */
  static double[][] of(int n, IntBinaryOperator entry) {
    double[][] a = new double[n][n];
    for (int i = 1; i <= n; i++) {
      for (int j = 1; j <= n; j++) {
        a[i - 1][j - 1] = entry.applyAsInt(i, j);
      }
    }
    return a;
  }

  static BigInteger lcm(int n) {
    return LongStream.rangeClosed(1, n)
        .mapToObj(BigInteger::valueOf)
        .reduce(BigInteger.ONE, (p, q) -> p.multiply(q).divide(p.gcd(q)));
  }

  static double[][] hilbert(int n, BigInteger multiple) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = exact(multiple.divide(BigInteger.valueOf(i + j + 1L)));
      }
    }
    return a;
  }

  private static double[][] lotkin(int n) {
    BigInteger multiple = lcm(2 * n - 1);
    double[][] a = hilbert(n, multiple);
    Arrays.fill(a[0], exact(multiple));
    return a;
  }

  // Column j holds the powers of 1/j.
  private static double[][] vandermondeReciprocal(int n) {
    BigInteger multiple = lcm(n).pow(n - 1);
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 1; j <= n; j++) {
        a[i][j - 1] = exact(multiple.divide(BigInteger.valueOf(j).pow(i)));
      }
    }
    return a;
  }

  private static double exact(BigInteger value) {
    double rounded = value.doubleValue();
    if (!new BigDecimal(rounded).toBigIntegerExact().equals(value)) {
      throw new ArithmeticException(value + " is no double");
    }
    return rounded;
  }
}
