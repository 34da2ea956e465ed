package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThat;
import static steelyard.harness.input.Refusal.assertRefused;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class MatrixMarketFileTest {

  private static final String GENERAL = "%%MatrixMarket matrix coordinate real general\n";
  private static final String SYMMETRIC = "%%MatrixMarket matrix coordinate real symmetric\n";
  private static final String SKEW = "%%MatrixMarket matrix coordinate integer skew-symmetric\n";

  @TempDir private Path folder;

  /**
   * The 5 by 5 matrix that the format's authors show in coordinate form: Boisvert, Pozo and
   * Remington, NISTIR 5935, 1996 (its values from memory).
   */
  @Test
  void aCoordinateMatrixBecomesDense() {
    Grid grid =
        read(
            GENERAL
                + "% A 5x5 sparse matrix with 8 nonzeros\n\n5 5 8\n1 1 1.000e+00\n2 2 1.050e+01\n"
                + "3 3 1.500e-02\n1 4 6.000e+00\n4 2 2.505e+02\n4 4 -2.800e+02\n4 5 3.332e+01\n"
                + "5 5 1.200e+01\n");
    assertThat(grid.rows())
        .isDeepEqualTo(
            new double[][] {
              {1, 0, 0, 6, 0},
              {0, 10.5, 0, 0, 0},
              {0, 0, 0.015, 0, 0},
              {0, 250.5, 0, -280, 33.32},
              {0, 0, 0, 0, 12}
            });
    assertThat(grid.inexact().values()).isEqualTo(8);
    assertThat(grid.inexact().count()).isEqualTo(2);
    assertThat(grid.inexact().first().orElseThrow()).contains("'1.500e-02'", "a.mtx:7:5");
  }

  @Test
  void anArrayComesColumnByColumn() {
    Grid grid = read("%%MatrixMarket MATRIX Array Real General\n% loads\n2 3\n1\n2\n3 4\n5\n6\n");
    assertThat(grid.rows()).isDeepEqualTo(new double[][] {{1, 3, 5}, {2, 4, 6}});
  }

  @Test
  void symmetricMatricesAreFilledUp() {
    assertThat(read(SYMMETRIC + "2 2 2\n1 1 4\n2 1 -3\n").rows())
        .isDeepEqualTo(new double[][] {{4, -3}, {-3, 0}});
    assertThat(read("%%MatrixMarket matrix array integer symmetric\n2 2\n1 2 3\n").rows())
        .isDeepEqualTo(new double[][] {{1, 2}, {2, 3}});
  }

  @Test
  void skewSymmetricMatricesAreFilledUpWithTheOtherSign() {
    assertThat(read(SKEW + "3 3 2\n2 1 5\n3 2 -6\n").rows())
        .isDeepEqualTo(new double[][] {{0, -5, 0}, {5, 0, 6}, {0, -6, 0}});
    assertThat(read("%%MatrixMarket matrix array real skew-symmetric\n3 3\n1\n2\n3\n").rows())
        .isDeepEqualTo(new double[][] {{0, -1, -2}, {1, 0, -3}, {2, 3, 0}});
  }

  @Test
  void aSingleRowOrColumnIsAVector() {
    String array = "%%MatrixMarket matrix array real general\n";
    assertThat(DataReader.vector(write(array + "3 1\n1\n2\n3\n")).values())
        .containsExactly(1, 2, 3);
    assertThat(DataReader.vector(write(array + "1 2\n1\n2\n")).values()).containsExactly(1, 2);
    assertRefused(
        () -> DataReader.vector(write(array + "2 2\n1 2 3 4\n")),
        "a matrix of 2 by 2, where a vec");
    assertRefused(
        () -> DataReader.matrix(TextFiles.write(folder, "a.txt", "1")), "a.txt cannot be a matrix");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "`` | a.mtx:1:1: a Matrix Market file starts with '%%MatrixMarket matrix'",
        "1 2 3 | a.mtx:1:1: a Matrix Market file starts with",
        "%%MatrixMarket matrix coordinate real | a.mtx:1:1: the first line has 4 words",
        "%%MatrixMarket vector coordinate real general | 'vector' is out of place",
        "%%MatrixMarket matrix sparse real general | 'sparse' is out of place",
        "%%MatrixMarket matrix coordinate pattern general | kind 'pattern' holds no values; real or",
        "%%MatrixMarket matrix coordinate pattern symmetric | 'pattern' holds no values",
        "%%MatrixMarket matrix coordinate complex general | 'complex' holds complex numbers",
        "%%MatrixMarket matrix coordinate complex hermitian | 'complex' holds complex numbers",
        "%%MatrixMarket matrix array real hermitian | 'hermitian' holds complex numbers",
        "%%MatrixMarket matrix array double general | 'double' is out of place"
      })
  void otherKindsAreRefused(String text, String sentence) {
    assertRefused(() -> read(text + "\n"), sentence);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "`` | a.mtx:1:1: the file ends here, where the number of rows must follow",
        "2 | a.mtx:2:2: the number of columns is missing here",
        "2 2 | a.mtx:2:4: the number of entries is missing here",
        "0 2 1 | a.mtx:2:1: the number of rows must be a whole number from 1 to 10000000, found '0'",
        "4000 4000 1 | a.mtx:2:6: a matrix of 4000 by 4000 has too many entries",
        "2 2 5 | a.mtx:2:5: the number of entries must be a whole number from 0 to 4, found '5'",
        "2 2 1 7 | a.mtx:2:7: '7' is one word too many on this line",
        "2 2 1\\n3 1 5 | a.mtx:3:1: a row must be a whole number from 1 to 2, found '3'",
        "2 2 1\\n1 0 5 | a.mtx:3:3: a column must be a whole number from 1 to 2, found '0'",
        "2 2 1\\n1.0 1 5 | a.mtx:3:1: a row must be a whole number from 1 to 2, found '1.0'",
        "2 2 2\\n1 2 5\\n1 2 6 | a.mtx:4:1: the entry (1, 2) stands here again",
        "2 2 1\\n1 2 | a.mtx:3:4: the value of the entry (1, 2) is missing here",
        "2 2 1\\n1 2 3 4 | a.mtx:3:7: '4' is one word too many on this line",
        "2 2 1\\n1 2 NaN | a.mtx:3:5: 'NaN' is not finite",
        "2 2 1\\n1 2 1,5 | a.mtx:3:5: '1,5' has a decimal comma",
        "2 2 2\\n1 2 3 | a.mtx:3:6: the file ends here, where entry 2 of 2 must follow",
        "2 2 1\\n1 2 3\\n2 2 4 | a.mtx:4:1: the matrix is complete, but there is more"
      })
  void whatIsWrongInACoordinateMatrixIsSaidWithItsPlace(String text, String sentence) {
    assertRefused(() -> read(GENERAL + text.replace("\\n", "\n")), sentence);
  }

  @Test
  void whatIsWrongInOtherFormsIsSaidWithItsPlace() {
    assertRefused(() -> read(SYMMETRIC + "2 3 0\n"), "a.mtx:2:3: a symmetric matrix is square");
    assertRefused(
        () -> read(SYMMETRIC + "2 2 1\n1 2 3\n"),
        "a.mtx:3:1: a symmetric matrix stores what lies on or below the diagonal");
    assertRefused(
        () -> read(SKEW + "2 2 1\n1 1 3\n"),
        "a.mtx:3:1: a skew-symmetric matrix stores what lies below the diagonal");
    String array = "%%MatrixMarket matrix array real general\n";
    assertRefused(
        () -> read(array + "2 1\n1\n"), "a.mtx:3:2: the file ends here, where the entry (2");
    assertRefused(() -> read(array + "2 1\n1\n2\n3\n"), "a.mtx:5:1: the matrix is complete");
  }

  private Grid read(String text) {
    return DataReader.matrix(write(text));
  }

  private Path write(String text) {
    return TextFiles.write(folder, "a.mtx", text);
  }
}
