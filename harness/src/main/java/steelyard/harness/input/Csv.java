package steelyard.harness.input;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** Columns of a table: comma-separated values, with or without a row of names on top. */
final class Csv {

  private final Lines lines;
  private final CsvRows rows;

  Csv(Lines lines) {
    this.lines = lines;
    this.rows = new CsvRows(lines);
  }

  /**
   * Reads columns.
   *
   * @param wanted the names of the columns, or their numbers from 1; empty for those with numbers
   * @param count how many are wanted if none is named
   * @throws InputException if there are no such columns, a row is longer or shorter than the first,
   *     or a field is no finite number
   */
  List<Column> read(List<String> wanted, int count) {
    List<Field> top = rows.next();
    if (top == null) {
      throw new InputException(lines.file() + " is empty; it must hold at least one number");
    }
    boolean hasHeader = !top.stream().allMatch(field -> NumberText.looksNumeric(field.text()));
    List<Field> first = hasHeader ? rows.next() : top;
    if (first == null) {
      throw new InputException(
          lines.file() + " has one row of names and no number; it must hold at least one");
    }
    requireSameLength(top, first);
    List<String> names =
        hasHeader
            ? top.stream().map(Field::text).toList()
            : IntStream.rangeClosed(1, top.size()).mapToObj(String::valueOf).toList();
    ColumnChoice choice = new ColumnChoice(lines.file(), names, first);
    return read(first, wanted.isEmpty() ? choice.numeric(count) : choice.named(wanted));
  }

  private List<Column> read(List<Field> first, int[] columns) {
    List<NumberList> lists = new ArrayList<>();
    for (int i = 0; i < columns.length; i++) {
      lists.add(new NumberList());
    }
    for (List<Field> row = first; row != null; row = rows.next()) {
      requireSameLength(first, row);
      for (int i = 0; i < columns.length; i++) {
        Field field = row.get(columns[i]);
        lists.get(i).add(field.text(), field.place());
      }
    }
    return lists.stream().map(NumberList::column).toList();
  }

  private static void requireSameLength(List<Field> model, List<Field> row) {
    if (row.size() != model.size()) {
      throw row.get(0)
          .place()
          .fail(
              "this row has "
                  + fields(row.size())
                  + " where the first has "
                  + fields(model.size())
                  + "; a text with a separator in it must stand in quotation marks, and a number"
                  + " must have a decimal point");
    }
  }

  private static String fields(int count) {
    return count + (count == 1 ? " field" : " fields");
  }
}
