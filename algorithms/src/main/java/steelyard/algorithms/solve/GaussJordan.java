package steelyard.algorithms.solve;

/**
 * Elimination above and below the diagonal, with partial pivoting, which leaves a diagonal system.
 *
 * @see <a href="https://doi.org/10.1145/360569.360653">Peters and Wilkinson, On the stability of
 *     Gauss-Jordan elimination with pivoting, Communications of the ACM 18 (1975) 20-24</a>
 */
final class GaussJordan implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    double[][] rows = Rows.copy(a);
    double[] x = b.clone();
    for (int k = 0; k < x.length; k++) {
      int pivotRow = Pivoting.PARTIAL.choose(rows, k).row();
      Rows.swap(rows, k, pivotRow);
      double moved = x[k];
      x[k] = x[pivotRow];
      x[pivotRow] = moved;
      eliminate(rows, x, k);
    }
    for (int i = 0; i < x.length; i++) {
      x[i] /= rows[i][i];
    }
    return x;
  }

  private static void eliminate(double[][] rows, double[] x, int k) {
    double[] top = rows[k];
    if (top[k] == 0) {
      throw Unsolvable.zeroPivot(k);
    }
    for (int i = 0; i < x.length; i++) {
      if (i == k) {
        continue;
      }
      double[] row = rows[i];
      double multiplier = row[k] / top[k];
      for (int j = k + 1; j < row.length; j++) {
        row[j] -= multiplier * top[j];
      }
      x[i] -= multiplier * x[k];
    }
  }
}
