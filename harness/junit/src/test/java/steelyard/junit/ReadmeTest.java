package steelyard.junit;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** Holds the README's assertion to the sample project, which a build compiles and runs. */
class ReadmeTest {

  private static final Path README = Path.of("../../README.md");
  private static final Path SAMPLE = Path.of("sample/src/test/java/depot/ScalesTest.java");
  private static final String OPENING = "```java\n";

  @Test
  void showsAnAssertionOfTheSample() throws IOException {
    String readme = Files.readString(README);
    int start = readme.indexOf(OPENING, readme.indexOf("\n## In your own tests\n"));
    String shown = readme.substring(start + OPENING.length(), readme.indexOf("\n```\n", start));

    assertThat(shown).startsWith("Accuracy.of(").endsWith(";");
    assertThat(Files.readString(SAMPLE)).contains("    " + shown.replace("\n", "\n    "));
  }
}
