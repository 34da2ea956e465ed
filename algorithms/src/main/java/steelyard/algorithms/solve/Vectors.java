package steelyard.algorithms.solve;

/** Arithmetic on whole vectors of one length; knows no matrix. */
final class Vectors {

  private Vectors() {}

  static double dot(double[] x, double[] y) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += x[i] * y[i];
    }
    return sum;
  }

  /** Adds a multiple of x to y. */
  static void add(double multiple, double[] x, double[] y) {
    for (int i = 0; i < x.length; i++) {
      y[i] += multiple * x[i];
    }
  }

  /** Returns the largest modulus, NaN if any entry is NaN, 0 for an empty vector. */
  static double largest(double[] x) {
    double largest = 0;
    for (double entry : x) {
      largest = Math.max(largest, Math.abs(entry));
    }
    return largest;
  }

  /** Returns the Euclidean length; scaling by a power of two keeps the squares in range. */
  static double length(double[] x) {
    double largest = largest(x);
    if (largest == 0 || !Double.isFinite(largest)) {
      return largest;
    }
    int exponent = Math.getExponent(largest);
    double scale = Math.scalb(1.0, -exponent);
    double sum = 0;
    for (double entry : x) {
      double scaled = entry * scale;
      sum += scaled * scaled;
    }
    return Math.scalb(Math.sqrt(sum), exponent);
  }
}
