package steelyard.problems.solve.certificate;

import java.util.Arrays;
import steelyard.problems.exact.ExactAccumulator;

/**
 * Iterative refinement with exact residuals. The approximate solution is an unevaluated sum of
 * doubles, to which each step adds R r; the residual r = b - A x̃ is carried along without
 * rounding, so that its size says how good x̃ is, whatever R was.
 */
final class Refinement {
  private static final int LARGEST_STEPS = 100;
  private static final double AIM = 0x1p-150;
  private static final double SLOWEST = 0.9;

  private final ScaledSystem system;
  private final InverseBounds bounds;
  private final ExactAccumulator[] residual;
  private final ExactAccumulator[] solution;
  private final double[] leading;

  private Refinement(ScaledSystem system, InverseBounds bounds) {
    this.system = system;
    this.bounds = bounds;
    residual = Residual.start(system);
    solution = new ExactAccumulator[system.size];
    Arrays.setAll(solution, i -> new ExactAccumulator());
    leading = new double[system.size];
  }

  /** Refines until the bound is far below what is asked of a reference, or no longer shrinks. */
  static BoundedSolution run(
      ScaledSystem system, ApproximateInverse inverse, InverseBounds bounds) {
    Refinement refinement = new Refinement(system, bounds);
    double last = Double.POSITIVE_INFINITY;
    for (int step = 0; step < LARGEST_STEPS; step++) {
      double[][] rounded = Residual.parts(refinement.residual, inverse.parts());
      double error = refinement.error(rounded[0]);
      if (error <= AIM || (step > 1 && !(error < SLOWEST * last))) {
        break;
      }
      last = error;
      double[][] correction = inverse.times(rounded);
      if (!isFinite(correction)) {
        break;
      }
      refinement.add(correction);
    }
    BoundedSolution result = refinement.bounded();
    return BoundedSolution.exactNear(system, result).orElse(result);
  }

  private void add(double[][] correction) {
    for (double[] part : correction) {
      Residual.subtract(system, residual, part);
      for (int i = 0; i < part.length; i++) {
        solution[i].add(part[i]);
        leading[i] += part[i];
      }
    }
  }

  // An estimate, to tell when to stop; infinite as long as x̃ is zero.
  private double error(double[] residualRounded) {
    double[] radii = bounds.upper(Arrays.stream(residualRounded).map(Math::abs).toArray());
    double largest = 0;
    double norm = 0;
    for (int i = 0; i < radii.length; i++) {
      double weight = Math.scalb(1.0, system.columnShift[i]);
      largest = Math.max(largest, radii[i] * weight);
      norm = Math.max(norm, Math.abs(leading[i]) * weight);
    }
    return norm == 0 ? Double.POSITIVE_INFINITY : largest / norm;
  }

  private BoundedSolution bounded() {
    return BoundedSolution.of(system, bounds, Residual.values(solution), Residual.values(residual));
  }

  private static boolean isFinite(double[][] correction) {
    return Arrays.stream(correction).flatMapToDouble(Arrays::stream).allMatch(Double::isFinite);
  }
}
