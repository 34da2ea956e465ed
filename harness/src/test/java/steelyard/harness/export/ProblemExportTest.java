package steelyard.harness.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.problems.Data;

class ProblemExportTest {

  private static final List<String> FILES = List.of("a.mtx", "answer.csv", "b.csv", "problem.json");

  @TempDir Path root;

  @Test
  void writesAFolderForEachProblemNamedByItsId() throws IOException {
    Path folder = write(false, Depot.exported());

    assertThat(folder).isEqualTo(root.resolve("solve/depot/k1e3/n2/r1"));
    assertThat(names(folder)).isEqualTo(FILES);
    assertThat(names(folder.getParent())).containsExactly("r1");
  }

  @Test
  void writesTheGoldenFiles() throws IOException {
    assertGolden(write(false, Depot.exported()));
  }

  @Test
  void writesTheSameInEveryLocaleAndTimeZone() throws IOException {
    Locale locale = Locale.getDefault();
    TimeZone zone = TimeZone.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-SA-u-nu-arab"));
      TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
      assertGolden(write(false, Depot.exported()));
    } finally {
      Locale.setDefault(locale);
      TimeZone.setDefault(zone);
    }
  }

  @Test
  void spellsAnInfiniteConditionAsText() throws IOException {
    Depot cancelled = new Depot(Depot.twoCells().parts(), Double.POSITIVE_INFINITY);
    Path folder = write(false, Depot.exported("solve/depot/n2/r1", cancelled));

    assertThat(folder.resolve("problem.json")).content().contains("\"condition\": \"Infinity\"");
  }

  @Test
  void doesNotOverwriteUnlessTold() throws IOException {
    Path folder = write(false, Depot.exported());
    Files.writeString(folder.resolve("b.csv"), "mine");

    assertRefused(false, folder + " holds a problem already, which is not overwritten");
    assertThat(folder.resolve("b.csv")).hasContent("mine");

    assertGolden(write(true, Depot.exported()));
    assertThat(names(folder.getParent())).containsExactly("r1");
  }

  @Test
  void neverReplacesAFolderOfAnotherKind() throws IOException {
    Path folder = Files.createDirectories(root.resolve("solve/depot/k1e3/n2/r1"));
    Files.writeString(folder.resolve("thesis.txt"), "years of work");

    assertRefused(true, folder + " is in the way and holds no problem: choose another folder");
    assertThat(folder.resolve("thesis.txt")).hasContent("years of work");
  }

  @Test
  void clearsAwayWhatAKilledExportLeft() throws IOException {
    Path parent = Files.createDirectories(root.resolve("solve/depot/k1e3/n2"));
    Files.writeString(Files.createDirectory(parent.resolve(".writing-r1")).resolve("x"), "half");
    Files.createDirectory(parent.resolve(".replaced-r1"));

    write(false, Depot.exported());
    assertGolden(write(true, Depot.exported()));
    assertThat(names(parent)).containsExactly("r1");
    assertThat(names(parent.resolve("r1"))).isEqualTo(FILES);
  }

  @Test
  void leavesNothingBehindWhenItCannotWrite() throws IOException {
    Files.writeString(root.resolve("solve"), "a file where a folder must be");

    assertThatThrownBy(() -> write(false, Depot.exported()))
        .isExactlyInstanceOf(ExportException.class)
        .hasMessage(
            "problem solve/depot/k1e3/n2/r1 cannot be written to "
                + root.resolve("solve/depot/k1e3/n2/r1")
                + ", which must be in a folder that can be written, on a disk with room");
    assertThat(names(root)).containsExactly("solve");
  }

  @Test
  void leavesNothingBehindWhenAPartCannotBeWritten() throws IOException {
    Depot twice =
        new Depot(
            List.of(new Data.Vector("b", new double[] {1}), new Data.Vector("b", new double[] {2})),
            1);

    assertThatThrownBy(() -> write(false, Depot.exported("solve/depot/n1/r1", twice)))
        .isExactlyInstanceOf(ExportException.class)
        .hasMessage("two parts of the problem would be written to one file b.csv");
    assertThat(names(root)).isEmpty();
  }

  @Test
  void refusesAPartWhoseNameLeadsElsewhere() {
    Depot sly = new Depot(List.of(new Data.Vector("../b", new double[] {1})), 1);

    assertThatThrownBy(() -> write(false, Depot.exported("solve/depot/n1/r1", sly)))
        .isExactlyInstanceOf(ExportException.class)
        .hasMessage("no file can be named after a part of the problem: ../b.csv");
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "..", "../up", "/etc", "sum//r1", "sum/../../r1", "sum/.r1", "a b"})
  void refusesAnIdThatIsNone(String id) {
    assertThatThrownBy(() -> write(true, Depot.exported(id, Depot.twoCells())))
        .isExactlyInstanceOf(ExportException.class)
        .hasMessage("'" + id + "' is no problem id, so no folder can be named after it");
  }

  private Path write(boolean overwrite, ExportedProblem problem) {
    return new ProblemExport(root, overwrite).write(problem);
  }

  private void assertRefused(boolean overwrite, String sentence) {
    assertThatThrownBy(() -> write(overwrite, Depot.exported()))
        .isExactlyInstanceOf(ExportException.class)
        .hasMessage(sentence);
  }

  private static void assertGolden(Path folder) throws IOException {
    for (String name : FILES) {
      try (var golden = ProblemExportTest.class.getResourceAsStream("depot/" + name)) {
        assertThat(golden).as(name).isNotNull();
        assertThat(folder.resolve(name)).as(name).hasBinaryContent(golden.readAllBytes());
      }
    }
  }

  private static List<String> names(Path folder) throws IOException {
    try (Stream<Path> children = Files.list(folder)) {
      return children.map(child -> child.getFileName().toString()).sorted().toList();
    }
  }
}
