package steelyard.harness.plan;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PlanFileErrorsTest {

  private static final String GOOD = "[[weigh]]\r\ntask = \"sum\"\r\n";

  private final PlanReader reader = new PlanReader(Catalogues.SMALL);

  @TempDir Path folder;

  @Test
  void readsAFileAndNamesThePlanAfterIt() throws IOException {
    Path file = write("moisture.toml", GOOD.getBytes(UTF_8));

    assertThat(reader.read(file).name()).isEqualTo("moisture");
    assertThat(reader.find(file.toString())).isEqualTo(reader.read(file));
  }

  @Test
  void skipsAByteOrderMark() throws IOException {
    Path file = write("p.toml", ("\uFEFF" + GOOD).getBytes(UTF_8));

    assertThat(reader.read(file).weighings()).hasSize(1);
  }

  @Test
  void countsLinesThatEndInCarriageReturns() throws IOException {
    Path file = write("p.toml", (GOOD + "\r\nsizes = [0]\r\n").getBytes(UTF_8));

    assertThatThrownBy(() -> reader.read(file)).hasMessageStartingWith(file + ":4:1: 'sizes'");
  }

  @Test
  void refusesAFileThatIsNotThere() {
    Path file = folder.resolve("none.toml");

    assertRefused(file, "there is no file " + file);
  }

  @Test
  void refusesADirectory() {
    assertRefused(folder, folder + " is a directory, where a plan is a TOML file");
  }

  @Test
  void refusesBytes() throws IOException {
    Path file = write("p.toml", new byte[] {'a', 0, 'b'});

    assertRefused(file, file + " is no text: it has a zero byte at offset 1, where a plan is TOML");
  }

  @Test
  void refusesAnotherEncoding() throws IOException {
    Path file = write("p.toml", "# Getreide für".getBytes(ISO_8859_1));

    assertRefused(file, file + " is not UTF-8, as TOML must be: see the byte at offset 12");
  }

  @Test
  void refusesAHugeFile() throws IOException {
    Path good = write("p.toml", padded(1 << 20));
    Path huge = write("q.toml", padded((1 << 20) + 1));

    assertThat(reader.read(good).weighings()).hasSize(1);
    assertRefused(huge, huge + " is larger than 1 MiB, the most that a plan may have");
  }

  private static byte[] padded(int length) {
    return (GOOD + "#".repeat(length - GOOD.length())).getBytes(UTF_8);
  }

  private void assertRefused(Path file, String sentence) {
    assertThatThrownBy(() -> reader.read(file))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage(sentence);
  }

  private Path write(String name, byte[] bytes) throws IOException {
    return Files.write(folder.resolve(name), bytes);
  }
}
