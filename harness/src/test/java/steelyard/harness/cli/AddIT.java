package steelyard.harness.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.results.Status;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;

/** Candidates that a user brings along on the command line or in a plan. */
final class AddIT {
  private static final String CODE = "steelyard.harness.bring.Ledger";
  private static final String FOLDER =
      Path.of("target", "test-classes").toAbsolutePath().normalize().toString();

  @TempDir private Path directory;
  private Program program;

  @BeforeEach
  void layOutAPlan() throws IOException {
    program = Program.in(directory);
    Files.writeString(
        directory.resolve("plan.toml"),
        """
        name = "brought"
        [[add]]
        task = "sum"
        id = "display"
        use = "%s#net(float[])"
        jars = ["%s"]
        [[weigh]]
        task = "sum"
        families = ["random-signs"]
        candidates = ["recursive", "display"]
        sizes = [30]
        repeats = 1
        """
            .formatted(CODE, FOLDER));
  }

  @Test
  void thePlanAndTheCommandLineBringCandidates() {
    Program.Result result =
        program.run(
            "run",
            "plan.toml",
            "--add",
            "sum:net=" + CODE + "#net@" + FOLDER,
            "--add",
            "sum:exits=" + CODE + "#exiting",
            "--jar",
            FOLDER,
            "--out",
            "here");
    assertThat(result.exitCode()).as(result.err()).isZero();
    Run run = RunFolder.read(directory.resolve("here"));
    assertThat(run.observations())
        .extracting(row -> row.candidate(), row -> row.status())
        .containsExactly(
            tuple("recursive", Status.OK),
            tuple("display", Status.OK),
            tuple("net", Status.OK),
            tuple("exits", Status.CRASHED));
    assertThat(run.provenance().libraries())
        .containsEntry("sum:net", CODE + "#net in test-classes");

    // The plan as executed brings them again.
    Program.Result again = program.run("run", "here/plan.toml", "--out", "again");
    assertThat(again.exitCode()).as(again.err()).isZero();
    assertThat(directory.resolve("again/errors.csv"))
        .hasSameBinaryContentAs(directory.resolve("here/errors.csv"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "sum=x | --add 'sum=x' must look like sum:mine=com.acme.Totals#net",
        "sum:My=x | the id 'My' must be lower case letters, digits and hyphens",
        "sun:mine=x | there is no task 'sun'; did you mean 'sum'?",
        "sum:kahan=steelyard.harness.bring.Ledger#net | task 'sum' has a candidate 'kahan' already",
        "sum:mine=steelyard.harness.bring.Ledger#ofList | candidate sum:mine: no method ofList of",
        "dot:mine=steelyard.harness.bring.Ledger#net | nothing that is to be run weighs the task 'dot'",
        "sum:mine=exec: ./none | candidate sum:mine: there is no program './none'",
        "sum:mine=native: x.so | candidate sum:mine: 'native: x.so' must look like native:",
      })
  void whatCannotBeAddedIsRefusedBeforeAnythingIsWritten(String addition, String sentence) {
    Program.Result result =
        program.run("run", "plan.toml", "--add", addition, "--jar", FOLDER, "--out", "here");
    assertThat(result.exitCode()).isEqualTo(2);
    assertThat(result.out()).isEmpty();
    assertThat(result.err()).startsWith("steelyard: ").contains(sentence).hasLineCount(1);
    assertThat(directory.resolve("here")).doesNotExist();
  }
}
