package steelyard.harness.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The command that weighs a user's own files, as a process. */
final class WeighIT {

  private static final Path EXAMPLES = Path.of("examples").toAbsolutePath();

  @TempDir private Path directory;

  @Test
  void theExampleLedgerIsAnIllConditionedSum() {
    Program.Result result =
        weigh("weighbridge.csv", "--task", "sum", "--column", "net_kg", "--no-timing");
    assertThat(result.exitCode()).as(result.err()).isZero();
    assertThat(result.out())
        .startsWith("sum/file-weighbridge-net-kg/n240/r1 from ")
        .contains("size n: 240", "values are no doubles and were rounded", "weighbridge.csv:")
        .contains("How accurate can any algorithm be here?", "The double nearest")
        .contains("DECISION: open. No time was taken");
    List<String> table =
        result.out().lines().dropWhile(line -> !line.startsWith("candidate ")).toList();
    assertThat(table.stream().filter(line -> line.startsWith("exact ")).findFirst().orElseThrow())
        .contains("last bit");
    assertThat(
            table.stream().filter(line -> line.startsWith("recursive ")).findFirst().orElseThrow())
        .doesNotContain("last bit");
  }

  @Test
  void theExampleSystemIsSolved() {
    Program.Result result =
        weigh(
            "load-cells.mtx",
            EXAMPLES.resolve("readings.txt").toString(),
            "--task",
            "solve",
            "--no-timing",
            "--candidates",
            "gauss-partial,gauss-refined-extended");
    assertThat(result.exitCode()).as(result.err()).isZero();
    assertThat(result.out())
        .contains("solve/file-load-cells-readings/n4/r1", "componentwise", "2 of 2 get there");
  }

  @Test
  void timesAreTakenAndTheFastestIsNamed() throws IOException {
    Files.writeString(directory.resolve("few.txt"), "1 2 3 4 5 6 7 8");
    Program.Result result =
        Program.in(directory)
            .withJvmOptions("-Djmh.ignoreLock=true")
            .run("weigh", "few.txt", "--task", "sum", "--candidates", "recursive,exact");
    assertThat(result.exitCode()).as(result.err()).isZero();
    assertThat(result.out()).contains(" per call", "all 8 values are doubles");
    assertThat(result.out()).containsPattern("DECISION: (recursive|exact) is the fastest");
  }

  @Test
  void whatDoesNotFitInMemoryIsOneSentence() throws IOException {
    Files.writeString(directory.resolve("many.txt"), "1 2 3 4 5 6 7 8\n".repeat(300_000));
    Program.Result result =
        Program.in(directory)
            .withJvmOptions("-Xmx24m")
            .run("weigh", "many.txt", "--task", "sum", "--no-timing");
    assertThat(result.exitCode()).as(result.err()).isEqualTo(2);
    assertThat(result.err().lines().toList()).hasSize(1);
    assertThat(result.err()).contains("many.txt does not fit in the ", "-Xmx2g");
  }

  @Test
  void aPlanTakesFilesBesideFamiliesAndRunsAgainFromItsRunFolder() throws IOException {
    Files.createDirectory(directory.resolve("plans"));
    Files.writeString(directory.resolve("plans/few.csv"), "t,kg\na,0.1\nb,1e9\nc,-1e9\n");
    Files.writeString(
        directory.resolve("plans/own.toml"),
        """
        [[weigh]]
        task = "sum"
        families = ["same-sign"]
        files = ["few.csv"]
        columns = ["kg"]
        sizes = [10]
        candidates = ["recursive", "exact"]
        """);
    Program program = Program.in(directory);
    Program.Result result = program.run("run", "plans/own.toml", "--no-timing", "--out", "one");
    assertThat(result.exitCode()).as(result.err()).isZero();
    assertThat(result.err()).contains("few.csv, column kg: 1 of 3 values are no doubles");
    assertThat(Files.readString(directory.resolve("one/errors.csv")))
        .contains("sum/file-few-kg/n3/r1", "sum/same-sign/n10/r3");
    Program.Result again = program.run("run", "one/plan.toml", "--out", "two");
    assertThat(again.exitCode()).as(again.err()).isZero();
    assertThat(directory.resolve("two/errors.csv"))
        .hasSameBinaryContentAs(directory.resolve("one/errors.csv"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "bad.csv --task sum --column kg; bad.csv:3:4: 'NaN' is not finite",
        "bad.csv --task sum; bad.csv:3:4: 'NaN' is not finite",
        "bad.csv --task sum --column kgs; did you mean 'kg'?",
        "missing.csv --task sum; there is no file missing.csv",
        "bad.csv --task summ; did you mean 'sum'?",
        "bad.csv; --task",
        "few.txt --task sum --candidates recursiv; did you mean 'recursive'?",
        "few.txt --task sum --timeout-ms 0; --timeout-ms must be at least 1",
        "few.txt --task solve; task solve takes a matrix 'a' and a vector 'b'",
        "empty.txt --task sum; empty.txt holds no number",
        "singular.mtx few.txt --task solve; singular.mtx and few.txt: the matrix is singular",
        "pattern.mtx few.txt --task solve; pattern.mtx:1:1: a matrix of the kind 'pattern'"
      })
  void badInputGetsOneSentence(String arguments, String mentioned) throws IOException {
    Files.writeString(directory.resolve("bad.csv"), "t,kg\na,1\nb, NaN\n");
    Files.writeString(directory.resolve("few.txt"), "1 2");
    Files.writeString(directory.resolve("empty.txt"), "");
    Files.writeString(
        directory.resolve("singular.mtx"),
        "%%MatrixMarket matrix array real general\n2 2\n1 1 1 1");
    Files.writeString(
        directory.resolve("pattern.mtx"), "%%MatrixMarket matrix coordinate pattern general\n");
    Program.Result result =
        Program.in(directory).run(("weigh " + arguments + " --no-timing").split(" ", -1));
    assertThat(result.exitCode()).as(result.out() + result.err()).isEqualTo(2);
    assertThat(result.out()).isEmpty();
    assertThat(result.err().lines().toList()).hasSize(1);
    assertThat(result.err()).startsWith("steelyard: ").contains(mentioned.strip());
  }

  private Program.Result weigh(String example, String... more) {
    List<String> arguments = new ArrayList<>(List.of("weigh"));
    arguments.add(EXAMPLES.resolve(example).toString());
    arguments.addAll(List.of(more));
    return Program.in(directory).run(arguments.toArray(String[]::new));
  }
}
