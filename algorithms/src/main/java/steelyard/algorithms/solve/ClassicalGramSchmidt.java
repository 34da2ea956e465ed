package steelyard.algorithms.solve;

/**
 * QR by classical Gram-Schmidt: the components of a column along all earlier ones are taken from
 * the column as it was given. The solution is R⁻¹(Qᵀb), which trusts Q to be orthogonal; the loss
 * of orthogonality grows with κ².
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 19.8</a>
 */
final class ClassicalGramSchmidt implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    QrFactors factors = factor(a);
    double[] x = new double[b.length];
    for (int k = 0; k < b.length; k++) {
      x[k] = Vectors.dot(factors.q()[k], b);
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
      for (int j = 0; j < k; j++) {
        r[j][k] = Vectors.dot(q[j], q[k]);
      }
      for (int j = 0; j < k; j++) {
        Vectors.add(-r[j][k], q[j], q[k]);
      }
      r[k][k] = Vectors.length(q[k]);
      if (r[k][k] == 0) {
        throw Unsolvable.zeroPivot(k);
      }
      for (int i = 0; i < n; i++) {
        q[k][i] /= r[k][k];
      }
    }
    return new QrFactors(q, r);
  }
}
