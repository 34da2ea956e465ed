package steelyard.algorithms.solve;

import java.util.SplittableRandom;

/** Matrices and right-hand sides with known properties; solves nothing. */
final class Systems {

  private Systems() {}

  static double[][] identity(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      a[i][i] = 1;
    }
    return a;
  }

  /** Returns the permutation matrix that moves every entry one place up, the first to the end. */
  static double[][] cycle(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      a[i][(i + 1) % n] = 1;
    }
    return a;
  }

  /** Returns the Hilbert matrix, rounded to doubles. */
  static double[][] hilbert(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = 1.0 / (i + j + 1);
      }
    }
    return a;
  }

  /**
   * Returns the matrix for which partial pivoting doubles the last column at every step (Wilkinson,
   * Error analysis of direct methods of matrix inversion, 1961).
   */
  static double[][] wilkinsonGrowth(int n) {
    double[][] a = identity(n);
    for (int i = 0; i < n; i++) {
      a[i][n - 1] = 1;
      for (int j = 0; j < i && j < n - 1; j++) {
        a[i][j] = -1;
      }
    }
    return a;
  }

  /**
   * Returns a matrix of small integers and determinant 1: L Lᵀ or L U, entries of L and U −1 to 1.
   */
  static double[][] unimodular(int n, boolean symmetric, SplittableRandom random) {
    double[][] l = unitLower(n, random);
    double[][] u = Rows.ofColumns(symmetric ? l : unitLower(n, random));
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      a[i] = times(Rows.ofColumns(u), l[i]);
    }
    return a;
  }

  private static double[][] unitLower(int n, SplittableRandom random) {
    double[][] l = identity(n);
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < i; j++) {
        l[i][j] = random.nextInt(3) - 1;
      }
    }
    return l;
  }

  /** Returns entries from −1 to 1. */
  static double[] uniform(int n, SplittableRandom random) {
    double[] x = new double[n];
    for (int i = 0; i < n; i++) {
      x[i] = 2 * random.nextDouble() - 1;
    }
    return x;
  }

  /** Returns entries from −9 to 9. */
  static double[] digits(int n, SplittableRandom random) {
    double[] x = new double[n];
    for (int i = 0; i < n; i++) {
      x[i] = random.nextInt(19) - 9;
    }
    return x;
  }

  /** Returns the product of a matrix and a vector; exact for small integers. */
  static double[] times(double[][] a, double[] x) {
    double[] product = new double[a.length];
    for (int i = 0; i < a.length; i++) {
      product[i] = Vectors.dot(a[i], x);
    }
    return product;
  }
}
