package steelyard.problems.solve.certificate;

import java.util.Arrays;
import steelyard.problems.UncertifiedException;

/**
 * A linear system A x = b brought to the size of 1 by powers of two, without rounding.
 *
 * <p>With the global shifts g and h and the shifts r of the rows and c of the columns, all of them
 * powers of two, the scaled system is A' x' = b' where A' = 2^g diag(2^r) A diag(2^c), b' = 2^h
 * diag(2^r) b and x = 2^(g-h) diag(2^c) x'. The largest entry of 2^g A and of 2^h b lies in [1/2,
 * 1), r and c are nonnegative, and every row of A' has its largest entry in [1/2, 1).
 */
final class ScaledSystem {

  // Row and column scaling beyond this is left out, so that no quantity in scaled units overflows.
  private static final int LARGEST_SHIFT = 400;

  final int size;
  final double[] matrix;
  final double[] rightHandSide;
  final int[] rowShift;
  final int[] columnShift;
  final int matrixShift;
  final int vectorShift;

  /**
   * Scales a system.
   *
   * @throws UncertifiedException if a row or a column is zero, or if the entries are so far apart
   *     that scaling would round
   */
  ScaledSystem(double[][] a, double[] b) {
    size = b.length;
    matrixShift = -magnitude(a);
    int largest = magnitude(b);
    vectorShift = largest == Integer.MIN_VALUE ? 0 : -largest;
    int[] columns = columnShifts(a, matrixShift);
    int[] rows = rowShifts(a, matrixShift, columns);
    boolean moderate = isModerate(columns) && isModerate(rows);
    columnShift = moderate ? columns : new int[size];
    rowShift = moderate ? rows : new int[size];
    matrix = new double[size * size];
    rightHandSide = new double[size];
    for (int i = 0; i < size; i++) {
      rightHandSide[i] = scaled(b[i], vectorShift + rowShift[i]);
      for (int j = 0; j < size; j++) {
        matrix[i * size + j] = scaled(a[i][j], matrixShift + rowShift[i] + columnShift[j]);
      }
    }
  }

  /** Returns the scaled matrix, as rows of its own. */
  double[][] rows() {
    double[][] rows = new double[size][];
    for (int i = 0; i < size; i++) {
      rows[i] = Arrays.copyOfRange(matrix, i * size, (i + 1) * size);
    }
    return rows;
  }

  /** Returns the sums of the magnitudes in each row, computed in double. */
  double[] absoluteRowSums() {
    double[] sums = new double[size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        sums[i] += Math.abs(matrix[i * size + j]);
      }
    }
    return sums;
  }

  /** Returns the least m with |x| &lt; 2^m; the least int for zero. */
  static int magnitude(double x) {
    if (x == 0) {
      return Integer.MIN_VALUE;
    }
    return Math.abs(x) < Double.MIN_NORMAL
        ? Math.getExponent(x * 0x1p60) - 59
        : Math.getExponent(x) + 1;
  }

  private static int magnitude(double[] entries) {
    int largest = Integer.MIN_VALUE;
    for (double entry : entries) {
      largest = Math.max(largest, magnitude(entry));
    }
    return largest;
  }

  private static int magnitude(double[][] rows) {
    int largest = Integer.MIN_VALUE;
    for (int i = 0; i < rows.length; i++) {
      largest = Math.max(largest, requireNonzero("row", i, magnitude(rows[i])));
    }
    return largest;
  }

  private static int[] columnShifts(double[][] a, int shift) {
    int[] shifts = new int[a.length];
    for (int j = 0; j < a.length; j++) {
      int largest = Integer.MIN_VALUE;
      for (double[] row : a) {
        largest = Math.max(largest, magnitude(row[j]));
      }
      shifts[j] = -(requireNonzero("column", j, largest) + shift);
    }
    return shifts;
  }

  private static int[] rowShifts(double[][] a, int shift, int[] columnShift) {
    int[] shifts = new int[a.length];
    for (int i = 0; i < a.length; i++) {
      int largest = Integer.MIN_VALUE;
      for (int j = 0; j < a.length; j++) {
        if (a[i][j] != 0) {
          largest = Math.max(largest, magnitude(a[i][j]) + shift + columnShift[j]);
        }
      }
      shifts[i] = -largest;
    }
    return shifts;
  }

  private static int requireNonzero(String kind, int index, int magnitude) {
    if (magnitude == Integer.MIN_VALUE) {
      throw new UncertifiedException(
          "the matrix is singular: " + kind + " " + (index + 1) + " is zero");
    }
    return magnitude;
  }

  private static boolean isModerate(int[] shifts) {
    return Arrays.stream(shifts).allMatch(shift -> shift <= LARGEST_SHIFT);
  }

  private static double scaled(double x, int shift) {
    double y = timesPowerOfTwo(x, shift);
    if (timesPowerOfTwo(y, -shift) != x) {
      throw new UncertifiedException(
          "the entries span so many powers of two that they cannot be scaled to the size of 1 "
              + "without rounding");
    }
    return y;
  }

  // Math.scalb for the shifts that are common, at the price of a product.
  private static double timesPowerOfTwo(double x, int shift) {
    return Math.abs(shift) < Double.MAX_EXPONENT
        ? x * Double.longBitsToDouble((long) (shift + Double.MAX_EXPONENT) << 52)
        : Math.scalb(x, shift);
  }
}
