package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.generate.Draw;

/** Random matrices and vectors from which families are built. */
final class RandomMatrices {
  private RandomMatrices() {}

  /**
   * Returns an orthogonal matrix, up to rounding, from the Haar distribution: a diagonal matrix of
   * signs times Householder reflectors for Gaussian vectors of growing length.
   *
   * @see "G. W. Stewart, The efficient generation of random orthogonal matrices with an application
   *     to condition estimators, SIAM J. Numer. Anal. 17 (1980), 403-409"
   */
  static double[][] orthogonal(int n, UniformRandomProvider random) {
    double[][] q = new double[n][n];
    for (int i = 0; i < n; i++) {
      q[i][i] = 1;
    }
    q[n - 1][n - 1] = random.nextBoolean() ? 1 : -1;
    for (int start = n - 2; start >= 0; start--) {
      double[] v = new double[n];
      for (int i = start; i < n; i++) {
        v[i] = gaussian(random);
      }
      double sign = reflectOntoAxis(v, start);
      applyReflector(v, start, q);
      for (int j = 0; j < n; j++) {
        q[start][j] *= sign;
      }
    }
    return q;
  }

  /** Returns a random vector v for which I - v vᵀ is a reflector: one of norm sqrt(2). */
  static double[] reflectorVector(int n, UniformRandomProvider random) {
    double[] v = new double[n];
    double square = 0;
    for (int i = 0; i < n; i++) {
      v[i] = gaussian(random);
      square += v[i] * v[i];
    }
    double scale = Math.sqrt(square / 2);
    for (int i = 0; i < n; i++) {
      v[i] /= scale;
    }
    return v;
  }

  // Turns a vector into that of the reflector that maps it onto an axis, scaled so that the
  // reflector is I - v v'; returns the sign of the entry onto which it is mapped.
  private static double reflectOntoAxis(double[] v, int start) {
    double norm = 0;
    for (int i = start; i < v.length; i++) {
      norm += v[i] * v[i];
    }
    norm = Math.sqrt(norm);
    double sign = v[start] < 0 ? -1 : 1;
    v[start] += sign * norm;
    double scale = Math.sqrt(norm * Math.abs(v[start]));
    for (int i = start; i < v.length; i++) {
      v[i] /= scale;
    }
    return -sign;
  }

  private static void applyReflector(double[] v, int start, double[][] q) {
    double[] products = new double[v.length];
    for (int i = start; i < v.length; i++) {
      for (int j = start; j < v.length; j++) {
        products[j] += v[i] * q[i][j];
      }
    }
    for (int i = start; i < v.length; i++) {
      for (int j = start; j < v.length; j++) {
        q[i][j] -= v[i] * products[j];
      }
    }
  }

  /** Returns u diag(s) vᵀ, rounded. */
  static double[][] product(double[][] u, double[] s, double[][] v) {
    int n = s.length;
    double[][] transposed = new double[n][n];
    for (int k = 0; k < n; k++) {
      for (int j = 0; j < n; j++) {
        transposed[k][j] = s[k] * v[j][k];
      }
    }
    double[][] product = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int k = 0; k < n; k++) {
        double factor = u[i][k];
        for (int j = 0; j < n; j++) {
          product[i][j] += factor * transposed[k][j];
        }
      }
    }
    return product;
  }

  /** Returns entries of magnitude in [1/2, 1) and random sign. */
  static double[] ofOrderOne(int n, UniformRandomProvider random) {
    double[] x = new double[n];
    for (int i = 0; i < n; i++) {
      x[i] = Draw.signed(random, 0);
    }
    return x;
  }

  /** Returns the system with the right-hand side a x, each entry correctly rounded. */
  static LinearSystem withSolution(double[][] a, double[] x) {
    double[] b = new double[x.length];
    for (int i = 0; i < b.length; i++) {
      b[i] = ExactAccumulator.dot(a[i], x).doubleValue();
    }
    return new LinearSystem(a, b);
  }

  // The polar method of Marsaglia and Bray, SIAM Review 6 (1964), 260-264.
  private static double gaussian(UniformRandomProvider random) {
    while (true) {
      double x = 2 * random.nextDouble() - 1;
      double y = 2 * random.nextDouble() - 1;
      double square = x * x + y * y;
      if (square > 0 && square < 1) {
        return x * Math.sqrt(-2 * StrictMath.log(square) / square);
      }
    }
  }
}
