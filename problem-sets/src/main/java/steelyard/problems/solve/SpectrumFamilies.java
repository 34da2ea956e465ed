package steelyard.problems.solve;

import java.util.List;
import java.util.function.Function;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family.Profile;
import steelyard.problems.Family.Request;
import steelyard.problems.Reach;

/**
 * Matrices with prescribed singular values or eigenvalues between orthogonal factors, which are
 * Haar-distributed but for one family. The right-hand side is a x for an x of order 1, correctly
 * rounded.
 */
final class SpectrumFamilies {
  private static final String SOURCE =
      "N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., SIAM 2002, section"
          + " 28.3; orthogonal factors: G. W. Stewart, SIAM J. Numer. Anal. 17 (1980), 403-409";
  private static final String KNOB = "the ratio of the largest to the smallest singular value";
  private static final int LARGEST_SIZE = 1000;

  // Rounding the entries changes the eigenvalues by about sqrt(n) u times the largest, so that the
  // smallest survives with room to spare.
  private static final double LARGEST_DEFINITE = 1e13;

  private SpectrumFamilies() {}

  /** The singular values between 1 and 1/alpha. */
  @FunctionalInterface
  private interface Spectrum {
    /** Returns the value at a place from 0, the largest, to n - 1, the smallest. */
    double at(int place, int n, double alpha);
  }

  static List<SystemFamily> all() {
    return List.of(
        family(
            "spectrum-one-large",
            "one singular value dominates: all directions but one are small",
            (i, n, alpha) -> i == 0 ? 1 : 1 / alpha),
        family(
            "spectrum-one-small",
            "one singular value is small: nearly singular in one direction only",
            (i, n, alpha) -> i == n - 1 ? 1 / alpha : 1),
        family(
            "spectrum-geometric",
            "singular values evenly spread over the magnitudes",
            SpectrumFamilies::geometric),
        family(
            "spectrum-arithmetic",
            "singular values evenly spaced: most of them large",
            (i, n, alpha) -> 1 - (1 - 1 / alpha) * i / (n - 1.0)),
        logUniform(),
        reflected(),
        positiveDefinite());
  }

  private static double geometric(int place, int n, double alpha) {
    return StrictMath.pow(alpha, -place / (n - 1.0));
  }

  private static SystemFamily family(String id, String purpose, Spectrum spectrum) {
    return new SystemFamily(
        new Profile(id, purpose, KNOB, SOURCE),
        Reach.upTo(1e16, 2, LARGEST_SIZE),
        (request, random) -> general(request, random, spectrum));
  }

  private static SystemFamily logUniform() {
    return new SystemFamily(
        new Profile(
            "spectrum-log-uniform",
            "singular values at random magnitudes, the extremes included",
            KNOB,
            SOURCE + "; the distribution is that of LAPACK's test matrix generator (from memory)"),
        Reach.upTo(1e16, 2, LARGEST_SIZE),
        (request, random) -> {
          double[] places = new double[request.size()];
          for (int i = 1; i < places.length - 1; i++) {
            places[i] = random.nextDouble();
          }
          places[places.length - 1] = 1;
          return general(request, random, (i, n, alpha) -> StrictMath.pow(alpha, -places[i]));
        });
  }

  private static SystemFamily reflected() {
    return new SystemFamily(
        new Profile(
            "reflected-geometric",
            "singular values evenly spread over the magnitudes, in a matrix that is cheap to make:"
                + " most singular vectors lie near the axes",
            KNOB,
            "own construction: a diagonal matrix between two random Householder reflectors"),
        Reach.upTo(1e16, 2, LARGEST_SIZE),
        (request, random) -> {
          ReflectedDiagonal reflectors = ReflectedDiagonal.draw(request.size(), random);
          return general(request, random, SpectrumFamilies::geometric, reflectors::around);
        });
  }

  private static SystemFamily positiveDefinite() {
    return new SystemFamily(
        new Profile(
            "positive-definite",
            "symmetric positive definite, eigenvalues evenly spread over the magnitudes: for"
                + " Cholesky and conjugate gradients",
            "the ratio of the largest to the smallest eigenvalue",
            SOURCE),
        Reach.upTo(LARGEST_DEFINITE, 2, LARGEST_SIZE),
        SpectrumFamilies::symmetric);
  }

  private static LinearSystem general(
      Request request, UniformRandomProvider random, Spectrum spectrum) {
    double[][] u = RandomMatrices.orthogonal(request.size(), random);
    double[][] v = RandomMatrices.orthogonal(request.size(), random);
    return general(request, random, spectrum, values -> RandomMatrices.product(u, values, v));
  }

  private static LinearSystem general(
      Request request,
      UniformRandomProvider random,
      Spectrum spectrum,
      Function<double[], double[][]> factors) {
    double[] x = RandomMatrices.ofOrderOne(request.size(), random);
    return Calibration.nearest(
        request.condition(),
        1e17,
        alpha -> RandomMatrices.withSolution(factors.apply(values(spectrum, x.length, alpha)), x));
  }

  private static LinearSystem symmetric(Request request, UniformRandomProvider random) {
    double[][] q = RandomMatrices.orthogonal(request.size(), random);
    double[] x = RandomMatrices.ofOrderOne(request.size(), random);
    return Calibration.nearest(
        request.condition(),
        LARGEST_DEFINITE,
        alpha -> {
          double[][] a =
              RandomMatrices.product(q, values(SpectrumFamilies::geometric, x.length, alpha), q);
          for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < i; j++) {
              a[j][i] = a[i][j];
            }
          }
          return RandomMatrices.withSolution(a, x);
        });
  }

  private static double[] values(Spectrum spectrum, int n, double alpha) {
    double[] values = new double[n];
    for (int i = 0; i < n; i++) {
      values[i] = spectrum.at(i, n, alpha);
    }
    return values;
  }
}
