package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;

/**
 * A matrix with given singular values made in n² operations: a diagonal matrix D between two random
 * Householder reflectors, (I - u uᵀ) D (I - v vᵀ), written out as
 *
 * <pre>  D - u (D u)ᵀ - (D v - c u) vᵀ,   c = uᵀ D v.</pre>
 *
 * <p>Its singular vectors are far from Haar-distributed: all but two directions are nearly those of
 * the axes. Where that does not matter it costs less than a factorization.
 */
public final class ReflectedDiagonal {
  private final double[] u;
  private final double[] v;

  private ReflectedDiagonal(double[] u, double[] v) {
    this.u = u;
    this.v = v;
  }

  /**
   * Draws two reflectors.
   *
   * @param n the size, at least 1
   */
  public static ReflectedDiagonal draw(int n, UniformRandomProvider random) {
    return new ReflectedDiagonal(
        RandomMatrices.reflectorVector(n, random), RandomMatrices.reflectorVector(n, random));
  }

  /**
   * Returns the matrix with given singular values, up to rounding.
   *
   * @param s n nonnegative values
   */
  public double[][] around(double[] s) {
    int n = s.length;
    double c = 0;
    double[] scaledU = new double[n];
    for (int i = 0; i < n; i++) {
      scaledU[i] = s[i] * u[i];
      c += scaledU[i] * v[i];
    }
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      double left = u[i];
      double right = s[i] * v[i] - c * u[i];
      for (int j = 0; j < n; j++) {
        a[i][j] = -(left * scaledU[j] + right * v[j]);
      }
      a[i][i] += s[i];
    }
    return a;
  }
}
