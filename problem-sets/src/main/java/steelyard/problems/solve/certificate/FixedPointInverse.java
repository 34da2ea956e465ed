package steelyard.problems.solve.certificate;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;

/**
 * An approximate inverse in fixed-point arithmetic with p fraction bits. I - R A is computed
 * exactly, as integers, so that its row sums need no error analysis; only their conversion to
 * double is rounded, upwards.
 */
final class FixedPointInverse implements ApproximateInverse {

  // Parts of a product: three doubles hold 159 bits, enough for one step of the refinement.
  private static final int PARTS = 3;

  private final int size;
  private final int fractionBits;
  private final IntegerMatrix matrix;
  private final BigInteger[] inverse;

  FixedPointInverse(int fractionBits, ScaledSystem system, BigInteger[] inverse) {
    size = system.size;
    this.fractionBits = fractionBits;
    matrix = IntegerMatrix.of(system.size, system.matrix);
    this.inverse = inverse;
  }

  /**
   * The route that makes it.
   *
   * @param fractionBits p
   */
  record FixedPointRoute(int fractionBits) implements Route {
    @Override
    public String name() {
      return "multiprecision-" + fractionBits;
    }

    @Override
    public Optional<ApproximateInverse> invert(ScaledSystem system) {
      BigInteger[] inverse = new BigInteger[system.matrix.length];
      for (int i = 0; i < inverse.length; i++) {
        Dyadic entry = Dyadic.of(system.matrix[i]).scalb(fractionBits);
        inverse[i] = shifted(entry.significand(), entry.exponent());
      }
      return GaussJordan.invert(new FixedPointRows(system.size, fractionBits, inverse))
          ? Optional.of(new FixedPointInverse(fractionBits, system, inverse))
          : Optional.empty();
    }
  }

  @Override
  public double[] residualRowSums() {
    double[] bounds = new double[size];
    int shift = matrix.exponent() - fractionBits;
    BigInteger one = BigInteger.ONE.shiftLeft(-shift);
    for (int i = 0; i < size; i++) {
      BigInteger[] product = new BigInteger[size];
      Arrays.fill(product, BigInteger.ZERO);
      product[i] = one.negate();
      for (int k = 0; k < size; k++) {
        BigInteger r = inverse[i * size + k];
        for (int j = 0; j < size; j++) {
          BigInteger a = matrix.entries()[k * size + j];
          if (a.signum() != 0) {
            product[j] = product[j].add(r.multiply(a));
          }
        }
      }
      BigInteger sum = BigInteger.ZERO;
      for (BigInteger entry : product) {
        sum = sum.add(entry.abs());
      }
      bounds[i] = Math.nextUp(new Dyadic(sum, shift).doubleValue());
    }
    return bounds;
  }

  @Override
  public double[] magnitudes() {
    double[] magnitudes = new double[inverse.length];
    for (int i = 0; i < inverse.length; i++) {
      magnitudes[i] = FixedPointRows.magnitude(inverse[i], fractionBits);
    }
    return magnitudes;
  }

  @Override
  public int parts() {
    return PARTS;
  }

  @Override
  public double[][] times(double[][] parts) {
    Dyadic[] v = new Dyadic[size];
    for (int j = 0; j < size; j++) {
      v[j] = Dyadic.ZERO;
      for (double[] part : parts) {
        v[j] = v[j].add(Dyadic.of(part[j]));
      }
    }
    int exponent = Integer.MAX_VALUE;
    for (Dyadic entry : v) {
      exponent = entry.signum() == 0 ? exponent : Math.min(exponent, entry.exponent());
    }
    double[][] product = new double[PARTS][size];
    for (int i = 0; i < size; i++) {
      BigInteger sum = BigInteger.ZERO;
      for (int j = 0; j < size; j++) {
        if (v[j].signum() != 0) {
          BigInteger factor = v[j].significand().shiftLeft(v[j].exponent() - exponent);
          sum = sum.add(inverse[i * size + j].multiply(factor));
        }
      }
      Dyadic rest = new Dyadic(sum, exponent - fractionBits);
      for (int part = 0; part < PARTS; part++) {
        product[part][i] = rest.doubleValue();
        rest =
            Double.isFinite(product[part][i])
                ? rest.subtract(Dyadic.of(product[part][i]))
                : Dyadic.ZERO;
      }
    }
    return product;
  }

  private static BigInteger shifted(BigInteger value, int shift) {
    return shift >= 0 ? value.shiftLeft(shift) : value.shiftRight(-shift);
  }
}
