package steelyard.algorithms.solve;

/** Copies and moves whole rows of a matrix; does no arithmetic. */
final class Rows {

  private Rows() {}

  static double[][] copy(double[][] a) {
    double[][] copy = new double[a.length][];
    for (int i = 0; i < a.length; i++) {
      copy[i] = a[i].clone();
    }
    return copy;
  }

  /** Returns the columns of a square matrix as rows, which lie in one piece in memory. */
  static double[][] ofColumns(double[][] a) {
    double[][] columns = new double[a.length][a.length];
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j < a.length; j++) {
        columns[j][i] = a[i][j];
      }
    }
    return columns;
  }

  static void swap(double[][] a, int i, int j) {
    double[] moved = a[i];
    a[i] = a[j];
    a[j] = moved;
  }
}
