package steelyard.algorithms.dot;

/**
 * A chain of fused multiply-adds: each product is added without having been rounded.
 *
 * @see "IEEE Standard for Floating-Point Arithmetic, IEEE 754-2019, section 5.4.1
 *     (fusedMultiplyAdd)"
 */
final class FmaDot implements DotProduct {

  @Override
  public double dot(double[] x, double[] y) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum = Math.fma(x[i], y[i], sum);
    }
    return sum;
  }
}
