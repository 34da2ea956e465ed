package steelyard.problems.solve;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.fraction.BigFraction;
import steelyard.problems.UncertifiedException;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.certificate.Enclosure;

/** Holds everything that is certified of a system against its exact rational solution. */
public final class ExactVerdict {
  private static final double WIDTH = 0.01;
  private static final double RELATIVE_BOUND = 1e-40;

  private final LinearSystem system;
  private final CertifiedSolution solution;
  private final RationalInverse exact;
  private final List<String> violations = new ArrayList<>();

  private ExactVerdict(LinearSystem system, CertifiedSolution solution) {
    this.system = system;
    this.solution = solution;
    exact = new RationalInverse(system.a());
  }

  /**
   * Certifies a system and checks what was certified.
   *
   * @return the certified solution
   * @throws AssertionError if a bound is violated, with the system in full
   */
  public static CertifiedSolution require(LinearSystem system) {
    try {
      CertifiedSolution solution = CertifiedSolver.solve(system.a(), system.b());
      require(system, solution);
      return solution;
    } catch (UncertifiedException refused) {
      throw new AssertionError("refused: " + refused.getMessage() + dump(system), refused);
    }
  }

  /**
   * Checks what was certified of a system.
   *
   * @throws AssertionError if a bound is violated, with the system in full
   */
  static void require(LinearSystem system, CertifiedSolution solution) {
    List<String> violations = new ExactVerdict(system, solution).violations();
    if (!violations.isEmpty()) {
      throw new AssertionError(solution.route() + ": " + violations + dump(system));
    }
  }

  private List<String> violations() {
    BigFraction[] x = exact.solve(system.b());
    BigFraction[] errors = new BigFraction[x.length];
    for (int i = 0; i < x.length; i++) {
      errors[i] = RationalInverse.exact(solution.values().get(i)).subtract(x[i]).abs();
      BigFraction radius = RationalInverse.exact(solution.radii().get(i));
      expect(errors[i].compareTo(radius) <= 0, "x[" + i + "] lies outside its radius");
    }
    BigFraction allowed =
        RationalInverse.exact(solution.relativeBound()).multiply(RationalInverse.norm(x));
    expect(RationalInverse.norm(errors).compareTo(allowed) <= 0, "relative bound");
    expect(solution.relativeBound() < RELATIVE_BOUND, "relative bound is coarse");
    expectInside(solution.inverseNorm(), exact.inverseNorm(), "norm of the inverse");
    expectInside(solution.kappa(), exact.normwise(system.b()), "normwise condition");
    expectInside(solution.componentwise(), exact.componentwise(system.b()), "componentwise");
    return violations;
  }

  private void expectInside(Enclosure enclosure, BigFraction value, String what) {
    expect(contains(enclosure, value), what + " lies outside " + enclosure);
    expect(enclosure.isWithin(WIDTH), what + " is wide: " + enclosure);
  }

  /** Says whether an exact value lies inside an enclosure. */
  public static boolean contains(Enclosure enclosure, BigFraction value) {
    return RationalInverse.exact(enclosure.lower()).compareTo(value) <= 0
        && RationalInverse.exact(enclosure.upper()).compareTo(value) >= 0;
  }

  private void expect(boolean held, String what) {
    if (!held) {
      violations.add(what);
    }
  }

  // Hexadecimal, so that the very same system can be made again.
  private static String dump(LinearSystem system) {
    StringBuilder text = new StringBuilder("\na = {\n");
    for (double[] row : system.a()) {
      append(text.append("  {"), row).append("},\n");
    }
    return append(text.append("}\nb = {"), system.b()).append("}\n").toString();
  }

  private static StringBuilder append(StringBuilder text, double[] row) {
    for (double entry : row) {
      text.append(Double.toHexString(entry)).append(", ");
    }
    return text;
  }
}
