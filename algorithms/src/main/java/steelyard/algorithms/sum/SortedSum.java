package steelyard.algorithms.sum;

import java.util.Arrays;

/**
 * Recursive summation of the terms in the order of increasing magnitude.
 *
 * @see <a href="https://doi.org/10.1137/1.9780898718027">Higham, Accuracy and Stability of
 *     Numerical Algorithms, 2nd ed., 2002, sections 4.1 and 4.2</a>
 */
final class SortedSum implements Summation {

  @Override
  public double sum(double[] terms) {
    double[] ascending = terms.clone();
    Arrays.sort(ascending);
    int positive = firstPositive(ascending);
    int negative = positive - 1;
    double sum = 0;
    // Magnitudes increase outwards from the sign change; NaNs are sorted to the far right.
    while (negative >= 0 || positive < ascending.length) {
      boolean takeNegative =
          positive == ascending.length
              || (negative >= 0 && -ascending[negative] <= ascending[positive]);
      sum += takeNegative ? ascending[negative--] : ascending[positive++];
    }
    return sum;
  }

  private static int firstPositive(double[] ascending) {
    int i = 0;
    while (i < ascending.length && ascending[i] <= 0) {
      i++;
    }
    return i;
  }
}
