package steelyard.harness.input;

import java.util.ArrayList;
import java.util.List;

/**
 * The rows of a file of comma-separated values with the place of every field, which a message
 * needs. The separator is the first of semicolon, tab and comma that the first line has.
 *
 * @see <a href="https://www.rfc-editor.org/rfc/rfc4180">RFC 4180, Common Format and MIME Type for
 *     Comma-Separated Values (CSV) Files, 2005</a>
 */
final class CsvRows {

  private static final String SEPARATORS = ";\t,";
  private static final char QUOTE = '"';

  private final Lines lines;
  private char separator;
  private String line;
  private int at;

  CsvRows(Lines lines) {
    this.lines = lines;
  }

  /** Returns the fields of the next row that is not blank, or null after the last one. */
  List<Field> next() {
    do {
      line = lines.next();
      if (line == null) {
        return null;
      }
    } while (line.isBlank());
    if (separator == 0) {
      separator = separatorOf(line);
    }
    List<Field> fields = new ArrayList<>();
    at = 0;
    fields.add(field());
    while (at < line.length()) {
      at++;
      fields.add(field());
    }
    return fields;
  }

  private static char separatorOf(String line) {
    String outsideQuotes = line.replaceAll("\"[^\"]*\"?", "");
    for (int i = 0; i < SEPARATORS.length(); i++) {
      if (outsideQuotes.indexOf(SEPARATORS.charAt(i)) >= 0) {
        return SEPARATORS.charAt(i);
      }
    }
    return ',';
  }

  /** Reads a field and stops at the separator after it, or at the end of the line. */
  private Field field() {
    while (at < line.length() && isBlank(line.charAt(at))) {
      at++;
    }
    Place place = lines.place(at + 1);
    if (at < line.length() && line.charAt(at) == QUOTE) {
      return new Field(quoted(place).strip(), place);
    }
    int end = line.indexOf(separator, at);
    end = end < 0 ? line.length() : end;
    String text = line.substring(at, end).strip();
    at = end;
    return new Field(text, place);
  }

  private boolean isBlank(char c) {
    return c != separator && Character.isWhitespace(c);
  }

  private String quoted(Place opened) {
    StringBuilder text = new StringBuilder();
    at++;
    while (true) {
      int end = line.indexOf(QUOTE, at);
      if (end < 0) {
        text.append(line, at, line.length()).append('\n');
        line = text.length() > Lines.MAX_LINE ? null : lines.next();
        at = 0;
        if (line == null) {
          throw opened.fail("the quotation mark that opens here is never closed");
        }
      } else if (end + 1 < line.length() && line.charAt(end + 1) == QUOTE) {
        text.append(line, at, end + 1);
        at = end + 2;
      } else {
        text.append(line, at, end);
        at = end + 1;
        skipToSeparator();
        return text.toString();
      }
    }
  }

  private void skipToSeparator() {
    while (at < line.length() && line.charAt(at) != separator) {
      if (!isBlank(line.charAt(at))) {
        throw lines
            .place(at + 1)
            .fail(
                "after a closing quotation mark comes a separator; a quotation mark inside a field"
                    + " is written twice");
      }
      at++;
    }
  }
}
