package steelyard.algorithms.solve;

/**
 * Scales rows, then columns, by powers of two until the largest entry of each is between 1 and 2,
 * then eliminates with partial pivoting. The scaling rounds nothing unless an entry underflows or
 * overflows by it.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 9.8</a>
 */
final class Equilibrated implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    int n = b.length;
    double[][] scaled = Rows.copy(a);
    double[] right = b.clone();
    for (int i = 0; i < n; i++) {
      int exponent = Math.getExponent(Vectors.largest(scaled[i]));
      for (int j = 0; j < n; j++) {
        scaled[i][j] = Math.scalb(scaled[i][j], -exponent);
      }
      right[i] = Math.scalb(right[i], -exponent);
    }
    int[] exponents = new int[n];
    for (int j = 0; j < n; j++) {
      exponents[j] = exponentOfColumn(scaled, j);
      for (int i = 0; i < n; i++) {
        scaled[i][j] = Math.scalb(scaled[i][j], -exponents[j]);
      }
    }
    double[] x = LuFactors.of(scaled, Pivoting.PARTIAL).solve(right);
    for (int j = 0; j < n; j++) {
      x[j] = Math.scalb(x[j], -exponents[j]);
    }
    return x;
  }

  private static int exponentOfColumn(double[][] a, int column) {
    double largest = 0;
    for (double[] row : a) {
      largest = Math.max(largest, Math.abs(row[column]));
    }
    return Math.getExponent(largest);
  }
}
