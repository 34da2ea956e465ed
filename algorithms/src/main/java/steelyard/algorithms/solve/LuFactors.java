package steelyard.algorithms.solve;

/**
 * The factors of a matrix whose rows and columns were reordered into a unit lower triangular matrix
 * times an upper triangular one, by Gaussian elimination.
 *
 * @param lu both factors in one square, without the unit diagonal
 * @param rows which row of the matrix each row of the factors belongs to
 * @param columns which column of the matrix each column of the factors belongs to
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 9.1</a>
 */
record LuFactors(double[][] lu, int[] rows, int[] columns) {

  /**
   * Factors a matrix, which is left as it is.
   *
   * @throws ArithmeticException if the chosen pivot is zero
   */
  static LuFactors of(double[][] a, Pivoting pivoting) {
    int n = a.length;
    LuFactors factors = new LuFactors(Rows.copy(a), upTo(n), upTo(n));
    for (int k = 0; k < n; k++) {
      factors.moveToDiagonal(pivoting.choose(factors.lu, k), k);
      factors.eliminate(k);
    }
    return factors;
  }

  private static int[] upTo(int n) {
    int[] order = new int[n];
    for (int i = 0; i < n; i++) {
      order[i] = i;
    }
    return order;
  }

  private void moveToDiagonal(Pivoting.Position pivot, int k) {
    if (pivot.row() != k) {
      Rows.swap(lu, k, pivot.row());
      swap(rows, k, pivot.row());
    }
    if (pivot.column() != k) {
      for (double[] row : lu) {
        double moved = row[k];
        row[k] = row[pivot.column()];
        row[pivot.column()] = moved;
      }
      swap(columns, k, pivot.column());
    }
  }

  private static void swap(int[] order, int i, int j) {
    int moved = order[i];
    order[i] = order[j];
    order[j] = moved;
  }

  private void eliminate(int k) {
    double[] top = lu[k];
    double pivot = top[k];
    if (pivot == 0) {
      throw Unsolvable.zeroPivot(k);
    }
    for (int i = k + 1; i < lu.length; i++) {
      double[] row = lu[i];
      double multiplier = row[k] / pivot;
      row[k] = multiplier;
      for (int j = k + 1; j < row.length; j++) {
        row[j] -= multiplier * top[j];
      }
    }
  }

  /** Returns the solution of the factored system with this right-hand side. */
  double[] solve(double[] b) {
    double[] reordered = new double[b.length];
    for (int i = 0; i < b.length; i++) {
      reordered[i] = b[rows[i]];
    }
    Triangular.solveUnitLower(lu, reordered);
    Triangular.solveUpper(lu, reordered);
    double[] x = new double[b.length];
    for (int j = 0; j < b.length; j++) {
      x[columns[j]] = reordered[j];
    }
    return x;
  }
}
