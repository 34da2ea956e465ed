package steelyard.problems.solve.certificate;

/**
 * A square matrix in some arithmetic, with the operations of {@link GaussJordan}. The columns are
 * taken in panels: a step of the elimination changes the columns of its panel at once, and all the
 * others when the panel is finished.
 */
interface Rows {
  /** Returns n. */
  int size();

  /** Returns the number of columns of a panel; as many as there are columns if it does not pay. */
  default int panelWidth() {
    return size();
  }

  /** Returns roughly the absolute value of an entry, for the choice of pivots. */
  double magnitude(int row, int column);

  /** Exchanges two rows. */
  void swapRows(int first, int second);

  /** Exchanges two columns. */
  void swapColumns(int first, int second);

  /**
   * Divides row k by its pivot, entry (k, k), and puts the pivot's reciprocal in its place; in the
   * columns of a panel only.
   *
   * @param k the pivot's row and column
   * @param from the panel's first column
   * @param to the column after its last
   */
  void normalize(int k, int from, int to);

  /**
   * Subtracts from row i the normalized row k times entry (i, k), having taken that entry as zero;
   * in the columns of a panel only.
   */
  void eliminate(int i, int k, int from, int to);

  /** Does to the columns outside a panel what its steps did to those inside. */
  default void finish(int from, int to) {}
}
