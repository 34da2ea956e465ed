package steelyard.problems.published;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import steelyard.problems.exact.Binary64;
import steelyard.problems.solve.PublishedMatrices;

/** Condition numbers in the Euclidean norm, and eigenvalues. */
final class SpectrumFigures implements Figure.Source {
  private static final Pattern CONDITION = Pattern.compile("lin\\.(\\w+)\\.kappa2");
  private static final Pattern STORED = Pattern.compile("lin\\.hilbert(\\d+)\\.kappa2\\.bin64");
  private static final Pattern KAHAN =
      Pattern.compile("lin\\.kahan(\\d+)\\.theta(\\d\\.\\d)\\.kappa2");
  private static final Pattern EIGENVALUE = Pattern.compile("lin\\.wilson\\.eig([1-4])");

  @Override
  public Optional<Figure> figure(String id) {
    Matcher condition = CONDITION.matcher(id);
    if (condition.matches()) {
      return Optional.of(condition(PublishedMatrices.named(condition.group(1)).entries()));
    }
    Matcher stored = STORED.matcher(id);
    if (stored.matches()) {
      return Optional.of(condition(reciprocals(Integer.parseInt(stored.group(1)))));
    }
    Matcher kahan = KAHAN.matcher(id);
    if (kahan.matches()) {
      return Optional.of(
          kahan(Integer.parseInt(kahan.group(1)), Double.parseDouble(kahan.group(2))));
    }
    Matcher eigenvalue = EIGENVALUE.matcher(id);
    return eigenvalue.matches()
        ? Optional.of(wilson(Integer.parseInt(eigenvalue.group(1))))
        : Optional.empty();
  }

  private static Figure condition(double[][] a) {
    SingularValues values = SingularValues.of(a);
    return new Figure(
        values.largest().divide(values.smallest(), Figure.DIGITS), SingularValues.ACCURACY);
  }

  private static double[][] reciprocals(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = 1.0 / (i + j + 1);
      }
    }
    return a;
  }

  // The published value is that of the real matrix, whose stored entries are off by at most 3nu
  // each: s and c by 2u, and every product by u. That changes either singular value by no more than
  // the norm of the change, which is at most 3nu sqrt(n) times the largest.
  private static Figure kahan(int n, double theta) {
    double s = StrictMath.sin(theta);
    double c = StrictMath.cos(theta);
    double[][] a = new double[n][n];
    double scale = 1;
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        a[i][j] = i == j ? scale : -c * scale;
      }
      scale *= s;
    }
    BigDecimal stored = condition(a).value();
    double change = 3.0 * n * Binary64.UNIT_ROUNDOFF * Math.sqrt(n);
    double allowed = 2 * change * (1 + stored.doubleValue());
    return new Figure(stored, new BigDecimal(allowed));
  }

  // The matrix is symmetric positive definite with trace 35 and determinant 1: the outer
  // eigenvalues are singular values, the inner ones have what is left as their sum and product.
  private static Figure wilson(int which) {
    SingularValues values = SingularValues.of(PublishedMatrices.named("wilson").entries());
    BigDecimal outer = values.smallest().add(values.largest());
    BigDecimal half = BigDecimal.valueOf(35).subtract(outer).divide(BigDecimal.valueOf(2));
    BigDecimal product =
        BigDecimal.ONE.divide(values.smallest().multiply(values.largest()), Figure.DIGITS);
    BigDecimal spread = half.multiply(half).subtract(product).sqrt(Figure.DIGITS);
    BigDecimal value =
        switch (which) {
          case 1 -> values.smallest();
          case 2 -> half.subtract(spread);
          case 3 -> half.add(spread);
          default -> values.largest();
        };
    // The inner ones inherit the absolute errors of the outer ones.
    return new Figure(value, SingularValues.ACCURACY.multiply(BigDecimal.valueOf(100)));
  }
}
