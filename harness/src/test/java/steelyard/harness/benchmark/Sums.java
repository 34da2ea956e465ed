package steelyard.harness.benchmark;

import java.math.BigDecimal;
import java.util.function.Supplier;
import steelyard.problems.exact.ExactAccumulator;

/** Sums: arguments are the spread of the exponents and n. */
final class Sums {
  private Sums() {}

  static Supplier<?> naive(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    return () -> {
      double sum = 0;
      for (double term : x) {
        sum += term;
      }
      return sum;
    };
  }

  static Supplier<?> exact(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    return () -> ExactAccumulator.sum(x);
  }

  static Supplier<?> bigDecimal(String[] words) {
    double[] x = Vectors.random(words[1], words[2], 1);
    return () -> {
      BigDecimal sum = BigDecimal.ZERO;
      for (double term : x) {
        sum = sum.add(new BigDecimal(term));
      }
      return sum;
    };
  }
}
