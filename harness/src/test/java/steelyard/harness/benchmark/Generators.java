package steelyard.harness.benchmark;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import java.util.function.Supplier;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import steelyard.problems.Family;
import steelyard.problems.dot.DotFamilies;
import steelyard.problems.dot.Vectors;
import steelyard.problems.solve.ReflectedDiagonal;

/** The making of problems. */
final class Generators {
  private static final double CONDITION = 1e30;
  private static final int SIZE = 1000;
  private static final int LEVELS = 64;

  private Generators() {}

  /** A matrix with given singular values from two reflectors; the argument is n. */
  static Supplier<?> reflected(String[] words) {
    int n = Integer.parseInt(words[1]);
    double[] values = new double[n];
    for (int i = 0; i < n; i++) {
      values[i] = StrictMath.pow(1e10, -i / (n - 1.0));
    }
    UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(6L);
    return () -> ReflectedDiagonal.draw(n, random).around(values);
  }

  /** Calibrated cancelling vectors with their exact dot product. */
  static Supplier<?> dot(String[] words) {
    Family<Vectors> family = Families.named("cancelling", DotFamilies.all());
    UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(7L);
    return () -> family.generate(new Family.Request(CONDITION, SIZE), random);
  }

  /** The same construction with partial sums in BigDecimal, and without the shuffling. */
  static Supplier<?> dotByBigDecimal(String[] words) {
    Random random = new Random(7);
    return () -> {
      double[] x = new double[SIZE];
      double[] y = new double[SIZE];
      BigDecimal sum = BigDecimal.ZERO;
      BigDecimal absolute = BigDecimal.ZERO;
      int bits = (int) (StrictMath.log(CONDITION) / StrictMath.log(2));
      for (int i = 0; i < SIZE; i++) {
        int level = Math.max(0, i - SIZE + LEVELS);
        int exponent = level == 0 ? -random.nextInt(bits) : -bits * level / LEVELS;
        x[i] = Math.scalb(random.nextDouble() + 1, exponent / 2);
        y[i] = Math.scalb(random.nextDouble() - 0.5, exponent - exponent / 2);
        if (level > 0) {
          BigDecimal wanted = new BigDecimal(y[i]).multiply(new BigDecimal(x[i])).subtract(sum);
          y[i] = wanted.divide(new BigDecimal(x[i]), MathContext.DECIMAL64).doubleValue();
        }
        BigDecimal product = new BigDecimal(x[i]).multiply(new BigDecimal(y[i]));
        sum = sum.add(product);
        absolute = absolute.add(product.abs());
      }
      return absolute.divide(sum.abs(), MathContext.DECIMAL64);
    };
  }
}
