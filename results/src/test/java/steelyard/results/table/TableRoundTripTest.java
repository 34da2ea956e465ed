package steelyard.results.table;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.Rounding;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.run.Run;

class TableRoundTripTest {
  @Test
  void everyTableOfARunComesBack() {
    Run run = SampleRun.run();
    assertRoundTrip(ErrorsTable.SCHEMA, run.observations());
    assertRoundTrip(TimingsTable.SCHEMA, run.timings());
    assertRoundTrip(TradeoffsTable.SCHEMA, run.tradeoffs());
    assertRoundTrip(VerdictsTable.SCHEMA, run.verdicts());
  }

  @Test
  void emptyTable() {
    assertRoundTrip(ErrorsTable.SCHEMA, List.of());
  }

  @Test
  void everyStatusAndRounding() {
    List<Observation> rows = new ArrayList<>();
    for (Status status : Status.values()) {
      rows.add(new ObservationBuilder().status(status).build());
    }
    for (Rounding rounding : Rounding.values()) {
      rows.add(new ObservationBuilder().rounding(rounding).build());
    }
    rows.add(
        new ObservationBuilder()
            .condition(Double.POSITIVE_INFINITY)
            .forward(Double.POSITIVE_INFINITY)
            .build());
    assertRoundTrip(ErrorsTable.SCHEMA, rows);
    assertThat(read(ErrorsTable.SCHEMA, TableWriter.text(ErrorsTable.SCHEMA, rows)))
        .extracting(Observation::status)
        .containsExactlyElementsOf(rows.stream().map(Observation::status).toList());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a \"quoted\" word, a comma",
        "two\r\nlines",
        "lone \r and \n",
        "=HYPERLINK(\"x\")",
        "  spaces  ",
        "\u202Ereversed\u202C \u05E9\u05DC\u05D5\u05DD",
        "\u0000\u001B[2J",
        "\\n is not a line break",
        "'",
        "#comment"
      })
  void hostileTextComesBackAsItWas(String text) {
    Observation row = new ObservationBuilder().at(text, text, text).problem(text).build();
    String file = TableWriter.text(ErrorsTable.SCHEMA, List.of(row));
    assertThat(file.lines()).as("one line per row").hasSize(2);
    Observation back = read(ErrorsTable.SCHEMA, file).get(0);
    assertThat(back.task()).isEqualTo(text);
    assertThat(back.problem()).isEqualTo(text);
    assertRoundTrip(ErrorsTable.SCHEMA, List.of(row));
  }

  @Test
  void veryLongText() {
    String text = "=\"\n".repeat(100_000);
    Observation row = new ObservationBuilder().problem(text).build();
    String file = TableWriter.text(ErrorsTable.SCHEMA, List.of(row));
    assertThat(read(ErrorsTable.SCHEMA, file).get(0).problem()).isEqualTo(text);
  }

  @Test
  void anAnswerComesBackToTheLastBit() {
    Observation row = new ObservationBuilder().build();
    Observation back =
        read(ErrorsTable.SCHEMA, TableWriter.text(ErrorsTable.SCHEMA, List.of(row))).get(0);
    assertThat(back.answer()).hasValue(row.answer().orElseThrow());
  }

  private static <R> void assertRoundTrip(TableSchema<R> schema, Collection<R> rows) {
    String text = TableWriter.text(schema, rows);
    List<R> read = read(schema, text);
    assertThat(read).hasSameSizeAs(rows);
    assertThat(TableWriter.text(schema, read)).isEqualTo(text);
    // What was read once has only printed numbers, and so comes back equal.
    assertThat(read(schema, text)).isEqualTo(read);
  }

  private static <R> List<R> read(TableSchema<R> schema, String text) {
    return TableReader.read(schema, schema.fileName(), new StringReader(text));
  }
}
