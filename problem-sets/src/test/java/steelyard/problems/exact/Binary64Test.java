package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;

/** IEEE 754-2019, Table 3.5, binary64: p = 53 and emax = 1023. */
class Binary64Test {
  private static final int P = 53;
  private static final int EMAX = 1023;

  @Test
  void constantsAreThoseOfTheStandard() {
    assertThat(Binary64.PRECISION).isEqualTo(P);
    assertThat(Binary64.UNIT_ROUNDOFF).isEqualTo(Math.scalb(1.0, -P));
    assertThat(Binary64.LEAST_EXPONENT).isEqualTo(2 - EMAX - P);
    assertThat(Binary64.OVERFLOW_EXPONENT).isEqualTo(EMAX + 1);
    assertThat(Dyadic.powerOfTwo(2 - EMAX - P)).isEqualTo(Dyadic.of(Double.MIN_VALUE));
    assertThat(Dyadic.powerOfTwo(1 - EMAX)).isEqualTo(Dyadic.of(Double.MIN_NORMAL));
    assertThat(Dyadic.of(2).subtract(Dyadic.powerOfTwo(1 - P)).scalb(EMAX))
        .isEqualTo(Dyadic.of(Double.MAX_VALUE));
    assertThat(new BigDecimal(Binary64.UNIT_ROUNDOFF))
        .isEqualTo("1.1102230246251565404236316680908203125E-16");
  }
}
