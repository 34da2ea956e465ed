package steelyard.algorithms.solve;

/**
 * Triangularises with Householder reflections, applied along rows to the matrix and the right-hand
 * side together.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, sections 19.1 to 19.3</a>
 */
final class HouseholderQr implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    int n = b.length;
    double[][] r = Rows.copy(a);
    double[] x = b.clone();
    for (int k = 0; k < n; k++) {
      double[] column = new double[n - k];
      for (int i = k; i < n; i++) {
        column[i - k] = r[i][k];
      }
      double length = Vectors.length(column);
      if (length == 0) {
        throw Unsolvable.zeroPivot(k);
      }
      if (k < n - 1) {
        reflect(r, x, direction(column, length), k);
        r[k][k] = column[0] > 0 ? -length : length;
      }
    }
    Triangular.solveUpper(r, x);
    return x;
  }

  /**
   * Returns the vector v for which I − v vᵀ/|v₀| takes the column to a multiple of the first axis,
   * of the sign that avoids cancellation; divided by the column's length to stay in range.
   */
  private static double[] direction(double[] column, double length) {
    double[] v = new double[column.length];
    for (int i = 0; i < v.length; i++) {
      v[i] = column[i] / length;
    }
    v[0] += column[0] > 0 ? 1 : -1;
    return v;
  }

  private static void reflect(double[][] r, double[] x, double[] v, int k) {
    int n = x.length;
    double[] products = new double[n];
    double right = 0;
    for (int i = k; i < n; i++) {
      for (int j = k + 1; j < n; j++) {
        products[j] += v[i - k] * r[i][j];
      }
      right += v[i - k] * x[i];
    }
    for (int i = k; i < n; i++) {
      double multiple = v[i - k] / Math.abs(v[0]);
      for (int j = k + 1; j < n; j++) {
        r[i][j] -= multiple * products[j];
      }
      x[i] -= multiple * right;
    }
  }
}
