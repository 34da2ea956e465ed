package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.FieldSource;

/**
 * Exact sums and dot products reproduce what NIST certified of its univariate data sets, to all
 * printed digits where the decimal data are taken exactly.
 *
 * @see <a href="https://www.itl.nist.gov/div898/strd/">NIST Statistical Reference Datasets</a>
 */
class CertifiedUnivariateTest {
  static final List<String> NAMES = Univariate.NAMES;

  @ParameterizedTest
  @FieldSource("NAMES")
  void decimalDataGiveEveryPrintedDigit(String name) {
    Univariate set = Univariate.named(name);
    Moments moments = set.ofDecimal();
    assertPrinted(set.mean(), Moments.decimal(moments.mean()));
    assertPrinted(set.deviation(), moments.deviation());
    assertPrinted(set.autocorrelation(), Moments.decimal(moments.autocorrelation()));
  }

  @ParameterizedTest
  @FieldSource("NAMES")
  void meanOfStoredDataIsOffByNoMoreThanStoring(String name) {
    Univariate set = Univariate.named(name);
    BigDecimal mean = Moments.decimal(set.ofStored().mean());
    assertThat(mean.subtract(set.mean()).abs())
        .isLessThanOrEqualTo(set.storageError().add(halfDigit(set.mean())));
  }

  // How many of the certified digits survive storing, as the exact values of the stored data say.
  @ParameterizedTest
  @CsvSource({
    "NumAcc1, 15, 15",
    "NumAcc2, 15, 15",
    "NumAcc3, 9, 12",
    "NumAcc4, 8, 11",
    "Lottery, 15, 15",
    "Lew, 15, 15",
    "Mavro, 13, 13",
    "Michelso, 13, 13",
    "PiDigits, 15, 15"
  })
  void deviationOfStoredDataAgreesAsFarAsStoringAllows(
      String name, int deviationDigits, int autocorrelationDigits) {
    Univariate set = Univariate.named(name);
    Moments moments = set.ofStored();
    assertThat(agreement(moments.deviation(), set.deviation())).isEqualTo(deviationDigits);
    assertThat(agreement(Moments.decimal(moments.autocorrelation()), set.autocorrelation()))
        .isEqualTo(autocorrelationDigits);
  }

  @Test
  void setsAreComplete() {
    assertThat(NAMES.stream().map(name -> Univariate.named(name).data().size()))
        .containsExactly(3, 1001, 1001, 1001, 218, 200, 50, 100, 5000);
  }

  private static void assertPrinted(BigDecimal certified, BigDecimal exact) {
    assertThat(exact.setScale(certified.scale(), RoundingMode.HALF_EVEN))
        .isEqualByComparingTo(certified);
  }

  private static BigDecimal halfDigit(BigDecimal printed) {
    return BigDecimal.valueOf(5, printed.scale() + 1);
  }

  // The whole part of -log10 of the relative difference beyond the rounding of what is printed, at
  // most the 15 digits that are certified.
  private static int agreement(BigDecimal value, BigDecimal certified) {
    int digits = 0;
    BigDecimal distance = value.subtract(certified).abs().subtract(halfDigit(certified));
    while (digits < 15 && distance.movePointRight(digits + 1).compareTo(certified.abs()) <= 0) {
      digits++;
    }
    return digits;
  }
}
