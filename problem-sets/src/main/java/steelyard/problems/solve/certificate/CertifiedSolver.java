package steelyard.problems.solve.certificate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import steelyard.problems.UncertifiedException;

/**
 * Solves systems with a proof, by the cheapest arithmetic in which the proof succeeds: double,
 * double-double, then fixed point with 128, 256, 512 and 1024 fraction bits. Which one that is
 * follows from the outcome of {@link Certificate} alone.
 *
 * <p>After scaling, double reaches condition numbers of about 1e13 and double-double about 1e26;
 * fixed point is tested up to 1e234.
 */
public final class CertifiedSolver {
  private static final int LARGEST_PRECISION = 1024;
  private static final List<Route> FIRST_ROUTES =
      List.of(new DoubleInverse.DoubleRoute(), new DoubleDoubleInverse.DoubleDoubleRoute());

  private CertifiedSolver() {}

  /**
   * Solves a x = b.
   *
   * @param a n rows of n finite entries
   * @param b n finite entries
   * @throws UncertifiedException if the matrix is singular, or no arithmetic sufficed, or the
   *     entries span too many powers of two
   */
  public static CertifiedSolution solve(double[][] a, double[] b) {
    ScaledSystem system = new ScaledSystem(a, b);
    return attempt(FIRST_ROUTES, system)
        .or(
            () -> {
              requireNonsingular(system);
              return attempt(fixedPointRoutes(), system);
            })
        .orElseThrow(
            () ->
                new UncertifiedException(
                    "no reference could be certified with "
                        + LARGEST_PRECISION
                        + " fraction bits: the condition number is too large"));
  }

  private static Optional<CertifiedSolution> attempt(List<Route> routes, ScaledSystem system) {
    return routes.stream().flatMap(route -> attempt(route, system).stream()).findFirst();
  }

  /** Tries one route. */
  static Optional<CertifiedSolution> attempt(Route route, ScaledSystem system) {
    return route
        .invert(system)
        .flatMap(inverse -> Certificate.attempt(route.name(), system, inverse));
  }

  private static List<Route> fixedPointRoutes() {
    List<Route> routes = new ArrayList<>();
    for (int bits = 128; bits <= LARGEST_PRECISION; bits *= 2) {
      routes.add(new FixedPointInverse.FixedPointRoute(bits));
    }
    return routes;
  }

  private static void requireNonsingular(ScaledSystem system) {
    if (ModularDeterminant.isZero(system.size, system.matrix)) {
      throw new UncertifiedException("the matrix is singular: its determinant is exactly zero");
    }
  }
}
