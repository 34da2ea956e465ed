package steelyard.harness.api;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.algorithms.sum.Summation;
import steelyard.problems.Problem;
import steelyard.results.choice.Choice;
import steelyard.results.run.Run;

/** What the command line does, from Java. */
class SteelyardTest {
  private static final Summation BACKWARDS =
      terms -> {
        double sum = 0;
        for (int i = terms.length - 1; i >= 0; i--) {
          sum += terms[i];
        }
        return sum;
      };

  @TempDir private Path folder;

  @Test
  void theExampleOfTheReadmeRuns() throws IOException {
    Path runFolder = folder.resolve("run");
    Choice choice = Example.choose(BACKWARDS, runFolder);
    assertThat(choice.qualified()).extracting(each -> each.candidate()).containsExactly("exact");
    Run read = Steelyard.read(runFolder);
    assertThat(read.observations()).extracting(row -> row.candidate()).contains("mine");
    assertThat(read.observations()).hasSize(7 * 3 * 3);
  }

  @Test
  void theReadmeShowsTheExampleAsItIsCompiled() throws IOException {
    Path source = Path.of("src/test/java/steelyard/harness/api/Example.java");
    String body =
        Files.readString(source)
            .lines()
            .dropWhile(line -> !line.strip().equals("// begin"))
            .skip(1)
            .takeWhile(line -> !line.strip().equals("// end"))
            .map(line -> line.isBlank() ? "" : line.substring(4))
            .collect(Collectors.joining("\n"));
    assertThat(Files.readString(Path.of("..", "README.md"))).contains("```java\n" + body + "\n```");
  }

  @Test
  void listsWhatThereIs() {
    Steelyard steelyard = Steelyard.standard().with(Summation.class, "mine", BACKWARDS);
    assertThat(steelyard.tasks()).contains("sum", "dot", "solve");
    assertThat(steelyard.families("solve")).contains("hilbert");
    assertThat(steelyard.candidates("sum")).startsWith("recursive").endsWith("mine");
    assertThat(Steelyard.standard().candidates("sum")).doesNotContain("mine");
  }

  @Test
  void weighsFilesAsTheCommandDoes() throws IOException {
    Path file = folder.resolve("ledger.txt");
    Files.writeString(file, "0x1p60 1 -0x1p60 2\n");
    Run run =
        Steelyard.standard()
            .with(Summation.class, "mine", BACKWARDS)
            .withoutTiming()
            .weigh("sum", List.of(file), List.of());
    assertThat(run.observations())
        .filteredOn(row -> row.candidate().equals("exact"))
        .allSatisfy(row -> assertThat(row.answer()).hasValue(3));
    assertThat(run.observations())
        .filteredOn(row -> row.candidate().equals("mine"))
        .allSatisfy(
            row ->
                assertThat(row.answer())
                    .hasValue(BACKWARDS.sum(new double[] {0x1p60, 1, -0x1p60, 2})));
  }

  @Test
  void makesProblemsThatJudgeAnswers() {
    Problem<?> problem = Steelyard.standard().problem("sum/cancelling/k1e12/n100/r3");
    assertThat(problem.judge(new double[] {0}).forwardError()).isEqualTo(1);
    Path written = Steelyard.standard().export("sum/cancelling/k1e12/n100/r3", folder);
    assertThat(written.resolve("problem.json")).exists();
  }

  @Test
  void aCandidateOfThisJvmIsNotTimed() {
    Run run =
        Steelyard.standard()
            .with(Summation.class, "mine", BACKWARDS)
            .withThreads(1)
            .runText(
                """
                [timing]
                forks = 1
                warmup = 0
                measurement = 3
                iteration_ms = 1
                [[weigh]]
                task = "sum"
                families = ["random-signs"]
                candidates = ["mine"]
                sizes = [10]
                repeats = 1
                """);
    assertThat(run.timings()).hasSize(1);
    assertThat(run.timings().get(0).detail()).isEqualTo("not timed: it is known to one JVM alone");
  }

  @Test
  void whatIsWrongIsSaidInASentence() {
    assertThatThrownBy(() -> Steelyard.standard().with(Runnable.class, "mine", () -> {}))
        .hasMessage("no task has the interface java.lang.Runnable");
    assertThatThrownBy(() -> Steelyard.standard().with(Summation.class, "kahan", BACKWARDS))
        .hasMessage("task 'sum' has two candidates named 'kahan'");
    assertThatThrownBy(() -> Steelyard.standard().withThreads(0))
        .hasMessage("threads must be at least 1, found 0");
    assertThatThrownBy(() -> Steelyard.standard().run("touur"))
        .hasMessageContaining("did you mean 'tour'?");
  }
}
