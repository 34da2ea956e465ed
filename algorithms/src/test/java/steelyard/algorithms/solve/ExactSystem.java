package steelyard.algorithms.solve;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;

/**
 * A system of linear equations in exact arithmetic: judges a computed solution without a rounding
 * until the last division.
 */
final class ExactSystem {

  private static final MathContext DIGITS = MathContext.DECIMAL64;

  private final double[][] a;
  private final double[] b;
  private final FractionFree solved;

  ExactSystem(double[][] a, double[] b) {
    this.a = a;
    this.b = b;
    this.solved = FractionFree.solve(a, b);
  }

  /** Returns ‖b − Ay‖ / (‖A‖‖y‖ + ‖b‖) in the ∞-norm (Rigal and Gaches 1967). */
  double backwardError(double[] y) {
    BigDecimal residual = BigDecimal.ZERO;
    for (int i = 0; i < b.length; i++) {
      residual = residual.max(residual(i, y).abs());
    }
    return quotient(residual, norm(a).multiply(norm(y)).add(norm(b)));
  }

  /** Returns max |b − Ay| / (|A||y| + |b|), 0/0 being 0 (Oettli and Prager 1964). */
  double componentwiseBackwardError(double[] y) {
    double worst = 0;
    for (int i = 0; i < b.length; i++) {
      BigDecimal size = exact(b[i]).abs();
      for (int j = 0; j < b.length; j++) {
        size = size.add(exact(a[i][j]).multiply(exact(y[j])).abs());
      }
      worst = Math.max(worst, quotient(residual(i, y).abs(), size));
    }
    return worst;
  }

  /** Returns ‖y − x‖/‖x‖ in the ∞-norm. */
  double forwardError(double[] y) {
    BigDecimal determinant = new BigDecimal(solved.determinant());
    BigDecimal error = BigDecimal.ZERO;
    BigDecimal size = BigDecimal.ZERO;
    for (int i = 0; i < b.length; i++) {
      BigDecimal numerator = new BigDecimal(solved.numerators()[i][0]);
      error = error.max(exact(y[i]).multiply(determinant).subtract(numerator).abs());
      size = size.max(numerator.abs());
    }
    return quotient(error, size);
  }

  /** Returns ‖A⁻¹‖(‖A‖‖x‖ + ‖b‖)/‖x‖ in the ∞-norm. */
  double condition() {
    BigDecimal determinant = new BigDecimal(solved.determinant().abs());
    BigDecimal inverseNorm = BigDecimal.ZERO;
    BigDecimal size = BigDecimal.ZERO;
    for (BigInteger[] row : solved.numerators()) {
      size = size.max(new BigDecimal(row[0].abs()));
      BigDecimal sum = BigDecimal.ZERO;
      for (int j = 1; j < row.length; j++) {
        sum = sum.add(new BigDecimal(row[j].abs()));
      }
      inverseNorm = inverseNorm.max(sum);
    }
    BigDecimal bOverX = norm(b).multiply(determinant).divide(size, MathContext.DECIMAL128);
    return quotient(inverseNorm.multiply(norm(a).add(bOverX)), determinant);
  }

  private BigDecimal residual(int i, double[] y) {
    BigDecimal rest = exact(b[i]);
    for (int j = 0; j < b.length; j++) {
      rest = rest.subtract(exact(a[i][j]).multiply(exact(y[j])));
    }
    return rest;
  }

  private static BigDecimal norm(double[][] a) {
    BigDecimal norm = BigDecimal.ZERO;
    for (double[] row : a) {
      BigDecimal sum = BigDecimal.ZERO;
      for (double entry : row) {
        sum = sum.add(exact(entry).abs());
      }
      norm = norm.max(sum);
    }
    return norm;
  }

  private static BigDecimal norm(double[] x) {
    BigDecimal norm = BigDecimal.ZERO;
    for (double entry : x) {
      norm = norm.max(exact(entry).abs());
    }
    return norm;
  }

  private static BigDecimal exact(double value) {
    return new BigDecimal(value);
  }

  private static double quotient(BigDecimal numerator, BigDecimal denominator) {
    if (numerator.signum() == 0) {
      return 0;
    }
    return denominator.signum() == 0
        ? Double.POSITIVE_INFINITY
        : numerator.divide(denominator, DIGITS).doubleValue();
  }
}
