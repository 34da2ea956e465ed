package steelyard.algorithms.solve;

/**
 * Cramer's rule: each unknown is a quotient of two determinants.
 *
 * <p>A determinant is expanded by cofactors, every minor of the leading rows being computed once: n
 * 2ⁿ⁻¹ products each, with no division and no pivot, so that determinants of small integers are
 * exact. For two equations this is ad − bc.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 1.10.1</a>
 */
final class Cramer implements LinearSolver {

  /** The most equations for which the cost is tolerable. */
  static final int MAX_SIZE = 10;

  /**
   * {@inheritDoc}
   *
   * @throws ArithmeticException also if there are more than 10 equations
   */
  @Override
  public double[] solve(double[][] a, double[] b) {
    int n = b.length;
    if (n > MAX_SIZE) {
      throw new ArithmeticException(
          "Cramer's rule is for at most " + MAX_SIZE + " equations, and there are " + n);
    }
    double whole = determinant(a);
    if (whole == 0) {
      throw new ArithmeticException(
          "the matrix is singular to this candidate: its determinant is zero, and it must not be");
    }
    double[] x = new double[n];
    double[][] replaced = Rows.copy(a);
    for (int j = 0; j < n; j++) {
      for (int i = 0; i < n; i++) {
        replaced[i][j] = b[i];
      }
      x[j] = determinant(replaced) / whole;
      for (int i = 0; i < n; i++) {
        replaced[i][j] = a[i][j];
      }
    }
    return x;
  }

  /** Each set of columns, as a bit mask, owns the minor of as many leading rows. */
  private static double determinant(double[][] a) {
    double[] minors = new double[1 << a.length];
    minors[0] = 1;
    for (int columns = 1; columns < minors.length; columns++) {
      double[] lastRow = a[Integer.bitCount(columns) - 1];
      double sum = 0;
      // The column farthest to the right stands beside the last row: its sign is plus.
      boolean plus = true;
      for (int left = columns; left != 0; left ^= Integer.highestOneBit(left)) {
        int column = Integer.numberOfTrailingZeros(Integer.highestOneBit(left));
        double product = lastRow[column] * minors[columns ^ (1 << column)];
        sum += plus ? product : -product;
        plus = !plus;
      }
      minors[columns] = sum;
    }
    return minors[minors.length - 1];
  }
}
