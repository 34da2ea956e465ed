package steelyard.results.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.results.SampleRun;

/** A damaged file is refused with its place. */
class TableReaderTest {
  private static final String GOOD = TableWriter.text(TimingsTable.SCHEMA, SampleRun.timings());

  @TempDir Path folder;

  @Test
  void undamaged() {
    assertThat(read(GOOD)).hasSize(4);
    assertThat(read(GOOD.replace("\r\n", "\n"))).as("line feeds alone").hasSize(4);
  }

  @Test
  void emptyFile() {
    assertDamage("", 1, "", "the header is missing");
  }

  @Test
  void missingColumn() {
    assertDamage(GOOD.replace("time_low_ns,", ""), 1, "time_low_ns", "the column is missing");
  }

  @Test
  void extraColumn() {
    assertDamage(GOOD.replace("detail\r\n", "detail,mood\r\n"), 1, "mood", "unknown");
  }

  @Test
  void swappedColumns() {
    assertDamage(GOOD.replace("task,family,", "family,task,"), 1, "family", "not in its place (1)");
  }

  @Test
  void wrongNumber() {
    assertDamage(
        GOOD.replace("3.20000e+02", "3,2".replace(',', ';')),
        3,
        "time_ns",
        "\"3;2\" is not a number such as");
  }

  @Test
  void numbersOfJavaAreNotNumbersOfATable() {
    for (String wrong : List.of("1d", "0x1p3", "Infinity", " 1", "1_0", "\u0661")) {
      assertDamage(GOOD.replace("3.20000e+02", wrong), 3, "time_ns", "is not a number");
    }
  }

  @Test
  void wrongWholeNumber() {
    assertDamage(GOOD.replaceFirst("kahan,100", "kahan,1e2"), 3, "size", "a whole number");
    assertDamage(GOOD.replaceFirst("kahan,100", "kahan,99999999999"), 3, "size", "is too large");
    assertDamage(
        GOOD.replaceFirst("kahan,100", "kahan,99999999999999999999"), 3, "size", "is too large");
    assertDamage(GOOD.replaceFirst("kahan,100", "kahan,"), 3, "size", "the cell is empty");
  }

  @Test
  void truncatedRow() {
    assertDamage(GOOD.substring(0, GOOD.length() - 12), 5, "", "cells and must have 19");
    assertDamage(GOOD.substring(0, GOOD.length() - 2), 5, "", "the file is cut off");
  }

  @Test
  void openQuotationMark() {
    assertDamage(GOOD.replaceFirst("kahan", "\"kahan"), 3, "", "a quotation mark is not closed");
  }

  @Test
  void emptyLine() {
    assertDamage(GOOD.replaceFirst("\r\n", "\r\n\r\n"), 2, "", "has 1 cells and must have 19");
  }

  @Test
  void unknownStatus() {
    String errors = TableWriter.text(ErrorsTable.SCHEMA, SampleRun.observations());
    String damaged = errors.replaceFirst(",ok,", ",fine,");
    assertThatThrownBy(() -> TableReader.read(ErrorsTable.SCHEMA, "e", new StringReader(damaged)))
        .hasMessage(
            "e, line 2, column status: \"fine\" is not known here; write one of ok, nan, infinite,"
                + " malformed, exception, crashed, timeout, modified-input, nondeterministic, uncertified,"
                + " not-applicable.");
  }

  @Test
  void halfAClaim() {
    String errors = TableWriter.text(ErrorsTable.SCHEMA, SampleRun.observations());
    String damaged = errors.replaceFirst("1.11022e-14,true", ",true");
    assertThatThrownBy(() -> TableReader.read(ErrorsTable.SCHEMA, "e", new StringReader(damaged)))
        .hasMessageContaining("e, line 2, column bound_limits: ");
  }

  @Test
  void notUtf8() throws IOException {
    Path file = folder.resolve("timings.csv");
    Files.write(file, GOOD.replace("kahan", "kah\u00E4n").getBytes(StandardCharsets.ISO_8859_1));
    assertThatThrownBy(() -> TableReader.read(TimingsTable.SCHEMA, file))
        .isInstanceOf(TableException.class)
        .hasMessageContaining("is not UTF-8");
  }

  @Test
  void missingFile() {
    assertThatThrownBy(() -> TableReader.read(TimingsTable.SCHEMA, folder.resolve("t.csv")))
        .isInstanceOf(TableException.class)
        .hasMessageEndingWith("t.csv: the file is missing; name the folder of a run.");
  }

  private static List<?> read(String text) {
    return TableReader.read(TimingsTable.SCHEMA, "timings.csv", new StringReader(text));
  }

  private static void assertDamage(String text, long line, String column, String complaint) {
    TableException e = catchThrowableOfType(TableException.class, () -> read(text));
    assertThat(e).as("nothing was found wrong with " + text).isNotNull();
    assertThat(e.file()).isEqualTo("timings.csv");
    assertThat(e.line()).isEqualTo(line);
    assertThat(e.column()).isEqualTo(column);
    assertThat(e)
        .hasMessageStartingWith("timings.csv, line " + line)
        .hasMessageContaining(complaint)
        .hasMessageEndingWith(".");
  }
}
