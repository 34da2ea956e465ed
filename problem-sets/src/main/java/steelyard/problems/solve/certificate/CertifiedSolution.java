package steelyard.problems.solve.certificate;

import java.util.List;
import java.util.OptionalDouble;
import steelyard.problems.exact.Dyadic;

/**
 * The solution of a system A x = b with everything that was proved of it, in the units of the
 * system. All norms are maximum norms.
 *
 * @param route the arithmetic that sufficed
 * @param values the reference, n entries
 * @param radii upper bounds on the error of each entry; 0 where the reference is exact
 * @param relativeBound an upper bound on the norm of its error relative to the norm of x
 * @param inverseNorm the norm of the inverse of A
 * @param kappa the normwise condition number ||A⁻¹|| (||A|| ||x|| + ||b||)/||x||; infinite where x
 *     is zero
 * @param componentwise the componentwise one, || |A⁻¹| (|A||x| + |b|) ||/||x||
 */
public record CertifiedSolution(
    String route,
    List<Dyadic> values,
    List<Dyadic> radii,
    double relativeBound,
    Enclosure inverseNorm,
    Enclosure kappa,
    Enclosure componentwise) {

  /** Says whether the reference is the solution itself. */
  public boolean isExact() {
    return relativeBound == 0;
  }

  /** Returns the norm of the reference. */
  public Dyadic norm() {
    return values.stream().map(Dyadic::abs).reduce(Dyadic.ZERO, CertifiedSolution::larger);
  }

  /**
   * Returns an upper bound on the error of entry i relative to that entry of the solution; 0 where
   * it is exact, empty where the entry may be zero.
   */
  public OptionalDouble relativeBound(int i) {
    if (radii.get(i).signum() == 0) {
      return OptionalDouble.of(0);
    }
    Dyadic least = values.get(i).abs().subtract(radii.get(i));
    return least.signum() > 0
        ? OptionalDouble.of(Math.nextUp(Dyadic.quotient(radii.get(i), least)))
        : OptionalDouble.empty();
  }

  private static Dyadic larger(Dyadic x, Dyadic y) {
    return x.compareTo(y) >= 0 ? x : y;
  }
}
