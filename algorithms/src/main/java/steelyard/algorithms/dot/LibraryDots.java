package steelyard.algorithms.dot;

import org.apache.commons.math3.util.MathArrays;
import org.apache.commons.numbers.core.Sum;

/** Inner products as other libraries offer them. */
final class LibraryDots {

  private LibraryDots() {}

  static double commonsNumbers(double[] x, double[] y) {
    return Sum.ofProducts(x, y).getAsDouble();
  }

  /** The library refuses empty vectors, whose inner product is 0. */
  static double commonsMath(double[] x, double[] y) {
    return x.length == 0 ? 0 : MathArrays.linearCombination(x, y);
  }
}
