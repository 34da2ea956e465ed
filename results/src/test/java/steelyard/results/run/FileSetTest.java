package steelyard.results.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FileSetTest {
  private static final String LONG = "x".repeat(1 << 20);

  @TempDir Path folder;

  @Test
  void allAppear() throws IOException {
    new FileSet()
        .add("a", writer -> writer.write("1"))
        .add("b", writer -> writer.write(LONG))
        .write(folder);
    assertThat(folder.resolve("a")).hasContent("1");
    assertThat(folder.resolve("b")).hasContent(LONG);
    assertNames("a", "b");
  }

  @Test
  void aFailureHalfWayLeavesTheOldFilesAndNothingElse() throws IOException {
    new FileSet()
        .add("a", writer -> writer.write("old a"))
        .add("b", writer -> writer.write("old b"))
        .write(folder);
    FileSet failing =
        new FileSet()
            .add("a", writer -> writer.write("new a"))
            .add(
                "b",
                writer -> {
                  writer.write(LONG);
                  throw new IOException("No space left on device");
                })
            .add("c", writer -> writer.write("new c"));
    assertThatThrownBy(() -> failing.write(folder))
        .isInstanceOf(IOException.class)
        .hasMessage("No space left on device");
    assertThat(folder.resolve("a")).hasContent("old a");
    assertThat(folder.resolve("b")).hasContent("old b");
    assertNames("a", "b");
  }

  @Test
  void anyOtherFailureToo() {
    FileSet failing =
        new FileSet()
            .add("a", writer -> writer.write("new a"))
            .add(
                "b",
                writer -> {
                  throw new IllegalStateException("a defect");
                });
    assertThatThrownBy(() -> failing.write(folder)).isInstanceOf(IllegalStateException.class);
    assertThat(folder).isEmptyDirectory();
  }

  private void assertNames(String... names) throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      assertThat(files.map(file -> file.getFileName().toString())).containsExactlyInAnyOrder(names);
    }
  }
}
