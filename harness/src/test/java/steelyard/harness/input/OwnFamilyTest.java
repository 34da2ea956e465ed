package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static steelyard.harness.input.Refusal.assertRefused;

import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.UncertifiedException;

final class OwnFamilyTest {

  private static final String MATRIX = "%%MatrixMarket matrix array real general\n";

  @TempDir private Path folder;

  @Test
  void aColumnBecomesASumWithItsOwnConditionNumber() {
    write("ledger.csv", "ticket,net kg\nT1,3\nT2,-2\nT3,-0.5\n");
    OwnFamily<?> family = read("sum", List.of("net kg"), "ledger.csv");
    Problem<?> problem = family.problem();
    assertThat(problem.condition().kappa()).isEqualTo(11);
    assertThat(answer(problem)).containsExactly(new BigDecimal("0.5"));
    assertThat(family.profile().id()).isEqualTo("file-ledger-net-kg");
    assertThat(family.size()).isEqualTo(3);
  }

  @Test
  void twoFilesOrTwoColumnsBecomeADotProduct() {
    write("x.txt", "1 2 3");
    write("y.csv", "y\n4\n5\n6\n");
    write("both.csv", "x,y\n1,4\n2,5\n3,6\n");
    assertThat(answer(read("dot", List.of(), "x.txt", "y.csv").problem()))
        .containsExactly(new BigDecimal(32));
    assertThat(answer(read("dot", List.of(), "both.csv").problem()))
        .containsExactly(new BigDecimal(32));
    assertThat(answer(read("dot", List.of("y", "y"), "both.csv").problem()))
        .containsExactly(new BigDecimal(77));
    assertThat(answer(read("dot", List.of("y", "x"), "both.csv", "both.csv").problem()))
        .containsExactly(new BigDecimal(32));
  }

  @Test
  void aMatrixAndAVectorBecomeASystem() {
    write("a.mtx", MATRIX + "2 2\n2 0\n0 4\n");
    write("b.txt", "2 2");
    Problem<?> problem = read("solve", List.of(), "a.mtx", "b.txt").problem();
    assertThat(answer(problem).get(0)).isEqualByComparingTo("1");
    assertThat(answer(problem).get(1)).isEqualByComparingTo("0.5");
  }

  @Test
  void roundedValuesOfAllFilesAreCounted() {
    write("x.txt", "0.1 0.5");
    write("y.txt", "0.2 0.3");
    Inexact inexact = read("dot", List.of(), "x.txt", "y.txt").inexact();
    assertThat(inexact.values()).isEqualTo(4);
    assertThat(inexact.count()).isEqualTo(3);
    assertThat(inexact.first().orElseThrow()).contains("x.txt:1:1");
  }

  @Test
  void whatDoesNotFitTheTaskIsRefused() {
    write("x.txt", "1 2 3");
    write("y.txt", "1 2");
    write("both.csv", "x,y\n1,4\n");
    write("a.mtx", MATRIX + "2 1\n2 0\n");
    write("square.mtx", MATRIX + "2 2\n2 0 0 1\n");
    assertRefused(
        () -> read("sum", List.of(), "x.txt", "y.txt"),
        "task sum takes a vector 'terms', in one file, found 2 files");
    assertRefused(
        () -> read("dot", List.of(), "x.txt"),
        "each in a file of its own, in this order, or all as columns of one .csv file, found 1 file");
    assertRefused(() -> read("dot", List.of("x"), "both.csv"), "task dot takes 2 columns of");
    assertRefused(() -> read("sum", List.of("x", "y"), "both.csv"), "takes 1 column of");
    assertRefused(
        () -> read("sum", List.of("x"), "x.txt"), "a column can be chosen of a .csv or .tsv file");
    assertRefused(
        () -> read("dot", List.of(), "x.txt", "y.txt").problem(), "two vectors of the same length");
    assertRefused(() -> read("solve", List.of(), "a.mtx", "y.txt"), "row 1 of a has 1 entries");
    assertRefused(() -> read("solve", List.of(), "square.mtx", "x.txt"), "a has 2 rows and b 3");
    assertRefused(() -> read("solve", List.of(), "x.txt", "y.txt"), "x.txt cannot be a matrix");
    write("big.txt", "1 ".repeat(1001));
    assertRefused(
        () -> read("solve", List.of(), "square.mtx", "big.txt"), "has size 1001, of at most 1000");
  }

  @Test
  void aSingularSystemHasNoReference() {
    write("a.mtx", MATRIX + "2 2\n1 2\n2 4\n");
    write("b.txt", "1 1");
    OwnFamily<?> family = read("solve", List.of(), "a.mtx", "b.txt");
    assertThatThrownBy(family::problem).isInstanceOf(UncertifiedException.class);
  }

  @Test
  void everyNameGivesAnIdThatAProblemMayHave() {
    assertThat(id("Ledger 2024 (Final).csv.gz")).isEqualTo("file-ledger-2024-final");
    assertThat(id("--.txt")).isEqualTo("file");
    assertThat(id("Größe.txt")).isEqualTo("file-gr-e");
    assertThat(id("x".repeat(200) + ".mtx")).hasSize(60);
  }

  private static String id(String name) {
    return new DataFiles(List.of(Path.of("data", name)), List.of()).familyId();
  }

  private static List<BigDecimal> answer(Problem<?> problem) {
    return problem.reference().answer(new MathContext(30));
  }

  private OwnFamily<?> read(String task, List<String> columns, String... names) {
    List<Path> files = List.of(names).stream().map(folder::resolve).toList();
    return read(Tasks.find(task).orElseThrow(), new DataFiles(files, columns));
  }

  private static <D extends Data> OwnFamily<D> read(Task<?, D> task, DataFiles source) {
    return OwnFamily.read(task, source);
  }

  private void write(String name, String text) {
    TextFiles.write(folder, name, text);
  }
}
