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
    for (int from = 0; from < n; from += rows.panelWidth()) {
      int to = Math.min(n, from + rows.panelWidth());
      for (int k = from; k < to; k++) {
        pivotRow[k] = largest(rows, k);
        double pivot = rows.magnitude(pivotRow[k], k);
        if (!(pivot > 0 && pivot < Double.POSITIVE_INFINITY)) {
          return false;
        }
        if (pivotRow[k] != k) {
          rows.swapRows(k, pivotRow[k]);
        }
        eliminate(rows, k, from, to);
      }
      rows.finish(from, to);
    }
    // The inverse of P A is that of A times the inverse of P, which permutes columns.
    for (int k = n - 1; k >= 0; k--) {
      if (pivotRow[k] != k) {
        rows.swapColumns(k, pivotRow[k]);
      }
    }
    return true;
  }

  private static void eliminate(Rows rows, int k, int from, int to) {
    rows.normalize(k, from, to);
    for (int i = 0; i < rows.size(); i++) {
      if (i != k) {
        rows.eliminate(i, k, from, to);
      }
    }
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
