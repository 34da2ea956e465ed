package steelyard.problems.solve.certificate;

import java.util.Optional;

/**
 * An approximate inverse in double.
 *
 * <p>With u = 2^-53 and &gamma;_n = n u/(1 - n u), the computed product satisfies |fl(R A) - R A|
 * &lt;= &gamma;_n |R| |A| + n 2^-1074 in any order of summation (Higham, Accuracy and Stability of
 * Numerical Algorithms, 2nd ed., SIAM 2002, section 3.1 for &gamma;_n and section 3.5 for matrix
 * products; the last term is for products that underflow, each of which is wrong by at most
 * 2^-1075, while additions never underflow inexactly). A row sum of |I - R A| is therefore at most
 * that of |I - fl(R A)| + &gamma;_n |R| |A|, plus n² 2^-1074. All three are sums of nonnegative
 * numbers, evaluated in double and enlarged by {@link Allowances#inflation}, which covers the
 * roundings of their evaluation, and by n² 2^-1022 for every underflow.
 */
final class DoubleInverse implements ApproximateInverse {
  private final int size;
  private final ScaledSystem system;
  private final double[][] inverse;

  private final Allowances allowances;

  DoubleInverse(ScaledSystem system, double[][] inverse, Allowances allowances) {
    this.allowances = allowances;
    size = system.size;
    this.system = system;
    this.inverse = inverse;
  }

  /** The route that makes it. */
  static final class DoubleRoute implements Route {
    @Override
    public String name() {
      return "double";
    }

    @Override
    public Optional<ApproximateInverse> invert(ScaledSystem system) {
      double[][] inverse = system.rows();
      return GaussJordan.invert(new DoubleRows(inverse))
          ? Optional.of(new DoubleInverse(system, inverse, Allowances.PROVEN))
          : Optional.empty();
    }
  }

  @Override
  public double[] residualRowSums() {
    double[] rowSums = system.absoluteRowSums();
    double[][] product = new double[size][size];
    ProductRows.multiply(inverse, system.rows(), product);
    double[] bounds = new double[size];
    for (int i = 0; i < size; i++) {
      double magnitude = 0;
      for (int k = 0; k < size; k++) {
        magnitude += Math.abs(inverse[i][k]) * rowSums[k];
      }
      product[i][i] -= 1;
      double distance = 0;
      for (double entry : product[i]) {
        distance += Math.abs(entry);
      }
      bounds[i] =
          (distance + allowances.gamma(size) * magnitude) * allowances.inflation(size)
              + (double) size * size * allowances.underflow();
      bounds[i] = Math.nextUp(bounds[i]);
    }
    return bounds;
  }

  @Override
  public double[] magnitudes() {
    double[] magnitudes = new double[size * size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        magnitudes[i * size + j] = Math.abs(inverse[i][j]);
      }
    }
    return magnitudes;
  }

  @Override
  public int parts() {
    return 1;
  }

  @Override
  public double[][] times(double[][] v) {
    double[] product = new double[size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        product[i] += inverse[i][j] * v[0][j];
      }
    }
    return new double[][] {product};
  }
}
