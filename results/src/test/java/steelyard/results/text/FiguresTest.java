package steelyard.results.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiguresTest {
  @ParameterizedTest
  @CsvSource({
    "1, 1.00",
    "0.0012345, 0.00123",
    "0.00099, 9.9e-04",
    "12.345, 12.3",
    "123.5, 124",
    "123456, 123456",
    "1234567, 1.2e+06",
    "0, 0",
    "Infinity, INF",
    "NaN, NaN"
  })
  void plain(double value, String text) {
    assertThat(Figures.plain(value)).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({
    "0.5, ns, 0.500",
    "999, ns, 999",
    "1000, \u00B5s, 1.00",
    "2.5e6, ms, 2.50",
    "3e9, s, 3.00"
  })
  void timesHaveAReadableUnit(double ns, String unit, String text) {
    TimeScale scale = TimeScale.forShortest(ns);
    assertThat(scale.unit()).isEqualTo(unit);
    assertThat(
            scale.interval(OptionalDouble.of(ns), OptionalDouble.empty(), OptionalDouble.empty()))
        .isEqualTo(text);
  }

  @Test
  void whatIsNotKnownIsADash() {
    OptionalDouble none = OptionalDouble.empty();
    assertThat(Figures.interval(none, none, none)).isEqualTo("-");
    assertThat(Figures.error(none)).isEqualTo("-");
  }
}
