package steelyard.algorithms.solve;

/**
 * Computes the inverse from Gaussian elimination with partial pivoting, one column at a time, and
 * multiplies.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, section 14.1</a>
 */
final class ExplicitInverse implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    LuFactors factors = LuFactors.of(a, Pivoting.PARTIAL);
    double[] x = new double[b.length];
    double[] unit = new double[b.length];
    for (int j = 0; j < b.length; j++) {
      unit[j] = 1;
      Vectors.add(b[j], factors.solve(unit), x);
      unit[j] = 0;
    }
    return x;
  }
}
