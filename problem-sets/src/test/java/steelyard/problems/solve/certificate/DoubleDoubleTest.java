package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;

/** The relative errors stay below the unit roundoff that the class names. */
class DoubleDoubleTest {
  private static final Dyadic UNIT = Dyadic.of(DoubleDouble.UNIT_ROUNDOFF);

  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(3L);

  @Test
  void errorsStayBelowTheUnitRoundoff() {
    for (int trial = 0; trial < 20000; trial++) {
      DoubleDouble x = number();
      DoubleDouble y = trial % 3 == 0 ? near(x) : number();
      requireClose(exact(x.plus(y)), exact(x).add(exact(y)));
      requireClose(exact(x.minus(y)), exact(x).subtract(exact(y)));
      requireClose(exact(x.times(y)), exact(x).multiply(exact(y)));
      // A quotient and a root are compared after multiplying back.
      Dyadic quotient = exact(x.dividedBy(y)).multiply(exact(y));
      requireClose(quotient, exact(x));
      DoubleDouble positive = x.high() > 0 ? x : new DoubleDouble(-x.high(), -x.low());
      Dyadic root = exact(positive.sqrt());
      Dyadic error = root.multiply(root).subtract(exact(positive)).abs();
      assertThat(error).isLessThanOrEqualTo(exact(positive).multiply(UNIT).scalb(1));
    }
  }

  @Test
  void operationsAreMoreThanDouble() {
    DoubleDouble third = DoubleDouble.of(1).dividedBy(DoubleDouble.of(3));
    assertThat(third.low()).isNotZero();
    assertThat(third.times(DoubleDouble.of(3)).minus(DoubleDouble.of(1)).high())
        .isBetween(-0x1p-104, 0x1p-104);
  }

  private static void requireClose(Dyadic computed, Dyadic exact) {
    assertThat(computed.subtract(exact).abs()).isLessThanOrEqualTo(exact.abs().multiply(UNIT));
  }

  private DoubleDouble number() {
    double high = Math.scalb(random.nextDouble() - 0.5, random.nextInt(40) - 20);
    return new DoubleDouble(high, Math.ulp(high) * 0.49 * (2 * random.nextDouble() - 1));
  }

  private DoubleDouble near(DoubleDouble x) {
    double high = -x.high() * (1 + random.nextInt(5) * 0x1p-52);
    return new DoubleDouble(high, Math.ulp(high) * 0.49 * (2 * random.nextDouble() - 1));
  }

  private static Dyadic exact(DoubleDouble x) {
    return Dyadic.of(x.high()).add(Dyadic.of(x.low()));
  }

  @Test
  void zeroHasNoSurprises() {
    DoubleDouble zero = DoubleDouble.of(1).minus(DoubleDouble.of(1));
    assertThat(exact(zero).significand()).isEqualTo(BigInteger.ZERO);
  }
}
