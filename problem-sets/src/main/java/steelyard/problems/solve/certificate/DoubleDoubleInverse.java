package steelyard.problems.solve.certificate;

import java.util.Arrays;
import java.util.Optional;
import steelyard.problems.exact.ErrorFree;

/**
 * An approximate inverse R = H + L in double-double, where |L| &lt;= 2^-52 |H|.
 *
 * <p>An entry of I - R A is a dot product of m = 2n + 1 products of doubles, evaluated with
 * compensation (Ogita, Rump and Oishi, Accurate sum and dot product, SIAM J. Sci. Comput. 26
 * (2005), 1955-1988, Algorithm Dot2): each product and each sum is split without error into its
 * rounded value and its rounding error, and the errors are summed in double. With S = |I| + (|H| +
 * |L|) |A|:
 *
 * <ul>
 *   <li>the errors of the products amount to at most u S, those of the running sums to at most
 *       &gamma;_{m-1} (1 + u) S, so that the sum of the errors is itself computed with an error of
 *       at most &gamma;_{2m} (u + &gamma;_{m-1} (1 + u)) S &lt;= &gamma;_{2m}² S;
 *   <li>adding it to the rounded sum costs at most u times the magnitude of the result.
 * </ul>
 *
 * <p>Hence a row sum of |I - R A| is at most (1 + u) times that of the computed results plus
 * &gamma;_{2m}² times that of S; |I| + (1 + 2^-51) |H| |A| is used for S. The error of a product
 * that underflows is lost by at most 2^-1074, so that n m 2^-1074 is added. The bounds are
 * evaluated in double with the allowances of {@link DoubleInverse}.
 */
final class DoubleDoubleInverse implements ApproximateInverse {
  private final int size;
  private final ScaledSystem system;
  private final double[] high;
  private final double[] low;
  private final Allowances allowances;

  /** Makes one of two matrices, which are split anew so that |L| is at most 2^-53 |H|. */
  DoubleDoubleInverse(ScaledSystem system, double[] high, double[] low, Allowances allowances) {
    this.allowances = allowances;
    size = system.size;
    this.system = system;
    this.high = high;
    this.low = low;
    for (int i = 0; i < high.length; i++) {
      double sum = high[i] + low[i];
      low[i] = ErrorFree.sumError(high[i], low[i]);
      high[i] = sum;
    }
  }

  /** The route that makes it. */
  static final class DoubleDoubleRoute implements Route {
    @Override
    public String name() {
      return "double-double";
    }

    @Override
    public Optional<ApproximateInverse> invert(ScaledSystem system) {
      double[] high = system.matrix.clone();
      double[] low = new double[high.length];
      return GaussJordan.invert(new DoubleDoubleRows(system.size, high, low))
          ? Optional.of(new DoubleDoubleInverse(system, high, low, Allowances.PROVEN))
          : Optional.empty();
    }
  }

  @Override
  public double[] residualRowSums() {
    double[] rowSums = system.absoluteRowSums();
    double[] sum = new double[size];
    double[] errors = new double[size];
    double[] bounds = new double[size];
    double gamma = allowances.gamma(2 * (2 * size + 1));
    for (int i = 0; i < size; i++) {
      Arrays.fill(sum, 0);
      Arrays.fill(errors, 0);
      sum[i] = -1;
      double magnitude = 1;
      for (int k = 0; k < size; k++) {
        magnitude += Math.abs(high[i * size + k]) * rowSums[k];
        accumulate(high[i * size + k], k * size, sum, errors);
        accumulate(low[i * size + k], k * size, sum, errors);
      }
      double distance = 0;
      for (int j = 0; j < size; j++) {
        distance += Math.abs(sum[j] + errors[j]);
      }
      bounds[i] =
          (distance + gamma * gamma * magnitude) * allowances.inflation(size)
              + 3.0 * size * size * allowances.underflow();
      bounds[i] = Math.nextUp(bounds[i]);
    }
    return bounds;
  }

  private void accumulate(double factor, int row, double[] sum, double[] errors) {
    double[] matrix = system.matrix;
    for (int j = 0; j < size; j++) {
      double x = matrix[row + j];
      double product = factor * x;
      double before = sum[j];
      double after = before + product;
      double part = after - before;
      sum[j] = after;
      errors[j] += ((before - (after - part)) + (product - part)) + Math.fma(factor, x, -product);
    }
  }

  @Override
  public double[] magnitudes() {
    double[] magnitudes = new double[high.length];
    for (int i = 0; i < high.length; i++) {
      magnitudes[i] = Math.abs(high[i]);
    }
    return magnitudes;
  }

  @Override
  public int parts() {
    return 2;
  }

  @Override
  public double[][] times(double[][] v) {
    double[][] product = new double[2][size];
    for (int i = 0; i < size; i++) {
      DoubleDouble sum = DoubleDouble.of(0);
      for (int j = 0; j < size; j++) {
        int at = i * size + j;
        sum =
            sum.plus(new DoubleDouble(high[at], low[at]).times(new DoubleDouble(v[0][j], v[1][j])));
      }
      product[0][i] = sum.high();
      product[1][i] = sum.low();
    }
    return product;
  }
}
