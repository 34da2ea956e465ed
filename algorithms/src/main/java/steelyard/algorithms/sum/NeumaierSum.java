package steelyard.algorithms.sum;

/**
 * Kahan-Babuska-Neumaier summation: the rounding errors of recursive summation are accumulated
 * apart and added once at the end. The branch finds the larger summand, from which the error is had
 * in two operations.
 *
 * @see <a href="https://doi.org/10.1002/zamm.19740540106">Neumaier, Rundungsfehleranalyse einiger
 *     Verfahren zur Summation endlicher Summen, ZAMM 54 (1974) 39-51</a>
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, (4.10)</a>
 */
final class NeumaierSum implements Summation {

  @Override
  public double sum(double[] terms) {
    double sum = 0;
    double correction = 0;
    for (double term : terms) {
      double next = sum + term;
      correction += Math.abs(sum) >= Math.abs(term) ? (sum - next) + term : (term - next) + sum;
      sum = next;
    }
    return RecursiveSum.unlessFinite(sum + correction, terms);
  }
}
