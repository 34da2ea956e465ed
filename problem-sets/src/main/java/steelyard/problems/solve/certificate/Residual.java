package steelyard.problems.solve.certificate;

import java.util.Arrays;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;

/** The residual b - A x̃ of a scaled system, exactly, one accumulator per row. */
final class Residual {
  private Residual() {}

  /** Returns the residual of x̃ = 0. */
  static ExactAccumulator[] start(ScaledSystem system) {
    ExactAccumulator[] residual = new ExactAccumulator[system.size];
    for (int i = 0; i < system.size; i++) {
      residual[i] = new ExactAccumulator();
      residual[i].add(system.rightHandSide[i]);
    }
    return residual;
  }

  /** Takes into account that a vector was added to x̃. */
  static void subtract(ScaledSystem system, ExactAccumulator[] residual, double[] added) {
    double[] negative = Arrays.stream(added).map(entry -> -entry).toArray();
    double[] row = new double[system.size];
    for (int i = 0; i < system.size; i++) {
      System.arraycopy(system.matrix, i * system.size, row, 0, system.size);
      residual[i].addProducts(row, negative);
    }
  }

  /** Returns the numbers that the accumulators hold. */
  static Dyadic[] values(ExactAccumulator[] accumulators) {
    return Arrays.stream(accumulators).map(ExactAccumulator::value).toArray(Dyadic[]::new);
  }

  /**
   * Returns the numbers that the accumulators hold, rounded to unevaluated sums of doubles.
   *
   * @param count how many doubles each; the last may underflow
   */
  static double[][] parts(ExactAccumulator[] accumulators, int count) {
    double[][] parts = new double[count][accumulators.length];
    for (int i = 0; i < accumulators.length; i++) {
      for (int part = 0; part < count; part++) {
        parts[part][i] = accumulators[i].round();
        if (part < count - 1) {
          accumulators[i].add(-parts[part][i]);
        }
      }
      for (int part = 0; part < count - 1; part++) {
        accumulators[i].add(parts[part][i]);
      }
    }
    return parts;
  }

  /** Returns whether x̃ solves the system exactly. */
  static boolean isZero(ScaledSystem system, Dyadic[] x) {
    ExactAccumulator[] residual = start(system);
    Dyadic[] rest = x.clone();
    boolean left = true;
    while (left) {
      double[] part = new double[rest.length];
      left = false;
      for (int i = 0; i < part.length; i++) {
        part[i] = rest[i].doubleValue();
        if (!Double.isFinite(part[i]) || (part[i] == 0 && rest[i].signum() != 0)) {
          return false;
        }
        rest[i] = rest[i].subtract(Dyadic.of(part[i]));
        left |= rest[i].signum() != 0;
      }
      subtract(system, residual, part);
    }
    return Arrays.stream(residual).allMatch(r -> r.value().signum() == 0);
  }
}
