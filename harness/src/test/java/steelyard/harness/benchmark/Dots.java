package steelyard.harness.benchmark;

import java.math.BigDecimal;
import java.util.function.Supplier;
import steelyard.problems.exact.ExactAccumulator;

/** Dot products: arguments are the spread of the exponents and n. */
final class Dots {
  private Dots() {}

  static Supplier<?> naive(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    double[] y = Vectors.random(words[1], words[2], 2);
    return () -> {
      double sum = 0;
      for (int i = 0; i < x.length; i++) {
        sum += x[i] * y[i];
      }
      return sum;
    };
  }

  static Supplier<?> exact(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    double[] y = Vectors.random(words[1], words[2], 2);
    return () -> ExactAccumulator.dot(x, y);
  }

  static Supplier<?> bigDecimal(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    double[] y = Vectors.random(words[1], words[2], 2);
    return () -> {
      BigDecimal sum = BigDecimal.ZERO;
      for (int i = 0; i < x.length; i++) {
        sum = sum.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])));
      }
      return sum;
    };
  }
}
