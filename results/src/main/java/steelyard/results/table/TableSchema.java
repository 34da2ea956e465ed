package steelyard.results.table;

import java.util.List;
import java.util.function.Function;

/**
 * One table: its columns in their fixed order.
 *
 * @param <R> the row
 * @param name the name of the file without its ending
 * @param meaning one sentence for the reader of the table
 * @param columns in the order of the file
 * @param row makes a row of its cells
 */
public record TableSchema<R>(
    String name, String meaning, List<Column<R>> columns, Function<Cells, R> row) {

  /** Returns the name of the file. */
  public String fileName() {
    return name + ".csv";
  }

  /** Returns the names of the columns in their order. */
  public List<String> header() {
    return columns.stream().map(Column::name).toList();
  }
}
