package steelyard.harness.data;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DoubleTextTest {

  @ParameterizedTest
  @CsvSource({
    "0x0p0, 0, 0",
    "-0x0p0, -0.0, -0.0",
    "0x1p0, 1, 1.0000000000000000e0",
    "-0x1.8p1, -3, -3.0000000000000000e0",
    "0x1.999999999999ap-4, 0.1, 1.0000000000000001e-1",
    "0x1.3333333333334p-2, 0.30000000000000004, 3.0000000000000004e-1",
    "0x1.f4p9, 1000, 1.0000000000000000e3",
    "0x1.388p13, 1e4, 1.0000000000000000e4",
    "0x1.52d02c7e14af6p76, 1e23, 9.9999999999999992e22",
    "0x1p-1074, 5e-324, 4.9406564584124654e-324",
    "0x1.fffffffffffffp1023, 1.7976931348623157e308, 1.7976931348623157e308",
    "NaN, NaN, NaN",
    "Infinity, Infinity, Infinity",
    "-Infinity, -Infinity, -Infinity"
  })
  void isSpelledOutOneWay(double value, String shortest, String full) {
    assertThat(DoubleText.shortest(value)).isEqualTo(shortest);
    assertThat(DoubleText.full(value)).isEqualTo(full);
  }

  @Test
  void readsBackAsTheSameDouble() {
    SplittableRandom random = new SplittableRandom(20);
    for (int i = 0; i < 2_000; i++) {
      double value = Double.longBitsToDouble(random.nextLong());
      if (Double.isFinite(value)) {
        assertThat(Double.parseDouble(DoubleText.shortest(value))).isEqualTo(value);
        assertThat(Double.parseDouble(DoubleText.full(value))).isEqualTo(value);
        assertThat(DoubleText.shortest(value).length())
            .isLessThanOrEqualTo(DoubleText.full(value).length());
      }
    }
  }

  @ParameterizedTest
  @CsvSource({
    "1, 5, 1.0000e0",
    "12345.678, 5, 1.2346e4",
    "99999.5, 5, 1.0000e5",
    "-0.00012, 1, -1e-4",
    "1E+400, 3, 1.00e400",
    "0E-7, 3, 0"
  })
  void printsAsManyDigitsAsAskedFor(BigDecimal value, int digits, String text) {
    assertThat(DoubleText.scientific(value, digits)).isEqualTo(text);
  }

  @Test
  void isTheSameInEveryLocale() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-SA-u-nu-arab"));
      assertThat(DoubleText.full(-0.1)).isEqualTo("-1.0000000000000001e-1");
    } finally {
      Locale.setDefault(before);
    }
  }
}
