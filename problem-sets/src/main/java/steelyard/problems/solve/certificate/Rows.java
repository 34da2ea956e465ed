package steelyard.problems.solve.certificate;

/** A square matrix in some arithmetic, with the row operations of {@link GaussJordan}. */
interface Rows {
  /** Returns n. */
  int size();

  /** Returns roughly the absolute value of an entry, for the choice of pivots. */
  double magnitude(int row, int column);

  /** Exchanges two rows. */
  void swapRows(int first, int second);

  /** Exchanges two columns. */
  void swapColumns(int first, int second);

  /** Divides row k by its pivot, entry (k, k), and puts the pivot's reciprocal in its place. */
  void normalize(int k);

  /**
   * Subtracts from row i the normalized row k times entry (i, k), having taken that entry as zero.
   */
  void eliminate(int i, int k);
}
