package steelyard.problems.solve.certificate;

/**
 * The product of two square matrices in double, by rows: no claim but that every entry is a sum of
 * its n products in some order.
 */
final class ProductRows {
  private ProductRows() {}

  /** Adds the product of a left and a right factor to a result. */
  static void multiply(double[][] left, double[][] right, double[][] result) {
    int n = left.length;
    double[] zero = new double[n];
    double[] unused = new double[n];
    for (int i = 0; i < n; i += 2) {
      boolean isPair = i + 1 < n;
      double[] below = isPair ? left[i + 1] : zero;
      double[] resultBelow = isPair ? result[i + 1] : unused;
      for (int k = 0; k < n; k += 4) {
        double[] r1 = k + 1 < n ? right[k + 1] : zero;
        double[] r2 = k + 2 < n ? right[k + 2] : zero;
        double[] r3 = k + 3 < n ? right[k + 3] : zero;
        add(left[i], below, k, right[k], r1, r2, r3, result[i], resultBelow);
      }
    }
  }

  private static double at(double[] row, int k) {
    return k < row.length ? row[k] : 0;
  }

  // Two rows at a time, so that each entry that is loaded serves both.
  private static void add(
      double[] leftA,
      double[] leftB,
      int k,
      double[] r0,
      double[] r1,
      double[] r2,
      double[] r3,
      double[] sumA,
      double[] sumB) {
    double a0 = leftA[k];
    double a1 = at(leftA, k + 1);
    double a2 = at(leftA, k + 2);
    double a3 = at(leftA, k + 3);
    double b0 = leftB[k];
    double b1 = at(leftB, k + 1);
    double b2 = at(leftB, k + 2);
    double b3 = at(leftB, k + 3);
    for (int j = 0; j < sumA.length; j++) {
      double x0 = r0[j];
      double x1 = r1[j];
      double x2 = r2[j];
      double x3 = r3[j];
      sumA[j] += (a0 * x0 + a1 * x1) + (a2 * x2 + a3 * x3);
      sumB[j] += (b0 * x0 + b1 * x1) + (b2 * x2 + b3 * x3);
    }
  }
}
