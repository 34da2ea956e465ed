package steelyard.algorithms.dot;

import steelyard.algorithms.exact.ErrorFree;

/**
 * The recursive inner product in double-double arithmetic: exact products as unevaluated sums of
 * two doubles, added to an accumulator of the same kind that is renormalised after each.
 *
 * @see <a href="https://doi.org/10.1007/BF01397083">Dekker, A floating-point technique for
 *     extending the available precision, Numer. Math. 18 (1971) 224-242</a>
 * @see <a href="https://doi.org/10.1145/3121432">Joldes, Muller, Popescu, Tight and rigorous error
 *     bounds for basic building blocks of double-word arithmetic, ACM TOMS 44 (2017) 15, Algorithm
 *     6 (relative error at most 3u^2/(1-4u) per addition)</a>
 */
final class DoubleDoubleDot implements DotProduct {

  @Override
  public double dot(double[] x, double[] y) {
    double high = 0;
    double low = 0;
    for (int i = 0; i < x.length; i++) {
      double product = x[i] * y[i];
      double productLow = ErrorFree.ofProduct(x[i], y[i], product);
      double sum = high + product;
      double sumError = ErrorFree.ofSum(high, product, sum);
      double rest = low + productLow;
      double restError = ErrorFree.ofSum(low, productLow, rest);
      double middle = sumError + rest;
      double partial = sum + middle;
      double tail = restError + ErrorFree.ofOrderedSum(sum, middle, partial);
      high = partial + tail;
      low = ErrorFree.ofOrderedSum(partial, tail, high);
    }
    return RecursiveDot.unlessFinite(high, x, y);
  }
}
