package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThat;
import static steelyard.harness.input.Refusal.assertRefused;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Plain text, and what holds for every text file: encoding, line ends, compression, limits. */
final class PlainTextTest {

  @TempDir private Path folder;

  @Test
  void numbersAreSeparatedByWhiteSpaceAndCommentsDoNotCount() {
    Path file = write("# loads\n1 2.5\t0x1.8p3 # three\r\n\n -4\r5");
    Column column = DataReader.vector(file);
    assertThat(column.values()).containsExactly(1, 2.5, 12, -4, 5);
    assertThat(column.inexact()).isEqualTo(new Inexact(5, 0, 0, java.util.Optional.empty()));
  }

  @Test
  void roundedValuesAreCountedAndTheFirstIsNamed() {
    Inexact inexact = DataReader.vector(write("0.5 7\n3  0.1 0.2 1e-310\n")).inexact();
    assertThat(inexact.values()).isEqualTo(6);
    assertThat(inexact.count()).isEqualTo(3);
    assertThat(inexact.belowNormal()).isEqualTo(1);
    assertThat(inexact.first()).hasValue("'0.1' at " + folder.resolve("loads.txt") + ":2:4");
  }

  @Test
  void errorsHaveALineAndAColumn() {
    assertRefused(
        () -> DataReader.vector(write("1 2\n3 x4\n")), "loads.txt:2:3: 'x4' is no number");
    assertRefused(() -> DataReader.vector(write("1\n\n   NaN\n")), "loads.txt:3:4: 'NaN' is not");
    assertRefused(() -> DataReader.vector(write("3,14")), "loads.txt:1:1: '3,14' has a decimal");
    assertRefused(() -> DataReader.vector(write("1, 2, 3")), "loads.txt:1:1: '1,' ends in a separ");
  }

  @Test
  void aFileWithoutNumbersIsRefused() {
    assertRefused(() -> DataReader.vector(write("")), "loads.txt holds no number");
    assertRefused(() -> DataReader.vector(write("# nothing\n\n")), "loads.txt holds no number");
  }

  @Test
  void whatIsNoReadableFileIsRefused() {
    assertRefused(() -> DataReader.vector(folder.resolve("gone.txt")), "there is no file");
    assertRefused(() -> DataReader.vector(folder), "is a directory");
  }

  @Test
  void whatIsNoUtf8TextIsRefused() {
    byte[] latin = "1 2\n3 \u00e9".getBytes(StandardCharsets.ISO_8859_1);
    assertRefused(() -> DataReader.vector(write(latin)), "not UTF-8");
    byte[] wide = "1 2".getBytes(StandardCharsets.UTF_16LE);
    assertRefused(() -> DataReader.vector(write(wide)), "loads.txt:1:2: there is a zero byte");
  }

  @Test
  void aByteOrderMarkIsSkipped() {
    assertThat(DataReader.vector(write("\uFEFF1 2")).values()).containsExactly(1, 2);
  }

  @Test
  void gzipIsFoundOutByItsContentWhateverTheName() {
    Path named = TextFiles.writePacked(folder, "loads.txt.gz", "1 2 3");
    Path unnamed = TextFiles.writePacked(folder, "loads.dat", "1 2 3");
    assertThat(DataReader.vector(named).values()).containsExactly(1, 2, 3);
    assertThat(DataReader.vector(unnamed).values()).containsExactly(1, 2, 3);
    assertThat(DataReader.vector(TextFiles.write(folder, "plain.gz", "4")).values())
        .containsExactly(4);
  }

  @Test
  void aDamagedGzipFileIsRefused() throws IOException {
    byte[] whole = Files.readAllBytes(TextFiles.writePacked(folder, "whole.gz", "1 2 3 4 5 6 7 8"));
    byte[] cut = Arrays.copyOf(whole, whole.length - 9);
    assertRefused(() -> DataReader.vector(write(cut)), "is no whole gzip file");
    whole[whole.length - 6] ^= 1;
    assertRefused(() -> DataReader.vector(write(whole)), "is no whole gzip file");
    assertRefused(() -> DataReader.vector(write(new byte[] {0x1F, (byte) 0x8B})), "no whole gzip");
  }

  @Test
  void gigantismIsRefusedWhereItIsFound() {
    String line = " ".repeat(Lines.MAX_LINE + 1);
    assertRefused(() -> DataReader.vector(write("1\n" + line)), "loads.txt:2:1048577: the line is");
    String numbers = ("1 ".repeat(1000) + "\n").repeat(NumberList.MAX_NUMBERS / 1000);
    Path most = TextFiles.writePacked(folder, "most.gz", numbers);
    assertThat(DataReader.vector(most).values()).hasSize(NumberList.MAX_NUMBERS);
    Path more = TextFiles.writePacked(folder, "more.gz", numbers + "7");
    assertRefused(() -> DataReader.vector(more), "more.gz:10001:1: this is number 10000001, of at");
  }

  private Path write(String text) {
    return TextFiles.write(folder, "loads.txt", text);
  }

  private Path write(byte[] bytes) {
    return TextFiles.write(folder, "loads.txt", bytes);
  }
}
