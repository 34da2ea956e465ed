package steelyard.problems.solve.certificate;

import java.util.Arrays;

/** A matrix of doubles. Panels are narrow, so that each pass over the rows does several steps. */
final class DoubleRows implements Rows {
  private static final int PANEL_WIDTH = 4;

  private final double[][] rows;

  /** Makes one that changes the given rows. */
  DoubleRows(double[][] rows) {
    this.rows = rows;
  }

  @Override
  public int size() {
    return rows.length;
  }

  @Override
  public int panelWidth() {
    return PANEL_WIDTH;
  }

  @Override
  public double magnitude(int row, int column) {
    return Math.abs(rows[row][column]);
  }

  @Override
  public void swapRows(int first, int second) {
    double[] kept = rows[first];
    rows[first] = rows[second];
    rows[second] = kept;
  }

  @Override
  public void swapColumns(int first, int second) {
    for (double[] row : rows) {
      double kept = row[first];
      row[first] = row[second];
      row[second] = kept;
    }
  }

  @Override
  public void normalize(int k, int from, int to) {
    double[] row = rows[k];
    double pivot = row[k];
    row[k] = 1;
    for (int j = from; j < to; j++) {
      row[j] /= pivot;
    }
  }

  @Override
  public void eliminate(int i, int k, int from, int to) {
    double[] row = rows[i];
    double factor = row[k];
    row[k] = 0;
    for (int j = from; j < to; j++) {
      row[j] -= factor * rows[k][j];
    }
  }

  // Inside the panel now stand the columns of the matrix by which its steps multiplied from the
  // left, apart from those of the identity. Outside, every row therefore gains a combination of
  // the panel's rows, and these themselves are replaced by one.
  @Override
  public void finish(int from, int to) {
    double[][] panel = new double[PANEL_WIDTH][size()];
    for (int k = from; k < to; k++) {
      System.arraycopy(rows[k], 0, panel[k - from], 0, size());
    }
    double[] factors = new double[PANEL_WIDTH];
    for (int i = 0; i < size(); i++) {
      double[] row = rows[i];
      System.arraycopy(row, from, factors, 0, to - from);
      if (from <= i && i < to) {
        Arrays.fill(row, 0);
      }
      combine(row, factors, panel);
      System.arraycopy(factors, 0, row, from, to - from);
    }
  }

  private static void combine(double[] row, double[] factors, double[][] panel) {
    double f0 = factors[0];
    double f1 = factors[1];
    double f2 = factors[2];
    double f3 = factors[3];
    double[] p0 = panel[0];
    double[] p1 = panel[1];
    double[] p2 = panel[2];
    double[] p3 = panel[3];
    for (int j = 0; j < row.length; j++) {
      row[j] += f0 * p0[j] + f1 * p1[j] + (f2 * p2[j] + f3 * p3[j]);
    }
  }
}
