package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class NumberTextTest {

  private static final Place PLACE = new Place("ledger.csv", 3, 7);

  @ParameterizedTest
  @CsvSource({
    "12, 12",
    "-3e-7, -3e-7",
    "+.5, 0.5",
    "5., 5",
    "1E+2, 100",
    "0x1.8p3, 12",
    "-0X.8P1, -1",
    "0x1f, 31",
    "1e-400, 0",
    "-0, -0.0"
  })
  void decimalAndHexadecimalNumbersAreRead(String text, double value) {
    assertThat(NumberText.parse(text, PLACE)).isEqualTo(value);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "NaN | ledger.csv:3:7: 'NaN' is not finite; every number of a problem must be",
        "-Infinity | ledger.csv:3:7: '-Infinity' is not finite",
        "inf | is not finite",
        "3,14 | ledger.csv:3:7: '3,14' has a decimal comma; write a decimal point: '3.14'",
        "1d5 | ledger.csv:3:7: '1d5' has the exponent letter d; write e: '1e5'",
        "1e400 | ledger.csv:3:7: '1e400' is beyond the largest double",
        "0x1p1024 | is beyond the largest double",
        "-1e99999999999 | is beyond the largest double",
        "12kg | ledger.csv:3:7: '12kg' is no number; write it such as 12.5",
        "1.5f | is no number",
        "1 000 | is no number",
        "1'000 | is no number",
        "1.000,5 | is no number",
        "٣ | is no number",
        "'' | ledger.csv:3:7: there is nothing where a number must stand"
      },
      quoteCharacter = '`')
  void whatIsNoFiniteNumberIsRefused(String text, String sentence) {
    String given = text.equals("''") ? "" : text;
    Refusal.assertRefused(() -> NumberText.parse(given, PLACE), sentence);
  }

  @Test
  void whatWouldUpsetATerminalOrFloodItIsNot() {
    Refusal.assertRefused(() -> NumberText.parse("\u001b[31m", PLACE), "'\\u001b[31m'");
    Refusal.assertRefused(() -> NumberText.parse("9".repeat(5000), PLACE), "has 5000 characters");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "0.5",
        "-12",
        "0.375",
        "9007199254740992",
        "1e22",
        "0x1.fffffffffffffp0",
        "0x1p-1074",
        "0",
        "0.000",
        "-0e5",
        "0x0p-99999999999",
        "2e3",
        "1267650600228229401496703205376",
        "0x10000000000000000000",
        "0.50000000000000000000000000"
      })
  void aDoubleHoldsTheseExactly(String text) {
    assertThat(Exactness.isExact(text, NumberText.parse(text, PLACE))).isTrue();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "0.1",
        "1e23",
        "9007199254740993",
        "0x1.fffffffffffff8p0",
        "0x1p-1075",
        "0x1.8p-1074",
        "1e-400",
        "4.9e-324",
        "0.50000000000000000000000000001"
      })
  void aDoubleRoundsThese(String text) {
    assertThat(Exactness.isExact(text, NumberText.parse(text, PLACE))).isFalse();
  }

  /** The division of longs against the decimal expansion of the double, on short decimals. */
  @Test
  void theShortWayAgreesWithTheDefinition() {
    Random random = new Random(20);
    int exact = 0;
    for (int i = 0; i < 20_000; i++) {
      long unscaled = random.nextLong() >> random.nextInt(64);
      int scale = random.nextInt(12);
      if (random.nextBoolean()) {
        unscaled = (unscaled >> 40) * (long) StrictMath.pow(5, Math.min(scale, 9));
      }
      String text = BigDecimal.valueOf(unscaled, scale).toPlainString();
      double value = NumberText.parse(text, PLACE);
      boolean expected = new BigDecimal(value).compareTo(new BigDecimal(text)) == 0;
      assertThat(Exactness.isExact(text, value)).as(text).isEqualTo(expected);
      exact += expected ? 1 : 0;
    }
    assertThat(exact).isBetween(2_000, 18_000);
  }
}
