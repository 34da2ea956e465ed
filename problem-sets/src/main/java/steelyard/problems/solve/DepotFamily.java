package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family.Profile;
import steelyard.problems.Family.Request;
import steelyard.problems.Reach;
import steelyard.problems.generate.Draw;

/**
 * The calibration of the load cells under a grain silo, an invented example. Cell i answers a load
 * of one kilogram on the place of cell j with 10^7 g_i c^|i-j| counts, rounded to an integer: g_i
 * is its gain, a decimal near 1, and c the cross-talk between neighbours. Reference weights of
 * whole kilograms stand on the places; the readings are exact, so that the weights are the exact
 * solution.
 */
final class DepotFamily {
  private static final double COUNTS = 1e7;
  private static final double LARGEST_CONDITION = 1e6;

  private DepotFamily() {}

  static SystemFamily create() {
    return new SystemFamily(
        new Profile(
            "depot-load-cell",
            "an everyday system of integers with an exact integer solution (invented data)",
            "the cross-talk between neighbouring load cells",
            "own construction: invented calibration of a silo's load cells by reference weights, on"
                + " the matrix of Kac, Murdock and Szegö (1953)"),
        Reach.upTo(LARGEST_CONDITION, 2, 64),
        DepotFamily::make);
  }

  private static LinearSystem make(Request request, UniformRandomProvider random) {
    int n = request.size();
    double[] gains = new double[n];
    double[] weights = new double[n];
    for (int i = 0; i < n; i++) {
      gains[i] = Draw.between(random, 980, 1020) / 1000.0;
      weights[i] = Draw.between(random, 20, 500);
    }
    return Calibration.nearest(
        request.condition(),
        2 * LARGEST_CONDITION,
        parameter -> RandomMatrices.withSolution(readings(gains, 1 - 1 / parameter), weights));
  }

  private static double[][] readings(double[] gains, double crossTalk) {
    int n = gains.length;
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = Math.rint(COUNTS * gains[i] * StrictMath.pow(crossTalk, Math.abs(i - j)));
      }
    }
    return a;
  }
}
