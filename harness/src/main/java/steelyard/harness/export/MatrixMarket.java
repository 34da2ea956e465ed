package steelyard.harness.export;

import steelyard.harness.data.DoubleText;
import steelyard.problems.Data;

/**
 * Renders a dense matrix in the Matrix Market exchange form: a banner, comments, rows and columns,
 * then one entry a line, column by column, with the 17 significant digits that read back as the
 * same double.
 *
 * @see <a href="https://doi.org/10.6028/NIST.IR.5935">Boisvert, Pozo and Remington, The Matrix
 *     Market Exchange Formats: Initial Design, NISTIR 5935, 1996</a>
 */
final class MatrixMarket {

  private MatrixMarket() {}

  static String text(Data.Matrix matrix, String id) {
    double[][] rows = matrix.rows();
    int columns = rows.length == 0 ? 0 : rows[0].length;
    StringBuilder text = new StringBuilder("%%MatrixMarket matrix array real general\n");
    text.append("% ").append(matrix.name()).append(" of ").append(id).append('\n');
    text.append(rows.length).append(' ').append(columns).append('\n');
    for (int j = 0; j < columns; j++) {
      for (double[] row : rows) {
        text.append(DoubleText.full(row[j])).append('\n');
      }
    }
    return text.toString();
  }
}
