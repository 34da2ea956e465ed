package steelyard.algorithms.solve;

/**
 * Gaussian elimination followed by two substitutions.
 *
 * <p>An exactly zero pivot is an {@link ArithmeticException}. NaN flows through to the answer; an
 * infinite coefficient may not, since whatever is divided by it is zero.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, chapter 9</a>
 */
record GaussianElimination(Pivoting pivoting) implements LinearSolver {

  @Override
  public double[] solve(double[][] a, double[] b) {
    return LuFactors.of(a, pivoting).solve(b);
  }
}
