package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.HashSet;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ProblemIdTest {

  private static ProblemId id(double condition) {
    return new ProblemId("sum", "cancelling", OptionalDouble.of(condition), 1000, 3, 1);
  }

  @Test
  void textLeavesOutWhatIsDefault() {
    assertThat(id(1e12)).hasToString("sum/cancelling/k1e12/n1000/r3");
    assertThat(new ProblemId("sum", "same-sign", OptionalDouble.empty(), 10, 0, 42))
        .hasToString("sum/same-sign/n10/r0/s42");
    assertThat(new ProblemId("sum", "same-sign", OptionalDouble.empty(), 10, 0, -7))
        .hasToString("sum/same-sign/n10/r0/s-7");
  }

  @ParameterizedTest
  @CsvSource({
    "1, 1",
    "2, 2",
    "2.5, 2.5",
    "10, 1e1",
    "2500, 2.5e3",
    "1e12, 1e12",
    "1e23, 1e23",
    "123456.7, 1.23457e5",
    "1e100, 1e100",
    "1.7976931348623157e308, 1.79769e308"
  })
  void conditionTextHasSixDigitsAtMost(double condition, String text) {
    assertThat(id(condition)).hasToString("sum/cancelling/k" + text + "/n1000/r3");
  }

  @Test
  void everyIdIsReadBackFromItsText() {
    SplittableRandom random = new SplittableRandom(5);
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG"));
      for (int i = 0; i < 2000; i++) {
        double condition = Math.scalb(1 + random.nextDouble(), random.nextInt(1020));
        ProblemId id =
            new ProblemId(
                "solve",
                "two-level",
                i % 5 == 0 ? OptionalDouble.empty() : OptionalDouble.of(condition),
                1 + random.nextInt(100_000),
                random.nextInt(100),
                i % 3 == 0 ? 1 : random.nextLong());
        assertThat(ProblemId.parse(id.toString())).isEqualTo(id);
      }
    } finally {
      Locale.setDefault(before);
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "sum",
        "sum/cancelling/n1000",
        "sum/cancelling/k1E12/n1000/r3",
        "sum/cancelling/k0.5/n1000/r3",
        "sum/cancelling/k1e999/n1000/r3",
        "sum/cancelling/k1e12/n0/r3",
        "sum/Cancelling/k1e12/n10/r3",
        "sum/cancelling/k1e12/n10/r3/s99999999999999999999",
        "sum/cancelling/k1e12/n10/r3/s9999999999999999999",
        " sum/cancelling/k1e12/n10/r3"
      })
  void refusesOtherTexts(String text) {
    assertThatThrownBy(() -> ProblemId.parse(text))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageNotContaining("\n");
  }

  @ParameterizedTest
  @CsvSource({
    "sum/cancelling/k10/n10/r3, sum/cancelling/k1e1/n10/r3",
    "sum/cancelling/k1e12/n010/r3, sum/cancelling/k1e12/n10/r3",
    "sum/cancelling/k1e12/n10/r3/s1, sum/cancelling/k1e12/n10/r3",
    "sum/cancelling/k2.50e3/n10/r3, sum/cancelling/k2.5e3/n10/r3"
  })
  void saysHowATextMustBeWritten(String text, String canonical) {
    String sentence =
        text.contains("k10")
            ? "problem id '" + text + "' must look like sum/cancelling/k1e12/n1000/r3"
            : "problem id '" + text + "' must be written '" + canonical + "'";
    assertThatThrownBy(() -> ProblemId.parse(text))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(sentence);
  }

  @Test
  void refusesPartsOutOfRange() {
    assertThatThrownBy(() -> id(0.5)).hasMessageContaining("at least 1, but it is 5e-1");
    assertThatThrownBy(() -> id(Double.NaN)).hasMessageContaining("finite");
    assertThatThrownBy(() -> new ProblemId("sum", "a/b", OptionalDouble.empty(), 1, 0, 1))
        .hasMessageContaining("lower case");
    assertThatThrownBy(() -> new ProblemId("sum", "a", OptionalDouble.empty(), 1, -1, 1))
        .hasMessageContaining("repeat");
  }

  @Test
  void randomnessFollowsFromTheTextAlone() {
    ProblemId id = id(1e12);
    assertThat(id.randomness().nextLong()).isEqualTo(id.randomness().nextLong());
    Set<Long> first = new HashSet<>();
    for (int repeat = 0; repeat < 10; repeat++) {
      for (long seed = 0; seed < 10; seed++) {
        first.add(
            new ProblemId("sum", "a", OptionalDouble.empty(), 5, repeat, seed)
                .randomness()
                .nextLong());
      }
    }
    assertThat(first).hasSize(100);
    // SHA-256 of "sum/cancelling/k1e12/n1000/r3/s1" as the state of XoRoShiRo128++; a change here
    // would silently change every problem.
    assertThat(Long.toHexString(id.randomness().nextLong())).isEqualTo("b5b34ec8a6939918");
  }
}
