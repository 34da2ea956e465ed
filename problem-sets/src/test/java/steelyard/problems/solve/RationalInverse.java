package steelyard.problems.solve;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.stream.IntStream;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.exact.Dyadic;

/**
 * The inverse of a matrix of doubles in exact rational arithmetic, by fraction-free elimination
 * (Bareiss, Math. Comp. 22 (1968), 565-578), and what follows from it. It shares nothing with the
 * certificates that it checks.
 *
 * <p>With integers m and a power of two e the matrix is m 2^e, and its inverse adjugate/det 2^-e.
 */
public final class RationalInverse {
  private final Integers matrix;
  private final BigInteger[][] adjugate;
  private final BigInteger det;

  /** Integers that share a power of two. */
  private record Integers(BigInteger[][] entries, int exponent) {
    static Integers of(double[][] a) {
      int exponent =
          Arrays.stream(a)
              .flatMapToDouble(Arrays::stream)
              .mapToInt(x -> Dyadic.of(x).exponent())
              .min()
              .orElse(0);
      int least = Math.min(exponent, 0);
      BigInteger[][] entries =
          Arrays.stream(a)
              .map(
                  row ->
                      Arrays.stream(row)
                          .mapToObj(Dyadic::of)
                          .map(x -> x.significand().shiftLeft(x.exponent() - least))
                          .toArray(BigInteger[]::new))
              .toArray(BigInteger[][]::new);
      return new Integers(entries, least);
    }
  }

  /**
   * Inverts a matrix.
   *
   * @throws ArithmeticException if it is singular
   */
  public RationalInverse(double[][] a) {
    matrix = Integers.of(a);
    int n = a.length;
    BigInteger[][] m = new BigInteger[n][2 * n];
    for (int i = 0; i < n; i++) {
      Arrays.fill(m[i], BigInteger.ZERO);
      System.arraycopy(matrix.entries[i], 0, m[i], 0, n);
      m[i][n + i] = BigInteger.ONE;
    }
    int sign = eliminate(m);
    // Every diagonal entry is now the determinant of the permuted matrix.
    BigInteger last = m[n - 1][n - 1];
    det = sign > 0 ? last : last.negate();
    adjugate = new BigInteger[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        adjugate[i][j] = sign > 0 ? m[i][n + j] : m[i][n + j].negate();
      }
    }
  }

  private static int eliminate(BigInteger[][] m) {
    BigInteger previous = BigInteger.ONE;
    int sign = 1;
    for (int k = 0; k < m.length; k++) {
      int pivotRow = k;
      while (m[pivotRow][k].signum() == 0) {
        pivotRow++;
        if (pivotRow == m.length) {
          throw new ArithmeticException("singular");
        }
      }
      if (pivotRow != k) {
        BigInteger[] kept = m[k];
        m[k] = m[pivotRow];
        m[pivotRow] = kept;
        sign = -sign;
      }
      for (int i = 0; i < m.length; i++) {
        if (i != k) {
          eliminate(m[i], m[k], k, previous);
        }
      }
      previous = m[k][k];
    }
    return sign;
  }

  private static void eliminate(
      BigInteger[] row, BigInteger[] pivotRow, int k, BigInteger divisor) {
    BigInteger factor = row[k];
    for (int j = 0; j < row.length; j++) {
      row[j] = row[j].multiply(pivotRow[k]).subtract(factor.multiply(pivotRow[j])).divide(divisor);
    }
  }

  /** Returns entry (i, j) of the inverse. */
  public BigFraction entry(int i, int j) {
    return fraction(adjugate[i][j], det, -matrix.exponent);
  }

  /** Returns the determinant. */
  public BigFraction determinant() {
    return fraction(det, BigInteger.ONE, matrix.exponent * adjugate.length);
  }

  /** Returns the solution for a right-hand side. */
  public BigFraction[] solve(double[] b) {
    Integers rhs = Integers.of(new double[][] {b});
    BigInteger[] x = times(adjugate, rhs.entries[0], false);
    return Arrays.stream(x)
        .map(entry -> fraction(entry, det, rhs.exponent - matrix.exponent))
        .toArray(BigFraction[]::new);
  }

  /** Returns the maximum norm of the inverse. */
  public BigFraction inverseNorm() {
    return fraction(norm(times(adjugate, ones(), true)), det.abs(), -matrix.exponent);
  }

  /** Returns the maximum norm of the matrix. */
  public BigFraction matrixNorm() {
    return fraction(norm(times(matrix.entries, ones(), true)), BigInteger.ONE, matrix.exponent);
  }

  /** Returns the norm of the matrix times that of its inverse. */
  public BigFraction kappa() {
    return inverseNorm().multiply(matrixNorm());
  }

  /** Returns the norm of |A⁻¹||A|, Skeel's condition number. */
  public BigFraction skeel() {
    BigInteger[] sums = times(matrix.entries, ones(), true);
    return new BigFraction(norm(times(adjugate, sums, true)), det.abs());
  }

  /** Returns the normwise condition number of the system. */
  public BigFraction normwise(double[] b) {
    BigFraction largest = norm(exact(b));
    return inverseNorm().multiply(matrixNorm().add(largest.divide(norm(solve(b)))));
  }

  /** Returns the componentwise condition number of the system. */
  public BigFraction componentwise(double[] b) {
    Integers rhs = Integers.of(new double[][] {b});
    BigInteger[] x = times(adjugate, rhs.entries[0], false);
    BigInteger[] sizes = times(matrix.entries, x, true);
    for (int i = 0; i < b.length; i++) {
      sizes[i] = sizes[i].add(rhs.entries[0][i].multiply(det).abs());
    }
    BigInteger top = norm(times(adjugate, sizes, true));
    return new BigFraction(top, det.abs().multiply(norm(x)));
  }

  /** Returns the maximum norm. */
  public static BigFraction norm(BigFraction[] x) {
    return Arrays.stream(x)
        .map(BigFraction::abs)
        .reduce(BigFraction.ZERO, (p, q) -> p.compareTo(q) >= 0 ? p : q);
  }

  /** Returns a double as a fraction. */
  public static BigFraction exact(double value) {
    return exact(Dyadic.of(value));
  }

  /** Returns a dyadic number as a fraction. */
  public static BigFraction exact(Dyadic value) {
    return fraction(value.significand(), BigInteger.ONE, value.exponent());
  }

  private static BigFraction[] exact(double[] x) {
    return Arrays.stream(x).mapToObj(RationalInverse::exact).toArray(BigFraction[]::new);
  }

  private static BigFraction fraction(BigInteger top, BigInteger bottom, int exponent) {
    return exponent >= 0
        ? new BigFraction(top.shiftLeft(exponent), bottom)
        : new BigFraction(top, bottom.shiftLeft(-exponent));
  }

  private BigInteger[] ones() {
    BigInteger[] ones = new BigInteger[adjugate.length];
    Arrays.fill(ones, BigInteger.ONE);
    return ones;
  }

  private static BigInteger norm(BigInteger[] x) {
    return Arrays.stream(x).map(BigInteger::abs).reduce(BigInteger.ZERO, BigInteger::max);
  }

  private static BigInteger[] times(BigInteger[][] m, BigInteger[] v, boolean absolute) {
    return Arrays.stream(m)
        .map(
            row ->
                IntStream.range(0, v.length)
                    .mapToObj(j -> row[j].multiply(v[j]))
                    .map(product -> absolute ? product.abs() : product)
                    .reduce(BigInteger.ZERO, BigInteger::add))
        .toArray(BigInteger[]::new);
  }
}
