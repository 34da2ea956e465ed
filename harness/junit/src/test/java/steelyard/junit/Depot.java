package steelyard.junit;

import java.util.Arrays;

/** Kernels of an invented grain depot, good and bad. */
final class Depot {

  private Depot() {}

  static double total(double[] tickets) {
    double total = 0;
    for (double ticket : tickets) {
      total += ticket;
    }
    return total;
  }

  static double backwards(double[] tickets) {
    double total = 0;
    for (int i = tickets.length - 1; i >= 0; i--) {
      total += tickets[i];
    }
    return total;
  }

  /**
   * Rounds every ticket to kilograms in single precision first, which no error analysis excuses.
   */
  static double roughTotal(double[] tickets) {
    double total = 0;
    for (double ticket : tickets) {
      total += (float) ticket;
    }
    return total;
  }

  /** Neumaier's compensated summation. */
  static double carefulTotal(double[] tickets) {
    double total = 0;
    double lost = 0;
    for (double ticket : tickets) {
      double sum = total + ticket;
      lost += Math.abs(total) >= Math.abs(ticket) ? total - sum + ticket : ticket - sum + total;
      total = sum;
    }
    return total + lost;
  }

  static double inner(double[] x, double[] y) {
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += x[i] * y[i];
    }
    return sum;
  }

  /** Gaussian elimination; without the exchange of rows it is unstable. */
  static double[] calibrate(double[][] cells, double[] loads, boolean exchange) {
    int n = loads.length;
    double[][] a = Arrays.stream(cells).map(double[]::clone).toArray(double[][]::new);
    double[] x = loads.clone();
    for (int k = 0; k < n; k++) {
      int pivot = exchange ? pivot(a, k) : k;
      double[] row = a[k];
      a[k] = a[pivot];
      a[pivot] = row;
      double entry = x[k];
      x[k] = x[pivot];
      x[pivot] = entry;
      for (int i = k + 1; i < n; i++) {
        double factor = a[i][k] / a[k][k];
        for (int j = k; j < n; j++) {
          a[i][j] -= factor * a[k][j];
        }
        x[i] -= factor * x[k];
      }
    }
    for (int i = n - 1; i >= 0; i--) {
      for (int j = i + 1; j < n; j++) {
        x[i] -= a[i][j] * x[j];
      }
      x[i] /= a[i][i];
    }
    return x;
  }

  private static int pivot(double[][] a, int column) {
    int best = column;
    for (int i = column; i < a.length; i++) {
      if (Math.abs(a[i][column]) > Math.abs(a[best][column])) {
        best = i;
      }
    }
    return best;
  }
}
