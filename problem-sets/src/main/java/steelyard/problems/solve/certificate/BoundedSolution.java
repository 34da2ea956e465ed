package steelyard.problems.solve.certificate;

import java.math.BigInteger;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;

/**
 * An approximate solution of a scaled system with a bound on the error of every entry.
 *
 * @param values x̃', in scaled units
 * @param radii upper bounds on |x' - x̃'|, in scaled units; all 0 where it is exact
 * @param norm the norm of x, in the units of the system before its rows and columns were scaled
 * @param relativeBound an upper bound on the error of x̃ relative to the norm of x; 0 where exact
 */
record BoundedSolution(Dyadic[] values, double[] radii, Enclosure norm, double relativeBound) {

  // Candidates for an exact solution have this many bits below the leading one of the largest
  // entry.
  private static final int EXACT_BITS = 110;

  /** Bounds the error of an approximate solution by means of its exact residual. */
  static BoundedSolution of(
      ScaledSystem system, InverseBounds bounds, Dyadic[] values, Dyadic[] residual) {
    double[] magnitudes = new double[residual.length];
    boolean exact = true;
    for (int i = 0; i < residual.length; i++) {
      exact &= residual[i].signum() == 0;
      magnitudes[i] = Math.nextUp(residual[i].abs().doubleValue());
    }
    return of(system, values, exact ? new double[residual.length] : bounds.upper(magnitudes));
  }

  /** Returns the exact solution if it has few bits and lies next to an approximate one. */
  static Optional<BoundedSolution> exactNear(ScaledSystem system, BoundedSolution near) {
    int largest = Integer.MIN_VALUE;
    for (Dyadic value : near.values) {
      if (value.signum() != 0) {
        largest = Math.max(largest, value.exponent() + value.significand().bitLength());
      }
    }
    Dyadic[] candidate = new Dyadic[near.values.length];
    for (int i = 0; i < candidate.length; i++) {
      candidate[i] = rounded(near.values[i], largest - EXACT_BITS);
      // Farther away than the solution is known to be.
      Dyadic distance = candidate[i].subtract(near.values[i]).abs();
      if (near.radii[i] < distance.doubleValue() / 2) {
        return Optional.empty();
      }
    }
    return Residual.isZero(system, candidate)
        ? Optional.of(of(system, candidate, new double[candidate.length]))
        : Optional.empty();
  }

  /** Makes one of values and upper bounds on their errors, in scaled units. */
  static BoundedSolution of(ScaledSystem system, Dyadic[] values, double[] radii) {
    double lower = 0;
    double upper = 0;
    double radius = 0;
    for (int i = 0; i < values.length; i++) {
      double weight = Math.scalb(1.0, system.columnShift[i]);
      double magnitude = values[i].abs().doubleValue();
      lower = Math.max(lower, Math.nextDown(Math.nextDown(magnitude) - radii[i]) * weight);
      upper = Math.max(upper, Math.nextUp(Math.nextUp(magnitude) + radii[i]) * weight);
      radius = Math.max(radius, radii[i] * weight);
    }
    boolean zero = radius == 0 && isZero(values);
    Enclosure norm = zero ? Enclosure.of(0) : new Enclosure(lower, upper);
    return new BoundedSolution(values, radii, norm, radius == 0 ? 0 : Math.nextUp(radius / lower));
  }

  /** Returns the enclosure of the magnitude of entry i, in scaled units. */
  Enclosure magnitude(int i) {
    if (radii[i] == 0 && values[i].signum() == 0) {
      return Enclosure.of(0);
    }
    double value = values[i].abs().doubleValue();
    return new Enclosure(
        Math.max(0, Math.nextDown(Math.nextDown(value) - radii[i])),
        Math.nextUp(Math.nextUp(value) + radii[i]));
  }

  /** Says whether the solution is zero, exactly. */
  boolean isZero() {
    return norm.upper() == 0;
  }

  private static boolean isZero(Dyadic[] values) {
    for (Dyadic value : values) {
      if (value.signum() != 0) {
        return false;
      }
    }
    return true;
  }

  private static Dyadic rounded(Dyadic value, int exponent) {
    if (value.signum() == 0 || value.exponent() >= exponent) {
      return value;
    }
    BigInteger doubled = value.significand().shiftRight(exponent - value.exponent() - 1);
    return new Dyadic(doubled.add(BigInteger.ONE).shiftRight(1), exponent);
  }
}
