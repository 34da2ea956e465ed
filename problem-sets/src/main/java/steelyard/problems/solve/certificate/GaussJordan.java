package steelyard.problems.solve.certificate;

/**
 * Inversion in place by Gauss-Jordan elimination with partial pivoting, in any arithmetic. Nothing
 * is claimed of the result's accuracy; whatever it is, {@link ApproximateInverse} proves it
 * afterwards.
 */
final class GaussJordan {
  private GaussJordan() {}

  /**
   * Replaces a matrix by its approximate inverse.
   *
   * @return false if a pivot was zero or not finite, in which case the matrix is left half done
   */
  static boolean invert(Rows rows) {
    int n = rows.size();
    int[] pivotRow = new int[n];
    for (int k = 0; k < n; k++) {
      pivotRow[k] = largest(rows, k);
      double pivot = rows.magnitude(pivotRow[k], k);
      if (!(pivot > 0 && pivot < Double.POSITIVE_INFINITY)) {
        return false;
      }
      if (pivotRow[k] != k) {
        rows.swapRows(k, pivotRow[k]);
      }
      rows.normalize(k);
      for (int i = 0; i < n; i++) {
        if (i != k) {
          rows.eliminate(i, k);
        }
      }
    }
    // The inverse of P A is that of A times the inverse of P, which permutes columns.
    for (int k = n - 1; k >= 0; k--) {
      if (pivotRow[k] != k) {
        rows.swapColumns(k, pivotRow[k]);
      }
    }
    return true;
  }

  private static int largest(Rows rows, int k) {
    int best = k;
    for (int i = k + 1; i < rows.size(); i++) {
      if (rows.magnitude(i, k) > rows.magnitude(best, k)) {
        best = i;
      }
    }
    return best;
  }
}
