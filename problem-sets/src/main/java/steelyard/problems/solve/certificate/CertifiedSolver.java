package steelyard.problems.solve.certificate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import steelyard.problems.UncertifiedException;
import steelyard.problems.solve.rational.PadicLifting;

/**
 * Solves systems with a proof, by the cheapest arithmetic in which the proof succeeds: double,
 * double-double, then fixed point with 128, 256, 512 and 1024 fraction bits, and last in rational
 * numbers, which takes minutes where n is 200 and is not tried beyond. Which one that is follows
 * from the outcome of {@link Certificate} alone.
 *
 * <p>After scaling, double reaches condition numbers of about 1e13 and double-double about 1e29;
 * fixed point is tested up to 1e234, and rational numbers have no limit but the range of double.
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
              PadicLifting lifting = requireNonsingular(system);
              return attempt(fixedPointRoutes(), system).or(() -> rational(system, lifting));
            })
        .orElseThrow(
            () ->
                new UncertifiedException(
                    "no reference could be certified with "
                        + LARGEST_PRECISION
                        + " fraction bits"
                        + (system.size <= RationalCertificate.LARGEST_SIZE
                            ? ", nor in rational numbers: the condition number exceeds the range"
                                + " of double"
                            : ": the condition number is too large")));
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

  private static Optional<CertifiedSolution> rational(ScaledSystem system, PadicLifting lifting) {
    return system.size <= RationalCertificate.LARGEST_SIZE
        ? RationalCertificate.attempt(system, lifting)
        : Optional.empty();
  }

  private static PadicLifting requireNonsingular(ScaledSystem system) {
    if (system.size > PadicLifting.LARGEST_SIZE) {
      throw new UncertifiedException(
          "the matrix may be singular: double-double does not tell, and n exceeds "
              + PadicLifting.LARGEST_SIZE);
    }
    return PadicLifting.of(system.size, system.matrix)
        .orElseThrow(
            () ->
                new UncertifiedException(
                    "the matrix is singular: its determinant is exactly zero"));
  }
}
