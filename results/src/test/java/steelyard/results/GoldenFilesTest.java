package steelyard.results;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.results.choice.Choice;
import steelyard.results.choice.ChoiceText;
import steelyard.results.choice.Chooser;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;
import steelyard.results.text.SummaryText;

/** The form of everything that a run writes or prints is sealed, whatever the locale. */
class GoldenFilesTest {
  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(
      strings = {
        "errors.csv",
        "timings.csv",
        "tradeoffs.csv",
        "verdicts.csv",
        "plan.toml",
        "run.json",
        "tables.json"
      })
  void fileOfARun(String name) {
    Golden.check(
        name,
        () -> {
          RunFolder.write(folder.resolve("run"), SampleRun.run(), RunFolder.Existing.REPLACE);
          return Files.readString(folder.resolve("run").resolve(name));
        });
  }

  @Test
  void noOtherFile() throws IOException {
    RunFolder.write(folder, SampleRun.run(), RunFolder.Existing.KEEP);
    try (Stream<Path> files = Files.list(folder)) {
      assertThat(files.map(f -> f.getFileName().toString()))
          .containsExactlyInAnyOrder(
              "errors.csv",
              "timings.csv",
              "tradeoffs.csv",
              "verdicts.csv",
              "plan.toml",
              "run.json",
              "tables.json");
    }
  }

  @Test
  void summary() {
    Golden.check("summary.txt", () -> summary(false));
    assertThat(summary(false).lines()).allMatch(line -> line.length() <= SummaryText.WIDTH);
  }

  @Test
  void colourIsAllThatColourAdds() {
    assertThat(summary(true)).contains("\u001B[31m").isNotEqualTo(summary(false));
    assertThat(summary(true).replaceAll("\u001B\\[[0-9]+m", "")).isEqualTo(summary(false));
  }

  private static String summary(boolean colour) {
    Run run = SampleRun.run();
    return SummaryText.render(run.verdicts(), run.timings(), run.tradeoffs(), colour);
  }

  @Test
  void choice() {
    Golden.check("choice.txt", () -> choice(1e-6, SampleRun.timings()));
  }

  @Test
  void choiceWithoutTimes() {
    Golden.check("choice-untimed.txt", () -> choice(1e-6, List.of()));
  }

  @Test
  void choiceOfNone() {
    Golden.check("choice-none.txt", () -> choice(1e-15, SampleRun.timings()));
  }

  private static String choice(double error, List<Timing> timings) {
    Requirement requirement = new Requirement("sum", error, 1e12, 100, List.of(), List.of());
    Choice choice = Chooser.choose(requirement, SampleRun.observations(), timings);
    String text = ChoiceText.render(choice);
    assertThat(text.lines()).allMatch(line -> line.length() <= ChoiceText.WIDTH);
    return text;
  }
}
