package steelyard.problems.solve.certificate;

import java.util.Arrays;
import java.util.Optional;
import steelyard.problems.exact.ErrorFree;

/**
 * An approximate inverse R = H + L in double-double, where |L| &lt;= 2^-52 |H|.
 *
 * <p>The entries of R A - I are evaluated by {@link TwofoldProduct}, to whose bound each adds its
 * final rounding, of at most u times its own magnitude. With S = |I| + |H| |A|, a row sum of |I - R
 * A| is therefore at most (1 + u) times that of the computed entries plus &gamma;_e &gamma;_{d+4}
 * times that of S, plus 3 n² 2^-1074 for products that underflow. The bounds are evaluated in
 * double with the allowances of {@link DoubleInverse}.
 */
final class DoubleDoubleInverse implements ApproximateInverse {
  private final int size;
  private final ScaledSystem system;
  private final double[][] high;
  private final double[][] low;
  private final double[][] product;
  private final double[] residualRowSums;

  /** Makes one of two matrices, which are split anew so that |L| is at most 2^-53 |H|. */
  DoubleDoubleInverse(ScaledSystem system, double[][] high, double[][] low, Allowances allowances) {
    size = system.size;
    this.system = system;
    this.high = high;
    this.low = low;
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        double sum = high[i][j] + low[i][j];
        low[i][j] = ErrorFree.sumError(high[i][j], low[i][j]);
        high[i][j] = sum;
      }
    }
    product = new double[size][size];
    residualRowSums = multiply(allowances);
  }

  /**
   * The route that makes it: the inverse in double, multiplied from the left by the inverse in
   * double of its product with A, as often as that helps. Each time the product is better
   * conditioned, by nearly as much as double resolves, until R lacks the bits for it.
   *
   * @see "S. M. Rump, Inversion of extremely ill-conditioned matrices in floating-point, Japan
   *     Journal of Industrial and Applied Mathematics 26 (2009), 249-277"
   */
  static final class DoubleDoubleRoute implements Route {
    private static final int LARGEST_STEPS = 4;
    private static final double CLOSE_ENOUGH = 0x1p-12;

    @Override
    public String name() {
      return "double-double";
    }

    @Override
    public Optional<ApproximateInverse> invert(ScaledSystem system) {
      double[][] inverse = system.rows();
      return GaussJordan.invert(new DoubleRows(inverse))
          ? Optional.of(improved(of(system, inverse, new double[system.size][system.size])))
          : Optional.empty();
    }

    private static DoubleDoubleInverse improved(DoubleDoubleInverse first) {
      DoubleDoubleInverse best = first;
      for (int step = 0; step < LARGEST_STEPS && !(best.distance() < CLOSE_ENOUGH); step++) {
        Optional<DoubleDoubleInverse> next = best.improved();
        // The first product may be farther from I than that of any other matrix.
        if (next.isEmpty() || (step > 0 && !(next.get().distance() < best.distance()))) {
          break;
        }
        best = next.get();
      }
      return best;
    }
  }

  private static DoubleDoubleInverse of(ScaledSystem system, double[][] high, double[][] low) {
    return new DoubleDoubleInverse(system, high, low, Allowances.PROVEN);
  }

  private double distance() {
    return Arrays.stream(residualRowSums).max().orElse(0);
  }

  private Optional<DoubleDoubleInverse> improved() {
    double[][] factors = Arrays.stream(product).map(double[]::clone).toArray(double[][]::new);
    if (!GaussJordan.invert(new DoubleRows(factors))) {
      return Optional.empty();
    }
    double[][] betterHigh = new double[size][size];
    double[][] betterLow = new double[size][size];
    TwofoldProduct twofold = new TwofoldProduct(size);
    for (int i = 0; i < size; i++) {
      TwofoldRow row = twofold.row(factors[i], high, low);
      for (int j = 0; j < size; j++) {
        betterHigh[i][j] = row.rounded(j);
        betterLow[i][j] = row.rest(j);
      }
    }
    return Optional.of(of(system, betterHigh, betterLow));
  }

  @Override
  public double[] residualRowSums() {
    return residualRowSums.clone();
  }

  // Stores R A, and returns the bounds on the row sums of |I - R A|.
  private double[] multiply(Allowances allowances) {
    double[][] matrix = system.rows();
    double[] rowSums = system.absoluteRowSums();
    TwofoldProduct twofold = new TwofoldProduct(size);
    double rounding =
        allowances.gamma(TwofoldProduct.sums(size) + 4)
            * allowances.gamma(TwofoldProduct.corrections(size));
    double[] bounds = new double[size];
    for (int i = 0; i < size; i++) {
      TwofoldRow row = twofold.row(i, -1, high[i], low[i], matrix);
      double magnitude = 1;
      double distance = 0;
      for (int j = 0; j < size; j++) {
        magnitude += Math.abs(high[i][j]) * rowSums[j];
        product[i][j] = row.rounded(j);
        distance += Math.abs(product[i][j]);
      }
      product[i][i] += 1;
      bounds[i] =
          (distance + rounding * magnitude) * allowances.inflation(size)
              + 3.0 * size * size * allowances.underflow();
      bounds[i] = Math.nextUp(bounds[i]);
    }
    return bounds;
  }

  @Override
  public double[] magnitudes() {
    double[] magnitudes = new double[size * size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        magnitudes[i * size + j] = Math.abs(high[i][j]);
      }
    }
    return magnitudes;
  }

  @Override
  public int parts() {
    return 2;
  }

  @Override
  public double[][] times(double[][] v) {
    double[][] result = new double[2][size];
    for (int i = 0; i < size; i++) {
      DoubleDouble sum = DoubleDouble.of(0);
      for (int j = 0; j < size; j++) {
        sum =
            sum.plus(
                new DoubleDouble(high[i][j], low[i][j]).times(new DoubleDouble(v[0][j], v[1][j])));
      }
      result[0][i] = sum.high();
      result[1][i] = sum.low();
    }
    return result;
  }
}
