package steelyard.results.table;

import java.io.IOException;
import java.util.Collection;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** Writes a table as RFC 4180 has it: a header, commas, quotes where needed, CRLF. */
public final class TableWriter {
  private TableWriter() {}

  /**
   * Writes a table with its header.
   *
   * @throws IOException if the target cannot be written
   */
  public static <R> void write(TableSchema<R> schema, Collection<R> rows, Appendable target)
      throws IOException {
    // Closing the printer would close the target, which belongs to the caller.
    @SuppressWarnings("resource")
    CSVPrinter printer = new CSVPrinter(target, CSVFormat.RFC4180);
    printer.printRecord(schema.header());
    for (R row : rows) {
      List<String> cells = schema.columns().stream().map(column -> column.cell(row)).toList();
      printer.printRecord(cells);
    }
    printer.flush();
  }

  /** Returns the text of a table with its header. */
  public static <R> String text(TableSchema<R> schema, Collection<R> rows) {
    StringBuilder text = new StringBuilder();
    try {
      write(schema, rows, text);
    } catch (IOException e) {
      throw new AssertionError("A StringBuilder does not fail.", e);
    }
    return text.toString();
  }
}
