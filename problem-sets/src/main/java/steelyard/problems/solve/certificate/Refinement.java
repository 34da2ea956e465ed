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

  private Refinement(ScaledSystem system, InverseBounds bounds) {
    this.system = system;
    this.bounds = bounds;
    residual = Residual.start(system);
    solution = new ExactAccumulator[system.size];
    Arrays.setAll(solution, i -> new ExactAccumulator());
  }

  /** Refines until the bound is far below what is asked of a reference, or no longer shrinks. */
  static BoundedSolution run(
      ScaledSystem system, ApproximateInverse inverse, InverseBounds bounds) {
    Refinement refinement = new Refinement(system, bounds);
    BoundedSolution best = refinement.current();
    for (int step = 0; step < LARGEST_STEPS && !(best.relativeBound() <= AIM); step++) {
      double[][] correction = inverse.times(Residual.values(refinement.residual));
      if (!isFinite(correction)) {
        break;
      }
      refinement.add(correction);
      BoundedSolution next = refinement.current();
      if (step > 0 && !(next.relativeBound() < SLOWEST * best.relativeBound())) {
        break;
      }
      best = next;
    }
    return BoundedSolution.exactNear(system, best).orElse(best);
  }

  private void add(double[][] correction) {
    for (double[] part : correction) {
      Residual.subtract(system, residual, part);
      for (int i = 0; i < part.length; i++) {
        solution[i].add(part[i]);
      }
    }
  }

  private BoundedSolution current() {
    return BoundedSolution.of(system, bounds, Residual.values(solution), Residual.values(residual));
  }

  private static boolean isFinite(double[][] correction) {
    return Arrays.stream(correction).flatMapToDouble(Arrays::stream).allMatch(Double::isFinite);
  }
}
