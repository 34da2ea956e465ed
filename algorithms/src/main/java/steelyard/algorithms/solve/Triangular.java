package steelyard.algorithms.solve;

/**
 * Substitution with triangular matrices, in place and along rows. The other triangle is not looked
 * at, and a zero on the diagonal is not looked for: who factors a matrix reports that.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 8.1</a>
 */
final class Triangular {

  private Triangular() {}

  /** Solves L x = x for a lower triangular matrix with ones on its diagonal. */
  static void solveUnitLower(double[][] l, double[] x) {
    for (int i = 0; i < x.length; i++) {
      x[i] = remainder(l[i], x, x[i], 0, i);
    }
  }

  /** Solves L x = x for a lower triangular matrix. */
  static void solveLower(double[][] l, double[] x) {
    for (int i = 0; i < x.length; i++) {
      x[i] = remainder(l[i], x, x[i], 0, i) / l[i][i];
    }
  }

  /** Solves U x = x for an upper triangular matrix. */
  static void solveUpper(double[][] u, double[] x) {
    for (int i = x.length - 1; i >= 0; i--) {
      x[i] = remainder(u[i], x, x[i], i + 1, x.length) / u[i][i];
    }
  }

  /** Solves Lᵀ x = x for a lower triangular matrix. */
  static void solveLowerTransposed(double[][] l, double[] x) {
    for (int i = x.length - 1; i >= 0; i--) {
      double[] row = l[i];
      x[i] /= row[i];
      for (int j = 0; j < i; j++) {
        x[j] -= row[j] * x[i];
      }
    }
  }

  private static double remainder(double[] row, double[] x, double start, int from, int to) {
    double rest = start;
    for (int j = from; j < to; j++) {
      rest -= row[j] * x[j];
    }
    return rest;
  }
}
