package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThat;
import static steelyard.harness.input.Refusal.assertRefused;

import java.io.IOException;
import java.io.StringReader;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class CsvTest {

  private static final String LEDGER =
      "ticket,grain,gross_kg,net_kg\r\nT1,wheat,24100,12.5\r\n\"T\"\"2, late\",rye,  23000 ,7\r\n";

  @TempDir private Path folder;

  @Test
  void aColumnIsFoundByNameOrByNumber() {
    assertThat(values(LEDGER, "net_kg")).containsExactly(12.5, 7);
    assertThat(values(LEDGER, "3")).containsExactly(24100, 23000);
    assertThat(values("1;2\n3;4\n", "2")).containsExactly(2, 4);
  }

  @Test
  void theOnlyColumnWithNumbersNeedsNoName() {
    assertThat(values("grain,kg\nwheat,1\nrye,2\n")).containsExactly(1, 2);
    assertThat(values("kg\n1\n2\n")).containsExactly(1, 2);
    assertThat(values("1\n\n2\n")).containsExactly(1, 2);
  }

  @Test
  void semicolonsAndTabsSeparateToo() {
    assertThat(values("grain;kg, net\nwheat;1\n", "kg, net")).containsExactly(1);
    assertThat(values("grain\tkg, net\nwheat\t1\n", "kg, net")).containsExactly(1);
    assertThat(values("\"a;b\",c\nx,2\n", "c")).containsExactly(2);
  }

  @Test
  void aPairOfColumnsIsReadAtOnce() {
    Path file = write("x,y,z\n1,2,3\n4,5,6\n");
    List<Column> columns = DataReader.columns(file, List.of("z", "x"), 2);
    assertThat(columns.get(0).values()).containsExactly(3, 6);
    assertThat(columns.get(1).values()).containsExactly(1, 4);
    Path two = write("name,x,y\na,1,2\n");
    assertThat(DataReader.columns(two, List.of(), 2).get(1).values()).containsExactly(2);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "a,b\\n1,2 || loads.csv has 2 columns with numbers (a, b); say which one is meant",
        "1,2\\n3,4 || loads.csv has 2 columns with numbers (1, 2); say which one is meant",
        "a,b\\nx,y || loads.csv:2:1: this row has no number, where 1 is wanted",
        "gross,net\\n1,2 | nett | loads.csv has no column 'nett' among its 2; did you mean 'net'?",
        "gross,net\\n1,2 | 3 | loads.csv has no column '3' among its 2; known are: gross, net",
        "a,b\\n1,2 | 0 | has no column '0'",
        "a,a\\n1,2 | a | loads.csv has 2 columns named 'a'; say which one is meant by its number",
        "a\\n1\\nx | a | loads.csv:3:1: 'x' is no number",
        "t,a\\n1, \\n | a | loads.csv:2:4: there is nothing where a number must stand",
        "t,a\\nx,1\\ny,-inf | a | loads.csv:3:3: '-inf' is not finite",
        "t;a\\nx;3,14 | a | loads.csv:2:3: '3,14' has a decimal comma; write a decimal point: '3.14'",
        "t,a\\nx,\"3,14\" | a | loads.csv:2:3: '3,14' has a decimal comma",
        "t,a\\nx,3,14 | a | loads.csv:2:1: this row has 3 fields where the first has 2",
        "a\\n1e400 | a | loads.csv:2:1: '1e400' is beyond the largest double",
        "a,b\\n\"x,1\\ny,2 | b | loads.csv:2:1: the quotation mark that opens here is never closed",
        "a,b\\n\"x\"z,1 | b | loads.csv:2:4: after a closing quotation mark comes a separator",
        "a,b || loads.csv has one row of names and no number",
        "`` || loads.csv is empty"
      })
  void everyRefusalSaysWhatAndWhere(String text, String column, String sentence) {
    Path file = write(text.replace("\\n", "\n"));
    List<String> wanted = column == null ? List.of() : List.of(column);
    assertRefused(() -> DataReader.columns(file, wanted, 1), sentence);
  }

  @Test
  void aFieldMayGoOnOverSeveralLinesAndPlacesStayRight() {
    Path file = write("note,kg\n\"two\nlines\",1\nplain,x\n");
    assertRefused(
        () -> DataReader.columns(file, List.of("kg"), 1), "loads.csv:4:7: 'x' is no number");
  }

  /** The rows against those of an independent reader, on random texts that both accept. */
  @Test
  void rowsAreThoseOfAnIndependentReader() throws IOException {
    Random random = new Random(7);
    String[] atoms = {"a", "1.5", "\"q\"", "\"x,y\"", "\"u\"\"v\"", "\"two\nlines\"", "", "z w"};
    for (int i = 0; i < 500; i++) {
      StringBuilder text = new StringBuilder("h,i\n");
      for (int row = 0; row < 4; row++) {
        text.append(atoms[random.nextInt(atoms.length)]).append(',');
        text.append(atoms[random.nextInt(atoms.length)])
            .append(random.nextBoolean() ? "\r\n" : "\n");
      }
      assertThat(rows(text.toString())).as(text.toString()).isEqualTo(expected(text.toString()));
    }
  }

  private List<List<String>> rows(String text) {
    List<List<String>> rows = new ArrayList<>();
    try (Lines lines = Lines.of(write(text))) {
      CsvRows reader = new CsvRows(lines);
      for (List<Field> row = reader.next(); row != null; row = reader.next()) {
        rows.add(row.stream().map(Field::text).toList());
      }
    }
    return rows;
  }

  private static List<List<String>> expected(String text) throws IOException {
    List<List<String>> rows = new ArrayList<>();
    try (CSVParser parser = CSVFormat.RFC4180.parse(new StringReader(text))) {
      for (CSVRecord each : parser) {
        rows.add(each.toList());
      }
    }
    return rows;
  }

  private double[] values(String text, String... columns) {
    return DataReader.columns(write(text), List.of(columns), 1).get(0).values();
  }

  private Path write(String text) {
    return TextFiles.write(folder, "loads.csv", text);
  }
}
