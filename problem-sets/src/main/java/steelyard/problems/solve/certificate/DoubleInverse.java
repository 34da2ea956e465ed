package steelyard.problems.solve.certificate;

import java.util.Arrays;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;

/**
 * An approximate inverse in double.
 *
 * <p>With u = 2^-53 and &gamma;_n = n u/(1 - n u), the computed product satisfies |fl(R A) - R A|
 * &lt;= &gamma;_n |R| |A| + n 2^-1074 in any order of summation (Higham, Accuracy and Stability of
 * Numerical Algorithms, 2nd ed., SIAM 2002, section 3.1 for &gamma;_n and section 3.5 for matrix
 * products; the last term is for products that underflow, each of which is wrong by at most
 * 2^-1075, while additions never underflow inexactly). A row sum of |I - R A| is therefore at most
 * that of |I - fl(R A)| + &gamma;_n |R| |A|, plus n² 2^-1074. All three are sums of nonnegative
 * numbers, evaluated in double and enlarged by {@link RowSums#inflation}, which covers the
 * roundings of their evaluation, and by n² 2^-1022 for every underflow.
 */
final class DoubleInverse implements ApproximateInverse {
  private final int size;
  private final double[] matrix;
  private final double[] inverse;

  DoubleInverse(ScaledSystem system, double[] inverse) {
    size = system.size;
    matrix = system.matrix;
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
      double[] inverse = system.matrix.clone();
      return GaussJordan.invert(new DoubleRows(system.size, inverse))
          ? Optional.of(new DoubleInverse(system, inverse))
          : Optional.empty();
    }
  }

  @Override
  public int size() {
    return size;
  }

  @Override
  public double[] residualRowSums() {
    double[] rowSums = absoluteRowSums(size, matrix);
    double[] bounds = new double[size];
    double[] product = new double[size];
    for (int i = 0; i < size; i++) {
      Arrays.fill(product, 0);
      double magnitude = 0;
      for (int k = 0; k < size; k++) {
        double r = inverse[i * size + k];
        magnitude += Math.abs(r) * rowSums[k];
        int row = k * size;
        for (int j = 0; j < size; j++) {
          product[j] += r * matrix[row + j];
        }
      }
      product[i] -= 1;
      double distance = 0;
      for (double entry : product) {
        distance += Math.abs(entry);
      }
      bounds[i] =
          (distance + RowSums.gamma(size) * magnitude) * RowSums.inflation(size)
              + (double) size * size * RowSums.UNDERFLOW;
      bounds[i] = Math.nextUp(bounds[i]);
    }
    return bounds;
  }

  @Override
  public double[] magnitudes() {
    double[] magnitudes = new double[inverse.length];
    for (int i = 0; i < inverse.length; i++) {
      magnitudes[i] = Math.abs(inverse[i]);
    }
    return magnitudes;
  }

  @Override
  public double[][] times(Dyadic[] v) {
    double[] rounded = new double[size];
    double[] product = new double[size];
    for (int j = 0; j < size; j++) {
      rounded[j] = v[j].doubleValue();
    }
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        product[i] += inverse[i * size + j] * rounded[j];
      }
    }
    return new double[][] {product};
  }

  static double[] absoluteRowSums(int size, double[] entries) {
    double[] sums = new double[size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        sums[i] += Math.abs(entries[i * size + j]);
      }
    }
    return sums;
  }
}
