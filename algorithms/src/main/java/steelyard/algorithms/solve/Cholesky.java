package steelyard.algorithms.solve;

/**
 * Cholesky factorisation of a symmetric positive definite matrix, row by row.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 10.1</a>
 */
final class Cholesky implements LinearSolver {

  /**
   * {@inheritDoc}
   *
   * @throws ArithmeticException if the matrix is not exactly symmetric, or a pivot is not positive
   */
  @Override
  public double[] solve(double[][] a, double[] b) {
    double[][] l = factor(a);
    double[] x = b.clone();
    Triangular.solveLower(l, x);
    Triangular.solveLowerTransposed(l, x);
    return x;
  }

  private static double[][] factor(double[][] a) {
    double[][] l = new double[a.length][];
    for (int i = 0; i < a.length; i++) {
      l[i] = new double[i + 1];
      for (int j = 0; j <= i; j++) {
        if (a[i][j] != a[j][i]) {
          throw Unsolvable.notSymmetric(i, j);
        }
        double rest = a[i][j];
        for (int k = 0; k < j; k++) {
          rest -= l[i][k] * l[j][k];
        }
        l[i][j] = i == j ? root(rest, i) : rest / l[j][j];
      }
    }
    return l;
  }

  private static double root(double pivot, int column) {
    // Written so that NaN, too, is not positive.
    if (!(pivot > 0)) {
      throw Unsolvable.notPositiveDefinite(column);
    }
    return Math.sqrt(pivot);
  }
}
