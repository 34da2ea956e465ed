package steelyard.results.table;

/** A table cannot be read. The message is one sentence: what is wrong, where, what is right. */
public final class TableException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final String file;
  private final long line;
  private final String column;

  /**
   * Makes an exception with its place.
   *
   * @param file the name of the file
   * @param line counted from 1; 0 where the whole file is meant
   * @param column the name of the column; empty where the whole line is meant
   * @param complaint what is wrong and what would be right, without the place
   */
  public TableException(String file, long line, String column, String complaint) {
    super(
        file
            + (line > 0 ? ", line " + line : "")
            + (column.isEmpty() ? "" : ", column " + column)
            + ": "
            + complaint
            + ".");
    this.file = file;
    this.line = line;
    this.column = column;
  }

  /** Returns the name of the file. */
  public String file() {
    return file;
  }

  /** Returns the line, counted from 1, or 0 where the whole file is meant. */
  public long line() {
    return line;
  }

  /** Returns the name of the column, or an empty text where the whole line is meant. */
  public String column() {
    return column;
  }
}
