package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family.Profile;
import steelyard.problems.Family.Request;
import steelyard.problems.Reach;

/**
 * d1 b d2 with a well-conditioned matrix b and powers of two d1 and d2, so that the scaling is
 * exact; the solution is y/d2 for a y of order 1. The normwise condition number grows with the
 * range of the scalings, the componentwise one does not.
 */
final class BadlyScaledFamily {
  private static final double LARGEST_CONDITION = 1e30;
  private static final double LARGEST_RANGE = 1e33;

  private BadlyScaledFamily() {}

  static SystemFamily create() {
    return new SystemFamily(
        new Profile(
            "badly-scaled",
            "ill-conditioned by its units alone: harmless for what is stable componentwise",
            "the range of the powers of two by which rows and columns are scaled",
            "N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., SIAM 2002,"
                + " section 7.3; own construction of the instances"),
        Reach.upTo(LARGEST_CONDITION, 2, 400),
        BadlyScaledFamily::make);
  }

  private static LinearSystem make(Request request, UniformRandomProvider random) {
    int n = request.size();
    double[][] inner = RandomMatrices.orthogonal(n, random);
    double[] rowPlaces = places(n, random);
    double[] columnPlaces = places(n, random);
    double[] y = RandomMatrices.ofOrderOne(n, random);
    return Calibration.nearest(
        request.condition(),
        LARGEST_RANGE,
        range -> {
          int bits = (int) Math.rint(StrictMath.log(range) / StrictMath.log(2));
          return scaled(
              inner, y, exponents(rowPlaces, bits / 2), exponents(columnPlaces, bits - bits / 2));
        });
  }

  private static LinearSystem scaled(double[][] inner, double[] y, int[] rows, int[] columns) {
    int n = y.length;
    double[][] a = new double[n][n];
    double[] x = new double[n];
    for (int i = 0; i < n; i++) {
      x[i] = Math.scalb(y[i], -columns[i]);
      for (int j = 0; j < n; j++) {
        a[i][j] = Math.scalb(inner[i][j], rows[i] + columns[j]);
      }
    }
    return RandomMatrices.withSolution(a, x);
  }

  // Places in [0, 1], both ends among them.
  private static double[] places(int n, UniformRandomProvider random) {
    double[] places = new double[n];
    for (int i = 0; i < n; i++) {
      places[i] = random.nextDouble();
    }
    int first = random.nextInt(n);
    places[first] = 0;
    places[(first + 1 + random.nextInt(n - 1)) % n] = 1;
    return places;
  }

  private static int[] exponents(double[] places, int range) {
    int[] exponents = new int[places.length];
    for (int i = 0; i < places.length; i++) {
      exponents[i] = (int) Math.rint(places[i] * range);
    }
    return exponents;
  }
}
