package steelyard.algorithms.solve;

/**
 * Gaussian elimination with partial pivoting, then iterative refinement on residuals that are
 * computed as if in twice the working precision. The solution itself is kept in working precision.
 *
 * <p>Refinement stops when a correction is not at most half as large as the one before, in the
 * largest modulus (it is then not applied), or after ten of them. A correction that is not finite
 * is never applied.
 *
 * <ol>
 *   <li><a href="https://doi.org/10.1145/321386.321394">Moler, Iterative refinement in floating
 *       point, Journal of the ACM 14 (1967) 316-321</a>: while κu is well below 1 the solution
 *       becomes accurate to working precision.
 *   <li><a href="https://doi.org/10.1137/030601818">Ogita, Rump and Oishi, Accurate sum and dot
 *       product, SIAM Journal on Scientific Computing 26 (2005) 1955-1988</a>, algorithm Dot2: the
 *       residual.
 *   <li><a href="https://doi.org/10.1145/1141885.1141894">Demmel, Hida, Kahan, Li, Mukherjee and
 *       Riedy, Error bounds from extra-precise iterative refinement, ACM Transactions on
 *       Mathematical Software 32 (2006) 325-351</a>: the ratio one half and the ten steps.
 * </ol>
 */
final class RefinedExtended implements LinearSolver {

  private static final int MAX_STEPS = 10;

  @Override
  public double[] solve(double[][] a, double[] b) {
    LuFactors factors = LuFactors.of(a, Pivoting.PARTIAL);
    double[] x = factors.solve(b);
    double last = Double.MAX_VALUE;
    for (int step = 0; step < MAX_STEPS; step++) {
      double[] correction = factors.solve(residual(a, x, b));
      double size = Vectors.largest(correction);
      // Written so that a NaN, too, ends the refinement.
      if (!(size <= last / 2)) {
        break;
      }
      Vectors.add(1, correction, x);
      last = size;
    }
    return x;
  }

  private static double[] residual(double[][] a, double[] x, double[] b) {
    double[] residual = new double[b.length];
    for (int i = 0; i < b.length; i++) {
      residual[i] = residual(a[i], x, b[i]);
    }
    return residual;
  }

  /** Subtracts the products from the right-hand side and adds up what the roundings lost. */
  private static double residual(double[] row, double[] x, double right) {
    double sum = right;
    double lost = 0;
    for (int j = 0; j < row.length; j++) {
      double product = -row[j] * x[j];
      double productError = Math.fma(-row[j], x[j], -product);
      double next = sum + product;
      double shift = next - sum;
      double sumError = (sum - (next - shift)) + (product - shift);
      lost += productError + sumError;
      sum = next;
    }
    return sum + lost;
  }
}
