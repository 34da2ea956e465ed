package depot;

/** What the depot computes from what its scales show. */
public final class Scales {
  private Scales() {}

  /** Returns the total of a ledger, in kilograms, with compensation. */
  public static double total(double[] kilograms) {
    double total = 0;
    double lost = 0;
    for (double each : kilograms) {
      double next = total + each;
      lost += Math.abs(total) >= Math.abs(each) ? (total - next) + each : (each - next) + total;
      total = next;
    }
    return total + lost;
  }

  /** Returns the total of a ledger as it was computed before. */
  public static double plainTotal(double[] kilograms) {
    double total = 0;
    for (double each : kilograms) {
      total += each;
    }
    return total;
  }

  /** Returns the total of a ledger as the display beside the gate has it, in tenths of a ton. */
  public static double displayed(double[] kilograms) {
    double total = 0;
    for (double each : kilograms) {
      total += Math.rint(each / 100) * 100;
    }
    return total;
  }

  /** Returns the loads that make the cells read as they do: Gaussian elimination with pivoting. */
  public static double[] loads(double[][] response, double[] readings) {
    int n = readings.length;
    double[][] a = new double[n][];
    for (int i = 0; i < n; i++) {
      a[i] = response[i].clone();
    }
    double[] x = readings.clone();
    for (int k = 0; k < n; k++) {
      int pivot = k;
      for (int i = k + 1; i < n; i++) {
        pivot = Math.abs(a[i][k]) > Math.abs(a[pivot][k]) ? i : pivot;
      }
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
}
