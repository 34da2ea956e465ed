package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Each mistake gets one sentence with its place. The sentences stand in a table of their own. */
class PlanErrorsTest {

  private final PlanReader reader = new PlanReader(Catalogues.SMALL);

  @ParameterizedTest
  @CsvFileSource(
      resources = "plan-errors.csv",
      delimiter = '|',
      quoteCharacter = '`',
      numLinesToSkip = 1)
  void isOneSentenceWithItsPlace(String toml, String sentence) {
    String text = toml == null ? "" : toml.replace("SUM", "[[weigh]];task = \"sum\"");

    assertThatThrownBy(() -> reader.read("p.toml", text.replace(';', '\n')))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage(sentence);
  }

  @Test
  void countsProblemsBeforeMakingThem() {
    String sizes =
        IntStream.range(10, 80).mapToObj(Integer::toString).collect(Collectors.joining(", "));

    assertThatThrownBy(
            () ->
                reader.read(
                    "p.toml", "[[weigh]]\ntask = 'sum'\nrepeats = 10000\nsizes = [" + sizes + "]"))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage("p.toml:1:1: the plan asks for 5600000 problems, of at most 1000000");
  }

  @Test
  void refusesNestingThatWouldExhaustTheStack() {
    assertThatThrownBy(() -> reader.read("p.toml", "a = " + "[".repeat(100_000)))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage("p.toml: this is no plan: it nests too deep, or a number has too many digits");
  }

  @Test
  void refusesDottedKeysThatWouldExhaustTheStack() {
    assertThatThrownBy(() -> reader.read("p.toml", "x.".repeat(100_000) + "x = 1"))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage("p.toml: this is no plan: it nests too deep, or a number has too many digits");
  }

  @Test
  void findsKeysHoweverTheyAreSpelled() {
    assertThatThrownBy(() -> reader.read("p", "[[weigh]]\n\n  \"task\" = 'sum'\n 'sizes'=[0]"))
        .hasMessageStartingWith("p:4:2: ");
    assertThatThrownBy(
            () -> reader.read("p", "[[ weigh ]]\ntask = 'sum'\nsizes . cancelling = [0]"))
        .hasMessageStartingWith("p:3:1: ");
  }
}
