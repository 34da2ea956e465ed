package steelyard.problems.solve.certificate;

import java.math.BigInteger;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.rational.PadicLifting;
import steelyard.problems.solve.rational.RationalVector;

/**
 * The last resort: the solution and every column of the inverse in rational numbers. For {@link
 * InverseBounds} this is an inverse with I - R A = 0 of which the entries were rounded once. It
 * fails only where a condition number is beyond the range of double.
 */
final class RationalCertificate {

  // It takes n + 1 exact solutions, each of the order of n³ operations on integers.
  static final int LARGEST_SIZE = 200;

  private static final int BITS_PER_ENTRY = 256;

  private RationalCertificate() {}

  static Optional<CertifiedSolution> attempt(ScaledSystem system, PadicLifting lifting) {
    InverseBounds bounds =
        new InverseBounds(
            magnitudes(system.size, lifting), new double[system.size], Allowances.PROVEN);
    BoundedSolution solution = bounded(system, lifting.solve(system.rightHandSide));
    return Certificate.of("rational", system, bounds, solution);
  }

  private static double[] magnitudes(int n, PadicLifting lifting) {
    double[] magnitudes = new double[n * n];
    for (int j = 0; j < n; j++) {
      double[] unit = new double[n];
      unit[j] = 1;
      RationalVector column = lifting.solve(unit);
      for (int i = 0; i < n; i++) {
        magnitudes[i * n + j] = Math.abs(column.nearest(i));
      }
    }
    return magnitudes;
  }

  private static BoundedSolution bounded(ScaledSystem system, RationalVector x) {
    Dyadic[] values = new Dyadic[x.size()];
    double[] radii = new double[x.size()];
    for (int i = 0; i < values.length; i++) {
      BigInteger numerator = x.numerators()[i];
      int exponent = numerator.bitLength() - x.denominator().bitLength() - BITS_PER_ENTRY;
      values[i] = x.floor(i, exponent);
      boolean exact =
          values[i].multiply(new Dyadic(x.denominator(), 0)).equals(new Dyadic(numerator, 0));
      radii[i] = exact ? 0 : Math.max(Math.scalb(1.0, exponent), Double.MIN_VALUE);
    }
    return BoundedSolution.of(system, values, radii);
  }
}
