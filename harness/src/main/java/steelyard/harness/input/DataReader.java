package steelyard.harness.input;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;

/**
 * Reads files by their names: {@code .csv} and {@code .tsv} as tables, {@code .mtx} as a Matrix
 * Market file, all others as plain text, each also with {@code .gz} after it.
 */
final class DataReader {

  private DataReader() {}

  /** Says whether a file is read as a table, so that its columns can be named. */
  static boolean isTable(Path file) {
    return hasEnding(file, ".csv") || hasEnding(file, ".tsv");
  }

  /**
   * Reads columns of a table.
   *
   * @param wanted the names of the columns, or their numbers from 1; empty for those with numbers
   * @param count how many are wanted if none is named
   * @throws InputException if they cannot be read
   */
  static List<Column> columns(Path file, List<String> wanted, int count) {
    try (Lines lines = Lines.of(file)) {
      return new Csv(lines).read(wanted, count);
    }
  }

  /**
   * Reads a vector from plain text, or from a Matrix Market file with one row or one column.
   *
   * @throws InputException if it cannot be read
   */
  static Column vector(Path file) {
    try (Lines lines = Lines.of(file)) {
      return isMatrix(file)
          ? oneDimensional(MatrixMarketFile.read(lines), file)
          : PlainText.read(lines);
    }
  }

  /**
   * Reads a matrix from a Matrix Market file.
   *
   * @throws InputException if it cannot be read
   */
  static Grid matrix(Path file) {
    if (!isMatrix(file)) {
      throw new InputException(
          file + " cannot be a matrix; a matrix must stand in a Matrix Market file, named .mtx");
    }
    try (Lines lines = Lines.of(file)) {
      return MatrixMarketFile.read(lines);
    }
  }

  private static boolean isMatrix(Path file) {
    return hasEnding(file, ".mtx");
  }

  private static boolean hasEnding(Path file, String ending) {
    String name = file.toString().toLowerCase(Locale.ROOT);
    return name.endsWith(ending) || name.endsWith(ending + ".gz");
  }

  private static Column oneDimensional(Grid grid, Path file) {
    double[][] rows = grid.rows();
    if (rows.length == 1) {
      return new Column(rows[0], grid.inexact());
    }
    if (rows[0].length != 1) {
      throw new InputException(
          file
              + " holds a matrix of "
              + rows.length
              + " by "
              + rows[0].length
              + ", where a vector is wanted, which has one row or one column");
    }
    double[] values = new double[rows.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = rows[i][0];
    }
    return new Column(values, grid.inexact());
  }
}
