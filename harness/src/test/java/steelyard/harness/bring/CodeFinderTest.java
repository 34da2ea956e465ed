package steelyard.harness.bring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.algorithms.sum.Summation;
import steelyard.algorithms.sum.Summations;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;

class CodeFinderTest {
  private static final String LEDGER = "steelyard.harness.bring.Ledger";

  @ParameterizedTest
  @CsvSource({
    "#net, 53",
    "#net(double[]), 53",
    "#net(float[]), 24",
    "#backwards, 53",
    "$Total, 53",
    "$Total#sum, 53",
  })
  void findsWhatFits(String rest, int bits) {
    assertThat(find("sum", LEDGER + rest).precisionBits()).isEqualTo(bits);
  }

  @Test
  void aKernelGivesTheBitsOfTheMethodItCalls() {
    Summation net = kernel("#net");
    Summation total = kernel("$Total");
    Summation backwards = kernel("#backwards");
    Summation single = kernel("#net(float[])");
    Summation textbook = Summations.all().get(0).kernel();
    Random random = new Random(1);
    for (int n = 0; n < 50; n++) {
      double[] terms = random.doubles(n, -1, 1).toArray();
      double[] reversed = new double[n];
      Arrays.setAll(reversed, i -> terms[terms.length - 1 - i]);
      float[] floats = new float[n];
      for (int i = 0; i < n; i++) {
        floats[i] = (float) terms[i];
      }
      assertThat(net.sum(terms)).isEqualTo(textbook.sum(terms)).isEqualTo(total.sum(terms));
      assertThat(backwards.sum(terms)).isEqualTo(textbook.sum(reversed));
      assertThat(single.sum(terms)).isEqualTo(Ledger.net(floats));
    }
  }

  @Test
  void aSingleKernelThatKeepsItsInputGivesTheSameAnswers() {
    Summation fresh = kernel("#net(float[])");
    Summation keeping = keeping("#net(float[])");
    double[] one = {1, 2, 0x1p-30};
    double[] other = {3, 4, 5};
    for (double[] terms : new double[][] {one, one, other, one}) {
      assertThat(keeping.sum(terms)).isEqualTo(fresh.sum(terms));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "acme.Totals#net | there is no class acme.Totals; name it with its package, and give the jar"
            + " that has it",
        "Ledger# | 'steelyard.harness.bring.Ledger#' is not the name of code; it must look like"
            + " com.acme.Totals#net, a method, or com.acme.Total, a class that implements the task's"
            + " interface",
        "Ledger#nett | class steelyard.harness.bring.Ledger has no method nett; what fits is"
            + " backwards, counting, endless, exiting, halting, hoarding, nan, net, printing,"
            + " recursing, starting, throwing, writing",
        "Ledger#ofList | no method ofList of class steelyard.harness.bring.Ledger fits: a public"
            + " double ofList(double[]) or float ofList(float[]) is wanted, and there is static"
            + " double ofList(List)",
        "Ledger#rounded | no method rounded of class steelyard.harness.bring.Ledger fits: a public"
            + " double rounded(double[]) or float rounded(float[]) is wanted, and there is static int"
            + " rounded(double[])",
        "Ledger#hidden | no method hidden of class steelyard.harness.bring.Ledger fits: a public"
            + " double hidden(double[]) or float hidden(float[]) is wanted, and there is"
            + " package-private static double hidden(double[])",
        "Ledger#net(int[]) | no method net(int[]) of class steelyard.harness.bring.Ledger fits: a"
            + " public double net(double[]) or float net(float[]) is wanted, and there is",
        "Ledger | class steelyard.harness.bring.Ledger does not implement"
            + " steelyard.algorithms.sum.Summation; name a method of it as"
            + " steelyard.harness.bring.Ledger#METHOD; what fits is backwards",
        "Ledger$Abstract | class steelyard.harness.bring.Ledger$Abstract must be concrete and have a"
            + " public constructor without arguments, because it is to be used as a Summation",
        "Ledger$Abstract#half | class steelyard.harness.bring.Ledger$Abstract must be concrete and"
            + " have a public constructor without arguments, because method half is not static",
      })
  void saysWhatDoesNotFit(String code, String sentence) {
    String name = code.startsWith("acme") ? code : "steelyard.harness.bring." + code;
    assertThatThrownBy(() -> find("sum", name))
        .isInstanceOf(BringException.class)
        .hasMessageStartingWith(sentence);
  }

  @Test
  void aClassThatCannotBeInitializedIsNamed() {
    assertThatThrownBy(() -> kernel("$Broken#net").sum(new double[1]))
        .hasRootCauseInstanceOf(NumberFormatException.class);
  }

  @Test
  void aMethodForOneTaskDoesNotFitAnother() {
    assertThatThrownBy(() -> find("solve", LEDGER + "#net"))
        .hasMessageContaining(
            "a public double[] net(double[][], double[]) or float[] net(float[][]");
    assertThat(find("solve", LEDGER + "#empty").precisionBits()).isEqualTo(53);
  }

  private static FoundCode find(String task, String code) {
    return new CodeFinder(
            CodeFinderTest.class.getClassLoader(), Tasks.find(task).orElseThrow().kernelType())
        .find(CodeName.parse(code));
  }

  private static Summation kernel(String rest) {
    return made(rest, false);
  }

  private static Summation keeping(String rest) {
    return made(rest, true);
  }

  private static Summation made(String rest, boolean keepsInput) {
    @SuppressWarnings("unchecked")
    Task<Summation, ?> sum = (Task<Summation, ?>) Tasks.find("sum").orElseThrow();
    return KernelMaker.make(sum, find("sum", LEDGER + rest), keepsInput);
  }
}
