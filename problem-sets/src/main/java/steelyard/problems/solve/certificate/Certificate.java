package steelyard.problems.solve.certificate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;

/**
 * Turns an approximate inverse into a certified solution, or refuses. Whether it refuses depends on
 * what was proved alone: that the inverse exists, that the error bound of the solution is at most
 * 2^-133 (below 1e-40), and that the condition numbers are enclosed to 1 %.
 */
final class Certificate {
  private static final double SOLUTION_TOLERANCE = 0x1p-133;
  private static final double CONDITION_TOLERANCE = 0.01;
  private static final Enclosure UNBOUNDED =
      new Enclosure(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);

  private final ScaledSystem system;
  private final InverseBounds bounds;
  private final BoundedSolution solution;

  private Certificate(ScaledSystem system, InverseBounds bounds, BoundedSolution solution) {
    this.system = system;
    this.bounds = bounds;
    this.solution = solution;
  }

  /** Returns the certified solution; empty if the inverse is not good enough to prove it. */
  static Optional<CertifiedSolution> attempt(
      String route, ScaledSystem system, ApproximateInverse inverse) {
    InverseBounds bounds = new InverseBounds(inverse);
    if (!bounds.isProven()) {
      return Optional.empty();
    }
    return of(route, system, bounds, Refinement.run(system, inverse, bounds));
  }

  /** Returns the certified solution; empty if it is not bounded well enough. */
  static Optional<CertifiedSolution> of(
      String route, ScaledSystem system, InverseBounds bounds, BoundedSolution solution) {
    if (!(solution.relativeBound() <= SOLUTION_TOLERANCE)) {
      return Optional.empty();
    }
    CertifiedSolution result = new Certificate(system, bounds, solution).result(route);
    boolean narrow =
        result.inverseNorm().isWithin(CONDITION_TOLERANCE)
            && (solution.isZero()
                || (result.kappa().isWithin(CONDITION_TOLERANCE)
                    && result.componentwise().isWithin(CONDITION_TOLERANCE)));
    return narrow ? Optional.of(result) : Optional.empty();
  }

  private CertifiedSolution result(String route) {
    Enclosure inverseNorm = inverseTimes(rowWeights());
    Enclosure norm = solution.norm();
    double largest = 0;
    for (int i = 0; i < system.size; i++) {
      largest =
          Math.max(largest, Math.scalb(Math.abs(system.rightHandSide[i]), -system.rowShift[i]));
    }
    Enclosure kappa =
        solution.isZero()
            ? UNBOUNDED
            : inverseNorm.times(matrixNorm().plus(Enclosure.of(largest).over(norm)));
    Enclosure componentwise = solution.isZero() ? UNBOUNDED : componentwise(norm);
    return new CertifiedSolution(
        route,
        inUnits(Arrays.asList(solution.values())),
        inUnits(Arrays.stream(solution.radii()).mapToObj(Dyadic::of).toList()),
        solution.relativeBound(),
        inverseNorm.scalb(system.matrixShift),
        kappa,
        componentwise);
  }

  // Relative to the size of x from the start, since both factors may be large.
  private Enclosure componentwise(Enclosure norm) {
    int exponent = Math.getExponent(norm.upper());
    Enclosure[] relative = magnitudes();
    Arrays.setAll(relative, i -> relative[i].scalb(-exponent));
    return inverseTimes(relative).over(norm.scalb(-exponent));
  }

  // The norm of |inverse of 2^g A| w, given diag(2^r) w.
  private Enclosure inverseTimes(Enclosure[] v) {
    Enclosure[] rows = bounds.enclose(v);
    double lower = 0;
    double upper = 0;
    for (int i = 0; i < rows.length; i++) {
      double weight = Math.scalb(1.0, system.columnShift[i]);
      lower = Math.max(lower, rows[i].lower() * weight);
      upper = Math.max(upper, rows[i].upper() * weight);
    }
    return new Enclosure(lower, upper);
  }

  private Enclosure[] rowWeights() {
    return Arrays.stream(system.rowShift)
        .mapToObj(shift -> Enclosure.of(Math.scalb(1.0, shift)))
        .toArray(Enclosure[]::new);
  }

  // |A'||x'| + |b'|.
  private Enclosure[] magnitudes() {
    int n = system.size;
    Enclosure[] x = new Enclosure[n];
    Arrays.setAll(x, solution::magnitude);
    Enclosure[] sums = new Enclosure[n];
    for (int i = 0; i < n; i++) {
      double lower = Math.abs(system.rightHandSide[i]);
      double upper = lower;
      for (int j = 0; j < n; j++) {
        double entry = Math.abs(system.matrix[i * n + j]);
        lower += entry * x[j].lower();
        upper += entry * x[j].upper();
      }
      sums[i] = widened(lower, upper);
    }
    return sums;
  }

  // The norm of 2^g A.
  private Enclosure matrixNorm() {
    int n = system.size;
    double norm = 0;
    for (int i = 0; i < n; i++) {
      double sum = 0;
      for (int j = 0; j < n; j++) {
        double entry = Math.abs(system.matrix[i * n + j]);
        sum += Math.scalb(entry, -system.rowShift[i] - system.columnShift[j]);
      }
      norm = Math.max(norm, sum);
    }
    return widened(norm, norm);
  }

  private Enclosure widened(double lower, double upper) {
    int n = system.size;
    double underflow = n * Allowances.PROVEN.underflow();
    return new Enclosure(
        Math.max(0, Math.nextDown(lower * Allowances.PROVEN.deflation(n) - underflow)),
        Math.nextUp(upper * Allowances.PROVEN.inflation(n) + underflow));
  }

  private List<Dyadic> inUnits(List<Dyadic> scaled) {
    List<Dyadic> result = new ArrayList<>();
    for (int i = 0; i < scaled.size(); i++) {
      int shift = system.columnShift[i] + system.matrixShift - system.vectorShift;
      result.add(scaled.get(i).scalb(shift));
    }
    return List.copyOf(result);
  }
}
