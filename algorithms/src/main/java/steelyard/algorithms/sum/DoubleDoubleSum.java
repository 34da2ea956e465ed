package steelyard.algorithms.sum;

import steelyard.algorithms.exact.ErrorFree;

/**
 * Recursive summation in a double-double accumulator, the unevaluated sum of two doubles that is
 * renormalised after each term.
 *
 * @see <a href="https://doi.org/10.1007/BF01397083">Dekker, A floating-point technique for
 *     extending the available precision, Numer. Math. 18 (1971) 224-242</a>
 * @see <a href="https://doi.org/10.1145/3121432">Joldes, Muller, Popescu, Tight and rigorous error
 *     bounds for basic building blocks of double-word arithmetic, ACM TOMS 44 (2017) 15, Algorithm
 *     4 (relative error at most 2u^2 per addition)</a>
 */
final class DoubleDoubleSum implements Summation {

  @Override
  public double sum(double[] terms) {
    double high = 0;
    double low = 0;
    for (double term : terms) {
      double sum = high + term;
      double rest = low + ErrorFree.ofSum(high, term, sum);
      high = sum + rest;
      low = ErrorFree.ofOrderedSum(sum, rest, high);
    }
    return RecursiveSum.unlessFinite(high, terms);
  }
}
