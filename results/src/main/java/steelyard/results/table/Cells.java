package steelyard.results.table;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** The cells of one line of a file by the name of their column, each of the form of its column. */
public final class Cells {
  private final String file;
  private final long line;
  private final Map<String, String> texts;

  Cells(String file, long line, Map<String, String> texts) {
    this.file = file;
    this.line = line;
    this.texts = texts;
  }

  /** Returns a text, perhaps an empty one. */
  String text(String column) {
    String text = texts.get(column);
    if (text == null) {
      throw new IllegalArgumentException("There is no column " + column + " in " + file + ".");
    }
    return text;
  }

  /** Returns a text unless it is empty. */
  Optional<String> note(String column) {
    return Optional.of(text(column)).filter(t -> !t.isEmpty());
  }

  /** Returns a whole number of up to 64 bits. */
  long whole(String column) {
    try {
      return Long.parseLong(text(column));
    } catch (NumberFormatException e) {
      throw wrong(column, text(column) + " is too large; write a whole number of 64 bits");
    }
  }

  /** Returns a whole number. */
  int integer(String column) {
    long value = whole(column);
    if (value != (int) value) {
      throw wrong(column, value + " is too large; write a whole number of 32 bits");
    }
    return (int) value;
  }

  /** Returns a number unless the cell is empty. */
  OptionalDouble number(String column) {
    String text = text(column);
    return text.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Scientific.parse(text));
  }

  /** Returns a number of a hexadecimal column unless the cell is empty. */
  OptionalDouble hex(String column) {
    String text = text(column);
    return text.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(text));
  }

  /** Returns a yes or no unless the cell is empty. */
  Optional<Boolean> flag(String column) {
    return note(column).map(Boolean::valueOf);
  }

  /** Returns an exception that names the place of a cell. */
  TableException wrong(String column, String complaint) {
    return new TableException(file, line, column, complaint);
  }
}
