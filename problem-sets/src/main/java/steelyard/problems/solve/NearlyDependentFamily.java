package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family.Profile;
import steelyard.problems.Family.Request;
import steelyard.problems.Reach;

/**
 * Systems whose last row is the sum of some others but for one entry. That entry alone decides how
 * far the matrix is from a singular one, and it may be as small as is wanted: the others have few
 * bits, so that their sums are exact and they have a zero in its column.
 */
final class NearlyDependentFamily {
  private static final int ENTRY_BITS = 20;
  private static final int LARGEST_SIZE = 1000;
  private static final int LARGEST_SUM = 3;
  private static final double LARGEST_CONDITION = 1e28;

  private NearlyDependentFamily() {}

  static SystemFamily create() {
    return new SystemFamily(
        new Profile(
            "nearly-dependent",
            "one row depends on others but for a tiny entry: condition numbers that no spectrum"
                + " survives in double",
            "the reciprocal of the entry by which the last row is independent",
            "own construction"),
        Reach.upTo(LARGEST_CONDITION, 2, LARGEST_SIZE),
        NearlyDependentFamily::generate);
  }

  private static LinearSystem generate(Request request, UniformRandomProvider random) {
    int n = request.size();
    int summed = Math.min(LARGEST_SUM, n - 1);
    double[][] a = new double[n][n];
    // So small that the diagonal dominates, and nothing but the last row is ill-conditioned.
    int exponent = -ENTRY_BITS - 1 - (Integer.SIZE - Integer.numberOfLeadingZeros(n));
    for (int i = 0; i < n - 1; i++) {
      for (int j = 0; j < n; j++) {
        double entry = Math.scalb(random.nextInt(1 << ENTRY_BITS) + 1.0, exponent);
        a[i][j] = i == j ? 1 : random.nextBoolean() ? entry : -entry;
      }
    }
    for (int i = 0; i < summed; i++) {
      a[i][n - 1] = 0;
      for (int j = 0; j < n; j++) {
        a[n - 1][j] += a[i][j];
      }
    }
    double[] x = RandomMatrices.ofOrderOne(n, random);
    return Calibration.nearest(
        request.condition(),
        2 * LARGEST_CONDITION,
        alpha -> {
          double[][] matrix = a.clone();
          matrix[n - 1] = a[n - 1].clone();
          matrix[n - 1][n - 1] = 1 / alpha;
          return RandomMatrices.withSolution(matrix, x);
        });
  }
}
