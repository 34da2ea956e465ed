package steelyard.harness.export;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import java.util.StringTokenizer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.harness.data.DataDigest;
import steelyard.harness.data.PartsCopy;
import steelyard.problems.Data;

/** Whoever reads the files by their published forms gets the stored doubles, bit for bit. */
class ReadBackTest {

  @TempDir Path root;

  @Test
  void matricesAreThereToTheBitInColumnMajorOrder() throws IOException {
    Data.Matrix matrix = new Data.Matrix("a", random(3, 5));

    assertThat(sameBits(matrix, matrix("a", export(matrix).resolve("a.mtx")))).isTrue();
  }

  @Test
  void vectorsAreThereToTheBitInBothColumns() throws IOException {
    Data.Vector vector = new Data.Vector("terms", random(1, 200)[0]);
    Path file = export(vector).resolve("terms.csv");

    assertThat(Files.readString(file)).startsWith("terms_hex,terms\r\n").endsWith("\r\n");
    assertThat(sameBits(vector, new Data.Vector("terms", column(file, 0)))).isTrue();
    assertThat(sameBits(vector, new Data.Vector("terms", column(file, 1)))).isTrue();
  }

  @Test
  void answersAreThereToFiftyDigits() throws IOException {
    List<String> lines =
        Files.readAllLines(export(new Data.Vector("b", new double[] {1})).resolve("answer.csv"));

    assertThat(new BigDecimal(lines.get(1)).toPlainString()).isEqualTo("0." + "3".repeat(50));
    assertThat(lines.subList(2, 4)).containsExactly("-2.5" + "0".repeat(48) + "e0", "0");
  }

  @Test
  void theDescriptionNamesTheDataAndItsFiles() throws IOException {
    Data.Vector vector = new Data.Vector("b", new double[] {1, 2});
    Path folder = export(vector);
    JsonNode description = new ObjectMapper().readTree(folder.resolve("problem.json").toFile());

    assertThat(description.get("data_digest").textValue())
        .isEqualTo(DataDigest.of(List.of(vector)));
    assertThat(description.get("condition").doubleValue()).isEqualTo(987.5);
    assertThat(description.get("files"))
        .allSatisfy(name -> assertThat(folder.resolve(name.textValue())).exists());
  }

  private Path export(Data.Part part) {
    return new ProblemExport(root, false)
        .write(Depot.exported("solve/depot/r1", new Depot(List.of(part), 987.5)));
  }

  private static Data.Matrix matrix(String name, Path file) throws IOException {
    List<String> lines = Files.readAllLines(file);
    assertThat(lines.get(0)).isEqualTo("%%MatrixMarket matrix array real general");
    StringBuilder body = new StringBuilder();
    lines.stream().filter(line -> !line.startsWith("%")).forEach(l -> body.append(l).append(' '));
    StringTokenizer tokens = new StringTokenizer(body.toString());
    int rowCount = Integer.parseInt(tokens.nextToken());
    int columns = Integer.parseInt(tokens.nextToken());
    double[][] rows = new double[rowCount][columns];
    for (int k = 0; k < rowCount * columns; k++) {
      rows[k % rowCount][k / rowCount] = Double.parseDouble(tokens.nextToken());
    }
    assertThat(tokens.hasMoreTokens()).isFalse();
    return new Data.Matrix(name, rows);
  }

  private static double[] column(Path csv, int column) throws IOException {
    return Files.readAllLines(csv).stream()
        .skip(1)
        .map(line -> column == 0 ? line.substring(0, line.indexOf(',')) : afterComma(line))
        .mapToDouble(Double::parseDouble)
        .toArray();
  }

  private static String afterComma(String line) {
    return line.substring(line.indexOf(',') + 1);
  }

  /** Finite doubles of every magnitude, with both zeros and the extremes among them. */
  private static double[][] random(int rowCount, int columns) {
    SplittableRandom random = new SplittableRandom(11);
    double[][] rows = new double[rowCount][columns];
    for (double[] row : rows) {
      for (int j = 0; j < columns; j++) {
        double value = Double.longBitsToDouble(random.nextLong());
        row[j] = Double.isFinite(value) ? value : -Double.MAX_VALUE;
      }
    }
    rows[0][0] = -0.0;
    rows[0][1] = 0.0;
    rows[0][2] = -Double.MIN_VALUE;
    rows[0][3] = Double.MAX_VALUE;
    return rows;
  }

  private static boolean sameBits(Data.Part left, Data.Part right) {
    return PartsCopy.sameBits(List.of(left), List.of(right));
  }
}
