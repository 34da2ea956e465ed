package steelyard.junit;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Builds the sample project as its users would, with Maven, and once more to see a test fail. */
class SampleIT {

  private static final Path README = Path.of("../../README.md");

  @Test
  void theSampleHoldsAndShowsWhatDoesNot(@TempDir Path folder) throws Exception {
    try (SampleProject sample = SampleProject.in(folder)) {
      SampleProject.Build good = sample.maven("test");
      assertThat(good.exitCode()).as(good.output()).isZero();
      assertThat(Files.readString(sample.file("target/surefire-reports/depot.ScalesTest.txt")))
          .contains("Tests run: 3, Failures: 0, Errors: 0, Skipped: 0");

      SampleProject.Build bad = sample.maven("test", "-Dgroups=faulty", "-DexcludedGroups=");
      assertThat(bad.exitCode()).as(bad.output()).isEqualTo(1);
      assertThat(bad.output())
          .contains("Tests run: 1, Failures: 1, Errors: 0, Skipped: 0")
          .contains(shownFailure());
    }
  }

  private static String shownFailure() throws Exception {
    String readme = Files.readString(README);
    int start = readme.indexOf("expected the sum 'kernel'");
    assertThat(start).isPositive();
    return readme.substring(start, readme.indexOf("\n```", start));
  }
}
