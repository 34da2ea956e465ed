package steelyard.results.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ScientificTest {
  @ParameterizedTest
  @CsvSource({
    "0, 0",
    "-0.0, 0",
    "1, 1.00000e+00",
    "-1, -1.00000e+00",
    "1.110223e-16, 1.11022e-16",
    "123456.5, 1.23456e+05", // a tie of the exact value: half to even
    "123457.5, 1.23458e+05",
    "999999.5, 1.00000e+06",
    "1e100, 1.00000e+100",
    "4.9e-324, 4.94066e-324",
    "1.7976931348623157e308, 1.79769e+308",
    "Infinity, INF",
    "-Infinity, -INF",
    "NaN, NaN"
  })
  void sixDigits(double value, String text) {
    assertThat(Scientific.text(value)).isEqualTo(text);
  }

  @Test
  void oneDigitHasNoPoint() {
    assertThat(Scientific.text(0.00017, 1)).isEqualTo("2e-04");
    assertThatThrownBy(() -> Scientific.text(1, 0)).hasMessageContaining("at least one digit");
  }

  @Test
  void printedTextComesBackAsItself() {
    SplittableRandom random = new SplittableRandom(20260301);
    for (int i = 0; i < 20_000; i++) {
      String text = Scientific.text(Double.longBitsToDouble(random.nextLong()));
      assertThat(Scientific.text(Scientific.parse(text))).isEqualTo(text);
    }
    for (int i = 1; i < 2000; i++) {
      String text = Scientific.text(i * Double.MIN_VALUE);
      assertThat(Scientific.text(Scientific.parse(text))).isEqualTo(text);
    }
  }
}
