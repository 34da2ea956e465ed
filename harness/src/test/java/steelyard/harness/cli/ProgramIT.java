package steelyard.harness.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The program as a process: exit codes, what goes to which stream, and the help texts. */
final class ProgramIT {

  @TempDir private Path directory;
  private Program program;

  @BeforeEach
  void layOutAPlan() throws IOException {
    program = Program.in(directory);
    try (InputStream plan = ProgramIT.class.getResourceAsStream("small.toml")) {
      Files.copy(plan, directory.resolve("small.toml"));
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"list", "run", "weigh", "choose", "problems"})
  void everyCommandExplainsItself(String command) {
    Program.Result result = program.run(command, "--help");
    assertThat(result.exitCode()).isZero();
    assertThat(result.out()).startsWith("Usage: steelyard " + command).contains("--help");
    assertThat(result.err()).isEmpty();
  }

  @Test
  void theProgramNamesItsCommandsAndExitCodes() {
    Program.Result result = program.run("--help");
    assertThat(result.exitCode()).isZero();
    assertThat(result.out())
        .contains("list", "run", "choose", "problems", "0 done", "4 incomplete", "run tour");
    assertThat(program.run("--version").out()).matches("steelyard \\d+\\.\\d+\\.\\d+\\R");
  }

  @Test
  void listNamesTasksFamiliesAndCandidatesWithTheirSources() {
    Program.Result result = program.run("list");
    assertThat(result.exitCode()).isZero();
    assertThat(result.out())
        .contains(
            "sum: ", "dot: ", "solve: ", "cancelling", "neumaier", "Algorithm 4.4", "hilbert");
    Program.Result one = program.run("list", "dot");
    assertThat(one.out()).contains("dot2").doesNotContain("neumaier");
  }

  @Test
  void runWritesARunAndPrintsATableForEachTask() throws IOException {
    Program.Result result = program.run("run", "small.toml", "--no-timing", "--out", "here");
    assertThat(result.exitCode()).as(result.err()).isZero();
    assertThat(result.out()).contains("sum: ", "dot: ", "solve: ", "written to here");
    assertThat(result.err()).contains("accuracy").doesNotContain("\u001b", "\r");
    try (Stream<Path> files = Files.list(directory.resolve("here"))) {
      assertThat(files.map(file -> file.getFileName().toString()))
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
  void aRunIsNotOverwrittenUnlessAsked() throws IOException {
    program.run("run", "small.toml", "--no-timing", "--only", "sum", "--out", "here");
    byte[] before = Files.readAllBytes(directory.resolve("here/errors.csv"));

    Program.Result again =
        program.run("run", "small.toml", "--no-timing", "--only", "dot", "--out", "here");
    assertOneSentence(again, 2, "here");
    assertThat(Files.readAllBytes(directory.resolve("here/errors.csv"))).isEqualTo(before);

    Program.Result asked =
        program.run(
            "run", "small.toml", "--no-timing", "--only", "dot", "--out", "here", "--overwrite");
    assertThat(asked.exitCode()).as(asked.err()).isZero();
    assertThat(Files.readString(directory.resolve("here/errors.csv"))).doesNotContain("sum/");
  }

  @Test
  void thePlanAsExecutedRunsAgainToTheSameBytes() throws IOException {
    program.run("run", "small.toml", "--no-timing", "--seed", "99", "--out", "one");
    Program.Result again = program.run("run", "one/plan.toml", "--out", "two");
    assertThat(again.exitCode()).as(again.err()).isZero();
    assertThat(directory.resolve("two/errors.csv"))
        .hasSameBinaryContentAs(directory.resolve("one/errors.csv"));
    assertThat(Files.readString(directory.resolve("one/errors.csv"))).contains("/s99,");
  }

  @Test
  void chooseDecidesAndSaysWhyTheOthersDoNot() {
    program.run("run", "small.toml", "--no-timing", "--out", "here");
    Program.Result met =
        program.run(
            "choose",
            "here",
            "--task",
            "sum",
            "--error",
            "1e-14",
            "--condition-up-to",
            "1e10",
            "--size",
            "20",
            "--family",
            "cancelling");
    assertThat(met.exitCode()).as(met.err()).isZero();
    assertThat(met.out()).contains("DECISION", "sum2", "recursive", "sum/cancelling/k");

    Program.Result unmet =
        program.run(
            "choose",
            "here",
            "--task",
            "solve",
            "--error",
            "1e-30",
            "--condition-up-to",
            "1e12",
            "--size",
            "8");
    assertThat(unmet.exitCode()).isEqualTo(1);
    assertThat(unmet.out()).contains("Nearest miss");
  }

  @Test
  void aRequirementOfThePlanThatNobodyMeetsIsAFinding() throws IOException {
    Files.writeString(
        directory.resolve("strict.toml"),
        """
        name = "strict"
        [[weigh]]
        task = "dot"
        families = ["cancelling"]
        candidates = ["recursive"]
        conditions = [1e12]
        sizes = [50]
        [[require]]
        task = "dot"
        error = 1e-12
        condition_up_to = 1e14
        size = 50
        """);
    Program.Result result = program.run("run", "strict.toml");
    assertThat(result.exitCode()).as(result.err()).isEqualTo(1);
    assertThat(result.out()).contains("finding: no candidate of dot", "written to runs/strict");
  }

  @Test
  void problemsWritesFilesThatOthersCanRead() throws IOException {
    Program.Result result =
        program.run(
            "problems",
            "sum/cancelling/k1e12/n10/r1",
            "solve/hilbert",
            "--size",
            "5",
            "--out",
            "p");
    assertThat(result.exitCode()).as(result.err()).isZero();
    List<String> folders = result.out().lines().toList();
    assertThat(folders).hasSize(2);
    Path sum = directory.resolve(folders.get(0));
    double total =
        Files.readAllLines(sum.resolve("terms.csv")).stream()
            .skip(1)
            .mapToDouble(line -> Double.parseDouble(line.split(",", -1)[0]))
            .map(Math::abs)
            .sum();
    assertThat(total).isPositive();
    assertThat(Files.readString(directory.resolve(folders.get(1)).resolve("a.mtx")))
        .startsWith("%%MatrixMarket matrix array real general");
    assertOneSentence(program.run("problems", "solve/hilbert", "--size", "5", "--out", "p"), 2, "");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "run turo; tour",
        "run missing.toml; missing.toml",
        "run .; .",
        "run small.toml --only summ --no-timing; sum",
        "run small.toml --threads 0; --threads",
        "run small.toml --seed many; --seed",
        "run small.toml --fast; --fast",
        "run; PLAN",
        "list summ; sum",
        "weigh; FILE",
        "choose; RUN",
        "choose nowhere --task sum --error 1 --condition-up-to 1 --size 1; nowhere",
        "problems sum; sum",
        "problems summ/cancelling; sum",
        "problems sum/canceling; cancelling",
        "problems sum/cancelling --condition 0.5; condition",
        "problems sum/cancelling --condition 1e300; 1e100",
        "problems sum/cancelling --size 0; size",
        "problems sum/cancelling --repeats 0; --repeats",
        "problems sum/cancelling/k1e12/n10; sum/cancelling/k1e12/n10"
      })
  void badInputGetsOneSentence(String arguments, String mentioned) {
    assertOneSentence(program.run(arguments.split(" ", -1)), 2, mentioned);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "[[weigh]]\\ntask = \"summ\"; bad.toml:2",
        "[[weigh]]\\ntask = \"sum\"\\nfamilies = [\"canceling\"]; cancelling",
        "[[weigh]]\\ntask = \"sum\"\\ncandidates = [\"kahann\"]; kahan",
        "[[weigh]]\\ntask = \"sum\"\\nsizs = [3]; sizes",
        "[[weigh]]\\ntask = \"sum\"\\nsizes = [0]; size",
        "[[weigh]]\\ntask = \"sum\"\\nsizes = [2000000000]; size",
        "[[weigh]]\\ntask = \"sum\"\\nfamilies = [\"exp-series\"]\\nconditions = [1e30]; exp-series",
        "[[weigh]]\\ntask = \"sum\"\\nconditions = [0.5]; condition",
        "[[weigh]; bad.toml:1"
      })
  void badPlansGetOneSentence(String text, String mentioned) throws IOException {
    Files.writeString(directory.resolve("bad.toml"), text.replace("\\n", "\n"));
    assertOneSentence(program.run("run", "bad.toml", "--out", "bad"), 2, mentioned);
    assertThat(directory.resolve("bad")).doesNotExist();
  }

  @Test
  void aFolderThatCannotBeWrittenIsFoundOutBeforeTheWork() throws IOException {
    Files.writeString(directory.resolve("file"), "in the way");
    assertOneSentence(program.run("run", "small.toml", "--out", "file/run"), 2, "file/run");
    assertOneSentence(program.run("run", "small.toml", "--out", "file"), 2, "file");
    assertThat(directory.resolve("file")).hasContent("in the way");
  }

  /** A device that takes no byte stands for a full disk, where the system has one. */
  @Test
  void aFullDiskIsOneSentence() {
    Path full = Path.of("/dev/full");
    if (Files.exists(full)) {
      Program.Result result = program.run("run", "small.toml", "--no-timing", "--out", "/dev/full");
      assertOneSentence(result, 2, "/dev/full");
    }
  }

  @Test
  void anInterruptedRunKeepsWhatIsComplete() throws Exception {
    Files.writeString(
        directory.resolve("long.toml"),
        """
        name = "long"
        [[weigh]]
        task = "sum"
        families = ["cancelling"]
        conditions = [1e8]
        sizes = [100000]
        repeats = 10000
        """);
    Path err = directory.resolve("err.txt");
    Process process =
        program
            .builder("run", "long.toml", "--out", "long")
            .redirectError(err.toFile())
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .start();
    while (!Files.readString(err, StandardCharsets.UTF_8).contains("accuracy")) {
      assertThat(process.isAlive()).isTrue();
      Thread.sleep(50);
    }
    process.destroy();
    assertThat(process.waitFor()).isEqualTo(4);
    assertThat(Files.readString(err)).contains("interrupted");
    assertThat(Files.readString(directory.resolve("long/run.json")))
        .containsPattern("\"complete\"\\s*:\\s*false");
    assertThat(Files.readAllLines(directory.resolve("long/errors.csv"))).hasSizeGreaterThan(1);
    Program.Result choice =
        program.run(
            "choose",
            "long",
            "--task",
            "sum",
            "--error",
            "1e-3",
            "--condition-up-to",
            "1e10",
            "--size",
            "100000");
    assertThat(choice.exitCode()).as(choice.err()).isZero();
  }

  private static void assertOneSentence(Program.Result result, int code, String mentioned) {
    assertThat(result.exitCode()).as(result.out() + result.err()).isEqualTo(code);
    assertThat(result.out()).isEmpty();
    assertThat(result.err().lines().filter(line -> !line.startsWith("accuracy")).toList())
        .hasSize(1)
        .allSatisfy(line -> assertThat(line).startsWith("steelyard: ").contains(mentioned.strip()))
        .noneSatisfy(line -> assertThat(line).contains("Exception"));
  }
}
