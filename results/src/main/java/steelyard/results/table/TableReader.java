package steelyard.results.table;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.csv.CSVException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads a table and says of a damaged one where it is damaged. */
public final class TableReader<R> {
  private final TableSchema<R> schema;
  private final String file;

  private TableReader(TableSchema<R> schema, String file) {
    this.schema = schema;
    this.file = file;
  }

  /**
   * Reads a file.
   *
   * @throws TableException if the file is missing, damaged, or of another table
   */
  public static <R> List<R> read(TableSchema<R> schema, Path path) {
    String file = path.toString();
    try (Reader reader = Files.newBufferedReader(path, StandardCharsets.UTF_8)) {
      return read(schema, file, reader);
    } catch (NoSuchFileException e) {
      throw new TableException(file, 0, "", "the file is missing; name the folder of a run");
    } catch (IOException e) {
      throw new TableException(
          file, 0, "", "the file cannot be read (" + e + "); check its permissions");
    }
  }

  /**
   * Reads a text.
   *
   * @param file its name in a sentence about it
   * @throws TableException if the text is damaged, or of another table
   */
  public static <R> List<R> read(TableSchema<R> schema, String file, Reader reader) {
    return new TableReader<>(schema, file).rows(reader);
  }

  private List<R> rows(Reader reader) {
    LastCharacter last = new LastCharacter(reader);
    List<R> rows = new ArrayList<>();
    long line = 1;
    long lastLine = 1;
    try (CSVParser parser = CSVParser.builder().setReader(last).setFormat(FORMAT).get()) {
      Iterator<CSVRecord> records = parser.iterator();
      if (!records.hasNext()) {
        throw new TableException(file, 1, "", "the header is missing; it must be " + header());
      }
      checkHeader(records.next());
      line = parser.getCurrentLineNumber() + 1;
      while (records.hasNext()) {
        lastLine = line;
        rows.add(row(records.next(), line));
        line = parser.getCurrentLineNumber() + 1;
      }
    } catch (UncheckedIOException e) {
      throw unreadable(line, e.getCause());
    } catch (IOException e) {
      throw unreadable(line, e);
    }
    if (!last.endsLine()) {
      throw new TableException(
          file,
          lastLine,
          "",
          "the last line has no line break at its end; the file is cut off, so take a whole copy");
    }
    return rows;
  }

  // Unlike the format for writing, this one keeps an empty line, so that a line stays a row.
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setIgnoreEmptyLines(false).get();

  private TableException unreadable(long line, IOException e) {
    if (e instanceof CharacterCodingException) {
      return new TableException(file, line, "", "a byte here or below is not UTF-8; convert it");
    }
    if (e instanceof CSVException) {
      return new TableException(
          file,
          line,
          "",
          "a quotation mark is not closed or is followed by text; quote as RFC 4180 has it");
    }
    return new TableException(file, line, "", "the file cannot be read (" + e + ")");
  }

  private String header() {
    return String.join(",", schema.header());
  }

  private void checkHeader(CSVRecord found) {
    List<String> names = found.toList();
    for (String name : schema.header()) {
      if (!names.contains(name)) {
        throw new TableException(
            file, 1, name, "the column is missing; the header must be " + header());
      }
    }
    for (int i = 0; i < names.size(); i++) {
      String name = names.get(i);
      if (i >= schema.header().size() || !schema.header().get(i).equals(name)) {
        throw new TableException(
            file,
            1,
            GuardedText.excerpt(name),
            "the column is unknown or not in its place ("
                + (i + 1)
                + "); the header must be "
                + header());
      }
    }
  }

  private R row(CSVRecord found, long line) {
    int expected = schema.columns().size();
    if (found.size() != expected) {
      throw new TableException(
          file,
          line,
          "",
          "the row has " + found.size() + " cells and must have " + expected + ", one per column");
    }
    Map<String, String> texts = new HashMap<>();
    for (int i = 0; i < expected; i++) {
      Column<R> column = schema.columns().get(i);
      texts.put(column.name(), cell(column, found.get(i), line));
    }
    return schema.row().apply(new Cells(file, line, texts));
  }

  private String cell(Column<R> column, String found, long line) {
    String text = found;
    if (column.type() == CellType.TEXT) {
      try {
        text = GuardedText.unguard(found);
      } catch (IllegalArgumentException e) {
        throw new TableException(
            file, line, column.name(), e.getMessage() + "; write a backslash as \\\\");
      }
    }
    Optional<String> complaint = column.complaint(text);
    if (complaint.isPresent()) {
      throw new TableException(file, line, column.name(), complaint.get());
    }
    return text;
  }
}
