package steelyard.problems.published;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.solve.certificate.CertifiedSolver;

/**
 * The extreme singular values of a matrix, by power iteration with exact products and certified
 * solutions. The vectors are rounded to doubles, but the quotient ||A v|| / ||v|| of a rounded
 * vector is not: at a singular vector it is stationary, so that vectors with errors of 1e-16 give
 * it to about 1e-31.
 *
 * @param smallest the smallest
 * @param largest the largest
 */
record SingularValues(BigDecimal smallest, BigDecimal largest) {

  /** An upper bound on their relative errors, once the iteration has settled. */
  static final BigDecimal ACCURACY = new BigDecimal("1e-28");

  private static final BigDecimal SETTLED = new BigDecimal("1e-30");
  private static final int MOST_STEPS = 400;

  /** A linear map, with results far more accurate than a double. */
  @FunctionalInterface
  private interface Map {
    List<Dyadic> apply(double[] v);
  }

  /** The largest stretch that a map gives, and the vector that it stretches so. */
  private record Settled(BigDecimal stretch, double[] vector) {}

  static SingularValues of(double[][] a) {
    double[][] transposed = new double[a.length][a.length];
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < a.length; j++) {
        transposed[j][i] = a[i][j];
      }
    }
    double[] start = new double[a.length];
    Arrays.setAll(start, i -> 1 + 1.0 / (i + 2));
    Settled inverse = settle(start, v -> solve(a, v), v -> solve(transposed, v));
    // Where the one vector alternates in sign the other often does not, and the reverse.
    double[] alternating = inverse.vector.clone();
    for (int i = 0; i < alternating.length; i += 2) {
      alternating[i] = -alternating[i];
    }
    Settled direct = settle(alternating, v -> multiply(a, v), v -> multiply(transposed, v));
    return new SingularValues(
        BigDecimal.ONE.divide(inverse.stretch, Figure.DIGITS), direct.stretch);
  }

  private static Settled settle(double[] start, Map forth, Map back) {
    double[] v = start;
    BigDecimal stretch = BigDecimal.ZERO;
    for (int step = 0; step < MOST_STEPS; step++) {
      List<Dyadic> image = forth.apply(v);
      BigDecimal squared = Figure.ratio(square(image), ExactAccumulator.dot(v, v));
      BigDecimal next = squared.sqrt(Figure.DIGITS);
      if (next.subtract(stretch).abs().compareTo(next.multiply(SETTLED)) <= 0) {
        return new Settled(next, v);
      }
      stretch = next;
      v = rounded(back.apply(rounded(image)));
    }
    throw new AssertionError("the iteration did not settle: " + stretch);
  }

  private static List<Dyadic> multiply(double[][] a, double[] v) {
    return Arrays.stream(a).map(row -> ExactAccumulator.dot(row, v)).toList();
  }

  private static List<Dyadic> solve(double[][] a, double[] v) {
    return CertifiedSolver.solve(a, v).values();
  }

  private static Dyadic square(List<Dyadic> v) {
    return v.stream().map(x -> x.multiply(x)).reduce(Dyadic.ZERO, Dyadic::add);
  }

  // In units of about the largest entry.
  private static double[] rounded(List<Dyadic> v) {
    int unit =
        v.stream()
            .filter(x -> x.signum() != 0)
            .mapToInt(x -> x.exponent() + x.significand().bitLength())
            .max()
            .orElseThrow();
    return v.stream().mapToDouble(x -> x.scalb(-unit).doubleValue()).toArray();
  }
}
