package steelyard.algorithms.solve;

/**
 * QR by modified Gram-Schmidt: as soon as a column is normalised it is removed from all later
 * columns. The right-hand side is treated as one more column, which makes the solution backward
 * stable although the columns of Q lose orthogonality in proportion to κ.
 *
 * @see <a href="https://doi.org/10.1007/BF01934122">Björck, Solving linear least squares problems
 *     by Gram-Schmidt orthogonalization, BIT 7 (1967) 1-21</a>
 */
final class ModifiedGramSchmidt implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    QrFactors factors = factor(a);
    double[] rest = b.clone();
    double[] x = new double[b.length];
    for (int k = 0; k < b.length; k++) {
      x[k] = Vectors.dot(factors.q()[k], rest);
      Vectors.add(-x[k], factors.q()[k], rest);
    }
    Triangular.solveUpper(factors.r(), x);
    return x;
  }

  /**
   * Factors a square matrix, which is left as it is.
   *
   * @throws ArithmeticException if nothing is left of a column
   */
  static QrFactors factor(double[][] a) {
    int n = a.length;
    double[][] q = Rows.ofColumns(a);
    double[][] r = new double[n][n];
    for (int k = 0; k < n; k++) {
      r[k][k] = Vectors.length(q[k]);
      if (r[k][k] == 0) {
        throw Unsolvable.zeroPivot(k);
      }
      for (int i = 0; i < n; i++) {
        q[k][i] /= r[k][k];
      }
      for (int j = k + 1; j < n; j++) {
        r[k][j] = Vectors.dot(q[k], q[j]);
        Vectors.add(-r[k][j], q[k], q[j]);
      }
    }
    return new QrFactors(q, r);
  }
}
