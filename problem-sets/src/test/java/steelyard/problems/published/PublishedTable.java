package steelyard.problems.published;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** The table of published values. */
final class PublishedTable {

  /**
   * One value.
   *
   * @param id its name
   * @param task what it belongs to
   * @param input the data in words
   * @param value the value, with all the digits that are known of it
   * @param source where it stands
   * @param provenance whether the source was seen, recalled from memory, or the value computed
   */
  record Row(
      String id, String task, String input, BigDecimal value, String source, String provenance) {

    /** Returns how far the printed value may be off by its own rounding, relative to it. */
    BigDecimal rounding() {
      return BigDecimal.ONE.movePointLeft(value.precision() - 1).divide(BigDecimal.valueOf(2));
    }

    @Override
    public String toString() {
      return id;
    }
  }

  private PublishedTable() {}

  static List<Row> rows() {
    return lines("values.csv").stream()
        .skip(1)
        .map(PublishedTable::cells)
        .map(c -> new Row(c[0], c[1], c[2], new BigDecimal(c[3]), c[4], c[5]))
        .toList();
  }

  static List<String> lines(String resource) {
    try (InputStream file = PublishedTable.class.getResourceAsStream(resource)) {
      return new String(file.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  // A quoted cell holds commas, and no quotes.
  private static String[] cells(String line) {
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        cells.add(cell.toString());
        cell.setLength(0);
      } else {
        cell.append(c);
      }
    }
    cells.add(cell.toString());
    if (cells.size() != 6) {
      throw new IllegalStateException("six cells are wanted: " + line);
    }
    return cells.toArray(String[]::new);
  }
}
