package steelyard.algorithms.solve;

import java.util.Arrays;

/** What comes of a call that need not have a good answer. */
enum Outcome {
  /** An ArithmeticException. */
  DECLINES,
  /** An answer with a NaN or an infinity in it. */
  NOT_FINITE,
  /** An answer that looks like any other. */
  FINITE;

  static Outcome of(LinearSolver solver, double[][] a, double[] b) {
    try {
      return Arrays.stream(solver.solve(a, b)).allMatch(Double::isFinite) ? FINITE : NOT_FINITE;
    } catch (ArithmeticException declined) {
      return DECLINES;
    }
  }
}
