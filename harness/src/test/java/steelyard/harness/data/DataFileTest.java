package steelyard.harness.data;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.problems.Data;

class DataFileTest {

  @TempDir Path folder;

  private Path file;

  @BeforeEach
  void name() {
    file = folder.resolve("input");
  }

  @Test
  void keepsEveryBit() throws IOException {
    DataFile.write(file, InputParts.awkward());

    assertThat(PartsCopy.sameBits(DataFile.read(file), InputParts.awkward())).isTrue();
  }

  @Test
  void keepsAnInputWithoutParts() throws IOException {
    DataFile.write(file, List.of());

    assertThat(DataFile.read(file)).isEmpty();
  }

  @Test
  void refusesAFileThatIsCutAnywhere() throws IOException {
    DataFile.write(file, InputParts.awkward());
    byte[] whole = Files.readAllBytes(file);
    for (int length = 0; length < whole.length; length++) {
      Files.write(file, Arrays.copyOf(whole, length));
      assertRefused("ends before its last part does");
    }
    Files.write(file, Arrays.copyOf(whole, whole.length + 1));
    assertRefused("goes on after its last part, at byte " + whole.length);
  }

  @Test
  void refusesAnotherFile() throws IOException {
    Files.writeString(file, "ticket,gross,tare\n");

    assertRefused("is not a data file of version 1");
  }

  @Test
  void asksForNoMoreMemoryThanTheFileCanFill() throws IOException {
    DataFile.write(file, List.of(new Data.Matrix("a", new double[][] {{1}})));
    byte[] bytes = Files.readAllBytes(file);
    int rows = 4 + 4 + 4 + 1 + 4 + 1;
    Arrays.fill(bytes, rows, rows + 8, (byte) 0x7f);
    Files.write(file, bytes);

    assertRefused("ends before its last part does");
  }

  @Test
  void refusesRaggedRows() {
    assertThatThrownBy(
            () -> DataFile.write(file, List.of(new Data.Matrix("a", new double[][] {{1}, {1, 2}}))))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("the rows of matrix 'a' must have one length");
  }

  private void assertRefused(String sentence) {
    assertThatThrownBy(() -> DataFile.read(file))
        .isExactlyInstanceOf(IOException.class)
        .hasMessageContaining(sentence);
  }
}
