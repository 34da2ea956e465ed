package steelyard.harness.bring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.algorithms.dot.DotProduct;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.sum.Summation;
import steelyard.algorithms.sum.Summations;
import steelyard.harness.plan.Addition;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;

/** Functions in shared libraries, compiled here; they are called on JDK 22 and newer alone. */
class NativeFunctionTest {
  private static final String SOURCE =
      """
      double total(const double *terms, long count) {
        double sum = 0;
        for (long i = 0; i < count; i++) sum += terms[i];
        return sum;
      }
      double inner(double *x, double *y, int count) {
        double sum = 0;
        for (int i = 0; i < count; i++) sum += x[i] * y[i];
        return sum;
      }
      void first(double *a, double *b, double *x, long count) { x[0] = b[0]; }
      void diagonal(double *a, double *b, double *x, long count) {
        for (long i = 0; i < count; i++) x[i] = b[i] / a[i * count + i];
      }
      """;

  @TempDir private Path folder;

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "sum | native: libx.so | must look like native: libfoo.so!foo_sum(double*, long)",
        "sum | native: libx.so!f(double*, unsigned long) | function f does not fit",
        "sum | native: libx.so!f(double*, long double) | function f does not fit",
        "sum | native: libx.so!f(double**, long) | function f does not fit",
        "sum | native: libx.so!f(double, long) | function f does not fit",
        "sum | native: libx.so!f(long, double*) | function f does not fit",
        "sum | native: libx.so!f() | function f does not fit",
        "sum | native: libx.so!f(float*, long) | function f does not fit: the task needs double"
            + " f(double*, long), the number of entries as long or int",
        "dot | native: libx.so!f(double*, int) | function f does not fit: the task needs double"
            + " f(double*, double*, int), the number of entries as long or int",
        "solve | native: libx.so!f(double*, double*, long) | function f does not fit: the task needs"
            + " void f(double*, double*, double*, long), the number of entries as long or int,"
            + " matrices row by row, the answer before it",
      })
  void saysWhatTheTaskNeeds(String task, String use, String sentence) {
    assertThatThrownBy(() -> kernel(task, use))
        .isInstanceOf(BringException.class)
        .hasMessageContaining(sentence);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "f(double*, long)",
        "f( const double *terms , long n )",
        "f(double const * restrict terms, const int n)",
        "f(const double terms[], int)",
        "f(double[], long count)"
      })
  void readsAFunctionAsItStandsInAHeader(String function) throws IOException {
    Path library = Files.writeString(folder.resolve("libx.so"), "any");
    String use = "native: " + library + "!" + function;
    Signature sum = Signature.of(Summation.class);
    if (Runtime.version().feature() < 22) {
      // What does not fit is said before that.
      assertThatThrownBy(() -> NativeFunction.parse(use, sum))
          .hasMessageContaining("needs JDK 22 or newer");
    } else {
      assertThat(NativeFunction.parse(use, sum))
          .isEqualTo(new NativeFunction(library, "f", function.contains("long")));
    }
  }

  @Test
  void whatAFunctionLeavesOutIsNoAnswer() throws Exception {
    assumeTrue(Runtime.version().feature() >= 22);
    String use = "native: " + library() + "!first(double*, double*, double*, long)";
    LinearSolver first = (LinearSolver) kernel("solve", use);
    assertThat(first.solve(new double[][] {{2, 9}, {9, 4}}, new double[] {1, 1}))
        .containsExactly(1, Double.NaN);
  }

  @Test
  void saysThatAnOlderJdkCannot() {
    assumeTrue(Runtime.version().feature() < 22);
    assertThatThrownBy(() -> kernel("sum", "native: libx.so!f(double*, long)"))
        .hasMessage(
            "a function in a shared library needs JDK 22 or newer, and this is JDK "
                + Runtime.version().feature());
  }

  @Test
  void callsFunctionsOfEveryTask() throws Exception {
    assumeTrue(Runtime.version().feature() >= 22);
    String library = library();
    Summation total =
        (Summation) kernel("sum", "native: " + library + "!total(const double*, long)");
    DotProduct inner =
        (DotProduct) kernel("dot", "native: " + library + "!inner(double *, double[], int)");
    LinearSolver diagonal =
        (LinearSolver)
            kernel("solve", "native: " + library + "!diagonal(double*, double*, double*, long)");
    Random random = new Random(6);
    for (int n = 0; n < 30; n++) {
      double[] terms = random.doubles(n, -1, 1).toArray();
      assertThat(total.sum(terms)).isEqualTo(Summations.all().get(0).kernel().sum(terms));
    }
    assertThat(inner.dot(new double[] {1, 2}, new double[] {3, 4})).isEqualTo(11);
    assertThat(diagonal.solve(new double[][] {{2, 9}, {9, 4}}, new double[] {1, 1}))
        .containsExactly(0.5, 0.25);
    assertThatThrownBy(() -> kernel("sum", "native: " + library + "!none(double*, long)"))
        .hasMessage("the library libscale.so has no function none");
    assertThatThrownBy(
            () -> kernel("sum", "native: " + folder.resolve("no.so") + "!f(double*, long)"))
        .hasMessage("there is no shared library '" + folder.resolve("no.so") + "'");
  }

  private String library() throws IOException, InterruptedException {
    Path source = folder.resolve("scale.c");
    Path library = folder.resolve("libscale.so");
    Files.writeString(source, SOURCE);
    boolean compiled = false;
    try {
      compiled =
          new ProcessBuilder(
                      "cc", "-O2", "-shared", "-fPIC", "-o", library.toString(), source.toString())
                  .inheritIO()
                  .start()
                  .waitFor()
              == 0;
    } catch (IOException none) {
      assumeTrue(false, "there is no C compiler");
    }
    assertThat(compiled).isTrue();
    return library.toString();
  }

  private static Object kernel(String task, String use) {
    return made(Tasks.find(task).orElseThrow(), use);
  }

  private static <K> K made(Task<K, ?> task, String use) {
    return Bringing.kernel(task, new Addition(task.id(), "mine", use, List.of()), false);
  }
}
