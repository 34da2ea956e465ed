package steelyard.algorithms.sum;

import java.math.BigDecimal;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.stat.StatUtils;
import org.apache.commons.numbers.core.Sum;

/** Sums as the class library and other libraries offer them. */
final class LibrarySums {

  private LibrarySums() {}

  static double jdkStream(double[] terms) {
    return DoubleStream.of(terms).sum();
  }

  /**
   * The terms are split among the cores, so that the order of additions depends on their number.
   */
  static double jdkParallelStream(double[] terms) {
    return DoubleStream.of(terms).parallel().sum();
  }

  /** A BigDecimal holds no infinity and no NaN: terms with one of those are summed recursively. */
  static double bigDecimal(double[] terms) {
    BigDecimal sum = BigDecimal.ZERO;
    for (double term : terms) {
      if (!Double.isFinite(term)) {
        return RecursiveSum.of(terms);
      }
      sum = sum.add(new BigDecimal(term));
    }
    return sum.doubleValue();
  }

  static double commonsNumbers(double[] terms) {
    return Sum.of(terms).getAsDouble();
  }

  static double commonsMath(double[] terms) {
    return StatUtils.sum(terms);
  }
}
