package steelyard.results.table;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.results.Grade;
import steelyard.results.Status;

/** The data dictionary in the README is that of the schemas. */
class DataDictionaryTest {
  private static final Path README = Path.of("README.md");

  static List<TableSchema<?>> tables() {
    return TableSchemas.ALL;
  }

  @ParameterizedTest
  @MethodSource("tables")
  void everyColumnOfATableIsInTheReadme(TableSchema<?> table) throws IOException {
    StringBuilder expected = new StringBuilder("### " + table.fileName() + "\n\n");
    expected.append(table.meaning()).append("\n\n");
    expected.append("| column | type | unit | empty | meaning |\n|---|---|---|---|---|\n");
    for (Column<?> c : table.columns()) {
      expected.append("| `" + c.name() + "` | " + c.type().schemaType() + " | " + c.unit());
      expected.append(" | " + (c.required() ? "no" : "yes") + " | " + c.meaning() + " |\n");
    }
    assertThat(Files.readString(README)).contains(expected.append("\n"));
  }

  @Test
  void theReadmeHasNoOtherTable() throws IOException {
    Matcher heading = Pattern.compile("(?m)^### (\\w+\\.csv)$").matcher(Files.readString(README));
    assertThat(heading.results().map(m -> m.group(1)))
        .containsExactlyElementsOf(tables().stream().map(TableSchema::fileName).toList());
  }

  @ParameterizedTest
  @EnumSource(Status.class)
  void everyStatusIsExplained(Status status) throws IOException {
    assertThat(Files.readString(README)).contains("| `" + status.text() + "` | ");
  }

  @ParameterizedTest
  @EnumSource(Grade.class)
  void everyVerdictIsExplained(Grade grade) throws IOException {
    String row =
        grade.folds().isPresent() ? "| `8-fold` … `2-fold` | " : "| `" + grade.text() + "` | ";
    assertThat(Files.readString(README)).contains(row);
  }

  @ParameterizedTest
  @MethodSource("tables")
  void columnNamesAreSnakeCaseAndUnique(TableSchema<?> table) {
    assertThat(table.header()).doesNotHaveDuplicates().allMatch(n -> n.matches("[a-z]+(_[a-z]+)*"));
    assertThat(table.columns())
        .allSatisfy(c -> assertThat(c.name().endsWith("_ns")).isEqualTo(c.unit().equals("ns")))
        .allSatisfy(c -> assertThat(c.name().endsWith("_hex")).isEqualTo(c.type() == CellType.HEX));
  }
}
