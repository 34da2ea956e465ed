package steelyard.algorithms;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.dot.DotProducts;
import steelyard.algorithms.solve.LinearSolvers;
import steelyard.algorithms.sum.Summations;

/** Holds the tables of the module's README to the catalogues. */
class ReadmeTest {

  static Stream<CandidateTable> catalogues() {
    return Stream.of(
        new CandidateTable("sum", Summations.all()),
        new CandidateTable("dot", DotProducts.all()),
        new CandidateTable("solve", LinearSolvers.all()));
  }

  @ParameterizedTest
  @MethodSource("catalogues")
  void tableSaysWhatTheCatalogueSays(CandidateTable table) throws IOException {
    List<String> section = section(table.heading());
    assertThat(section).contains(CandidateTable.HEADER);
    assertThat(section.stream().filter(line -> line.startsWith("| `")))
        .containsExactlyElementsOf(table.rows());
  }

  @Test
  void candidateThatTheReadmeDoesNotNameIsNoticed() throws IOException {
    Candidate<String> stranger =
        Candidate.of("stranger", "kernel", "Unknown to the README", "n", "nowhere");
    assertThat(section("## sum"))
        .doesNotContainAnyElementsOf(new CandidateTable("sum", List.of(stranger)).rows());
  }

  private static List<String> section(String heading) throws IOException {
    return Files.readAllLines(Path.of("README.md")).stream()
        .dropWhile(line -> !line.equals(heading))
        .skip(1)
        .takeWhile(line -> !line.startsWith("## "))
        .toList();
  }
}
