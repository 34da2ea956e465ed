package steelyard.problems.solve.certificate;

import java.util.Arrays;

/**
 * A row of dot products under way, each an unevaluated sum of two doubles: what was summed, and the
 * rounding errors made in it (Ogita, Rump and Oishi, Accurate sum and dot product, SIAM J. Sci.
 * Comput. 26 (2005), 1955-1988, Algorithm Dot2). The rows of a matrix are passed apart, since loops
 * over a part of a longer array are not vectorized.
 */
final class TwofoldRow {
  private final double[] sums;
  private final double[] errors;

  TwofoldRow(int length) {
    sums = new double[length];
    errors = new double[length];
  }

  /** Makes every dot product zero. */
  void clear() {
    Arrays.fill(sums, 0);
    Arrays.fill(errors, 0);
  }

  /** Lets a dot product start from a value; it must have been zero. */
  void start(int at, double value) {
    sums[at] = value;
  }

  /**
   * Adds a factor times a row of a matrix: the product of the high part with its rounding error,
   * that of the low part as a correction.
   */
  void add(double high, double low, double[] row) {
    double[] sum = sums;
    double[] error = errors;
    for (int j = 0; j < sum.length; j++) {
      double x = row[j];
      double product = high * x;
      double correction = Math.fma(low, x, Math.fma(high, x, -product));
      double before = sum[j];
      double after = before + product;
      double part = after - before;
      sum[j] = after;
      error[j] += correction + ((before - (after - part)) + (product - part));
    }
  }

  /** Adds a factor times a row, whose entries are no larger than rounding errors. */
  void addSmall(double factor, double[] row) {
    double[] error = errors;
    for (int j = 0; j < error.length; j++) {
      error[j] = Math.fma(factor, row[j], error[j]);
    }
  }

  /** Adds the dot products of another row. */
  void add(TwofoldRow other) {
    double[] sum = sums;
    double[] error = errors;
    for (int j = 0; j < sum.length; j++) {
      double x = other.sums[j];
      double before = sum[j];
      double after = before + x;
      double part = after - before;
      sum[j] = after;
      error[j] += other.errors[j] + ((before - (after - part)) + (x - part));
    }
  }

  /** Returns a dot product, rounded. */
  double rounded(int at) {
    return sums[at] + errors[at];
  }

  /** Returns what is lost when a dot product is rounded, as far as it is known. */
  double rest(int at) {
    double rounded = sums[at] + errors[at];
    double part = rounded - sums[at];
    return (sums[at] - (rounded - part)) + (errors[at] - part);
  }
}
