package steelyard.algorithms.solve;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Arrays;

/**
 * The exact solution and the exact inverse of a matrix of doubles, by fraction-free elimination on
 * integers.
 *
 * @param determinant the common denominator
 * @param numerators in each row an entry of the solution, then a row of the inverse
 * @see <a href="https://doi.org/10.1090/S0025-5718-1968-0226829-0">Bareiss, Sylvester's identity
 *     and multistep integer-preserving Gaussian elimination, Mathematics of Computation 22 (1968)
 *     565-578</a>
 */
record FractionFree(BigInteger determinant, BigInteger[][] numerators) {

  static FractionFree solve(double[][] a, double[] b) {
    int n = b.length;
    BigInteger[][] rows = integers(a, b);
    BigInteger previous = BigInteger.ONE;
    for (int k = 0; k < n; k++) {
      int pivot = k;
      while (rows[pivot][k].signum() == 0) {
        pivot++;
      }
      BigInteger[] moved = rows[k];
      rows[k] = rows[pivot];
      rows[pivot] = moved;
      for (int i = 0; i < n; i++) {
        if (i != k) {
          rows[i] = eliminated(rows[i], rows[k], k, previous);
        }
      }
      previous = rows[k][k];
    }
    BigInteger[][] numerators = new BigInteger[n][];
    for (int i = 0; i < n; i++) {
      numerators[i] = Arrays.copyOfRange(rows[i], n, 2 * n + 1);
    }
    return new FractionFree(previous, numerators);
  }

  private static BigInteger[] eliminated(
      BigInteger[] row, BigInteger[] top, int k, BigInteger previous) {
    BigInteger[] result = new BigInteger[row.length];
    for (int j = 0; j < row.length; j++) {
      result[j] = row[j].multiply(top[k]).subtract(row[k].multiply(top[j])).divide(previous);
    }
    return result;
  }

  /** Returns A, b and the identity side by side, all multiplied by one power of two. */
  private static BigInteger[][] integers(double[][] a, double[] b) {
    int n = b.length;
    BigDecimal[][] whole = new BigDecimal[n][2 * n + 1];
    int binaryPlaces = 0;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < whole[i].length; j++) {
        double unit = j == n + 1 + i ? 1 : 0;
        whole[i][j] = new BigDecimal(j < n ? a[i][j] : j == n ? b[i] : unit);
        // A double has as many decimal places as binary ones.
        binaryPlaces = Math.max(binaryPlaces, whole[i][j].scale());
      }
    }
    BigDecimal scale = new BigDecimal(BigInteger.TWO.pow(binaryPlaces));
    BigInteger[][] integers = new BigInteger[n][2 * n + 1];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < whole[i].length; j++) {
        integers[i][j] = whole[i][j].multiply(scale).toBigIntegerExact();
      }
    }
    return integers;
  }
}
