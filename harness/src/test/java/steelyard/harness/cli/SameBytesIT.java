package steelyard.harness.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The same plan and seed give the same bytes, whatever the surroundings. */
final class SameBytesIT {

  @TempDir private Path directory;
  private byte[] expected;

  @BeforeEach
  void runOnce() throws IOException {
    try (InputStream plan = SameBytesIT.class.getResourceAsStream("small.toml")) {
      Files.copy(plan, directory.resolve("small.toml"));
    }
    expected = errors(Program.in(directory), "first", "1");
  }

  @Test
  void onAnyNumberOfThreads() throws IOException {
    assertThat(errors(Program.in(directory), "two", "2")).isEqualTo(expected);
    assertThat(errors(Program.in(directory), "five", "5")).isEqualTo(expected);
  }

  @ParameterizedTest
  @CsvSource({"tr, TR, Asia/Kathmandu", "ar, EG, America/St_Johns", "hi, IN, Pacific/Kiritimati"})
  void underAnyLocaleAndTimeZone(String language, String country, String zone) throws IOException {
    Program elsewhere =
        Program.in(directory)
            .withJvmOptions(
                "-Duser.language=" + language,
                "-Duser.country=" + country,
                "-Duser.extensions=u-nu-" + ("hi".equals(language) ? "deva" : "arab"),
                "-Duser.timezone=" + zone);
    assertThat(errors(elsewhere, "elsewhere", "2")).isEqualTo(expected);
  }

  /**
   * Every JDK, 17 or newer, that lies beside the one that runs this test; on some machines none.
   */
  @Test
  void onEveryJdkOfThisMachine() throws IOException {
    int run = 0;
    for (Path java : otherJavas()) {
      run++;
      assertThat(errors(Program.in(directory).withJava(java), "jdk" + run, "2"))
          .as("errors.csv of %s", java)
          .isEqualTo(expected);
    }
  }

  @Test
  void withoutTheCompilerAndWithoutTheInterpreter() throws IOException {
    assertThat(errors(Program.in(directory).withJvmOptions("-Xint"), "interpreted", "2"))
        .isEqualTo(expected);
    assertThat(
            errors(Program.in(directory).withJvmOptions("-XX:TieredStopAtLevel=1"), "quick", "2"))
        .isEqualTo(expected);
  }

  private byte[] errors(Program program, String folder, String threads) throws IOException {
    Program.Result result =
        program.run("run", "small.toml", "--no-timing", "--threads", threads, "--out", folder);
    assertThat(result.exitCode()).as(result.err()).isZero();
    return Files.readAllBytes(directory.resolve(folder).resolve("errors.csv"));
  }

  private static List<Path> otherJavas() throws IOException {
    Path own = Path.of(System.getProperty("java.home")).toRealPath();
    try (Stream<Path> siblings = Files.list(own.getParent())) {
      return siblings
          .filter(
              home -> !home.equals(own) && Files.isDirectory(home) && !Files.isSymbolicLink(home))
          .filter(SameBytesIT::isNewEnough)
          .map(home -> home.resolve("bin/java"))
          .filter(Files::isExecutable)
          .sorted()
          .toList();
    }
  }

  private static boolean isNewEnough(Path home) {
    try {
      return Files.readAllLines(home.resolve("release")).stream()
          .filter(line -> line.startsWith("JAVA_VERSION="))
          .map(line -> line.replaceAll("[^0-9.]", "").split("\\.", -1)[0])
          .anyMatch(major -> Integer.parseInt(major) >= 17);
    } catch (IOException noJdk) {
      return false;
    }
  }
}
