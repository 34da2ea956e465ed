package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import org.junit.jupiter.api.Test;

/** Dyadic arithmetic against BigDecimal, which holds every dyadic number exactly. */
class DyadicTest {

  @Test
  void equalNumbersAreEqualRecords() {
    assertThat(new Dyadic(BigInteger.valueOf(12), -2)).isEqualTo(Dyadic.of(3));
    assertThat(new Dyadic(BigInteger.ZERO, 77)).isEqualTo(Dyadic.ZERO);
    assertThat(Dyadic.of(-0.0)).isEqualTo(Dyadic.of(0.0));
  }

  @Test
  void arithmeticIsExact() {
    RandomDoubles doubles = new RandomDoubles(1);
    for (int i = 0; i < 2000; i++) {
      double a = doubles.any();
      double b = i % 2 == 0 ? doubles.any() : doubles.near(Math.getExponent(a), 60);
      BigDecimal aDecimal = new BigDecimal(a);
      BigDecimal bDecimal = new BigDecimal(b);
      Dyadic x = Dyadic.of(a);
      Dyadic y = Dyadic.of(b);
      assertThat(x.add(y).toBigDecimal()).isEqualByComparingTo(aDecimal.add(bDecimal));
      assertThat(x.subtract(y).toBigDecimal()).isEqualByComparingTo(aDecimal.subtract(bDecimal));
      assertThat(x.multiply(y).toBigDecimal()).isEqualByComparingTo(aDecimal.multiply(bDecimal));
      assertThat(x.compareTo(y)).isEqualTo(aDecimal.compareTo(bDecimal));
      assertThat(x.negate().abs().toBigDecimal()).isEqualByComparingTo(aDecimal.abs());
      assertThat(x.scalb(-3).toBigDecimal())
          .isEqualByComparingTo(aDecimal.divide(BigDecimal.valueOf(8)));
      assertThat(Double.doubleToLongBits(x.doubleValue())).isEqualTo(Double.doubleToLongBits(a));
    }
  }

  @Test
  void decimalsAreRoundedOnce() {
    Dyadic tenth = Dyadic.of(0.1);
    assertThat(tenth.toBigDecimal())
        .isEqualTo("0.1000000000000000055511151231257827021181583404541015625");
    assertThat(tenth.toBigDecimal(new MathContext(20, RoundingMode.HALF_EVEN)))
        .isEqualTo("0.10000000000000000555");
    assertThat(Dyadic.powerOfTwo(70).toBigDecimal()).isEqualTo("1180591620717411303424");
  }

  @Test
  void roundsToTheNearestDouble() {
    RandomDoubles doubles = new RandomDoubles(2);
    for (int i = 0; i < 1000; i++) {
      double a = doubles.any();
      double tail = doubles.near(Math.getExponent(a) - 54, 3);
      assertRoundsLikeParsing(Dyadic.of(a).add(Dyadic.of(tail)));
      // Exactly halfway, and one far bit to either side of halfway.
      Dyadic half = Dyadic.of(a).add(Dyadic.of(Math.ulp(a)).scalb(-1));
      Dyadic far = Dyadic.powerOfTwo(-1500);
      assertRoundsLikeParsing(half);
      assertRoundsLikeParsing(half.add(far));
      assertRoundsLikeParsing(half.subtract(far));
    }
  }

  private static void assertRoundsLikeParsing(Dyadic number) {
    double parsed = Double.parseDouble(number.toBigDecimal().toString());
    assertThat(number.doubleValue()).as("%s", number).isEqualTo(parsed);
  }

  @Test
  void roundsAtTheEndsOfTheFormat() {
    Dyadic threshold = Dyadic.powerOfTwo(1024).subtract(Dyadic.powerOfTwo(970));
    Dyadic speck = Dyadic.powerOfTwo(-3000);
    assertThat(threshold.doubleValue()).isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(threshold.negate().doubleValue()).isEqualTo(Double.NEGATIVE_INFINITY);
    assertThat(threshold.subtract(speck).doubleValue()).isEqualTo(Double.MAX_VALUE);
    assertThat(Dyadic.powerOfTwo(5000).doubleValue()).isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(Dyadic.powerOfTwo(-1075).doubleValue()).isEqualTo(0.0);
    assertThat(Dyadic.powerOfTwo(-1075).negate().doubleValue()).isEqualTo(-0.0);
    assertThat(Dyadic.powerOfTwo(-1075).add(speck).doubleValue()).isEqualTo(Double.MIN_VALUE);
    assertThat(Dyadic.of(3).scalb(-1075).doubleValue()).isEqualTo(2 * Double.MIN_VALUE);
    assertThat(Dyadic.powerOfTwo(-5000).doubleValue()).isEqualTo(0.0);
  }

  /** Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., Problem 27.1. */
  @Test
  void doesNotRoundTwice() {
    Dyadic probe =
        Dyadic.ONE
            .add(Dyadic.powerOfTwo(-53))
            .add(Dyadic.powerOfTwo(-64))
            .add(Dyadic.powerOfTwo(-105));
    assertThat(Double.doubleToLongBits(probe.doubleValue())).isEqualTo(0x3ff0000000000001L);
  }

  @Test
  void quotientsAreCorrectlyRounded() {
    RandomDoubles doubles = new RandomDoubles(3);
    int finite = 0;
    for (int i = 0; i < 3000; i++) {
      double a = doubles.any();
      double b = i % 3 == 0 ? doubles.any() : doubles.near(Math.getExponent(a) % 900, 120);
      Dyadic dividend = Dyadic.of(a).add(Dyadic.of(doubles.near(Math.getExponent(a) - 70, 9)));
      double quotient = Dyadic.quotient(dividend, Dyadic.of(b));
      if (Double.isFinite(quotient)) {
        finite++;
        assertQuotient(dividend.toBigDecimal(), new BigDecimal(b), quotient);
      }
    }
    assertThat(finite).isGreaterThan(2000);
  }

  // |a/b - q| is at most half of the gap to either neighbour, all multiplied out.
  private static void assertQuotient(BigDecimal a, BigDecimal b, double quotient) {
    BigDecimal q = new BigDecimal(Math.abs(quotient));
    BigDecimal two = BigDecimal.valueOf(2);
    BigDecimal above = q.add(new BigDecimal(Math.ulp(quotient)).divide(two));
    BigDecimal below =
        q.add(new BigDecimal(Math.nextDown(Math.abs(quotient)))).divide(two).max(BigDecimal.ZERO);
    assertThat(a.abs()).isLessThanOrEqualTo(above.multiply(b.abs()));
    assertThat(a.abs()).isGreaterThanOrEqualTo(below.multiply(b.abs()));
    if (quotient != 0) {
      assertThat(Math.signum(quotient)).isEqualTo(a.signum() * b.signum());
    }
  }

  @Test
  void quotientsAtTheEdges() {
    assertThat(Dyadic.quotient(Dyadic.ONE, Dyadic.of(3))).isEqualTo(1.0 / 3.0);
    assertThat(Dyadic.quotient(Dyadic.of(-10), Dyadic.of(3))).isEqualTo(-10.0 / 3.0);
    assertThat(Dyadic.quotient(Dyadic.ZERO, Dyadic.of(3))).isEqualTo(0.0);
    // Exactly halfway between 1 and its upper neighbour, and just beyond it.
    Dyadic half = Dyadic.ONE.add(Dyadic.powerOfTwo(-53));
    assertThat(Dyadic.quotient(half.multiply(Dyadic.of(7)), Dyadic.of(7))).isEqualTo(1.0);
    assertThat(
            Dyadic.quotient(half.multiply(Dyadic.of(7)).add(Dyadic.powerOfTwo(-400)), Dyadic.of(7)))
        .isEqualTo(Math.nextUp(1.0));
    // A dividend far longer than its quotient, whose last bit decides.
    Dyadic manyBits = half.add(Dyadic.powerOfTwo(-3000));
    assertThat(Dyadic.quotient(manyBits, Dyadic.ONE)).isEqualTo(Math.nextUp(1.0));
    assertThat(Dyadic.quotient(manyBits.negate(), Dyadic.ONE)).isEqualTo(-Math.nextUp(1.0));
    assertThat(Dyadic.quotient(half.subtract(Dyadic.powerOfTwo(-3000)), Dyadic.ONE)).isEqualTo(1.0);
    assertThatThrownBy(() -> Dyadic.quotient(Dyadic.ONE, Dyadic.ZERO))
        .isInstanceOf(ArithmeticException.class)
        .hasMessage("the divisor is zero");
  }

  @Test
  void refusesWhatIsNotFinite() {
    assertThatThrownBy(() -> Dyadic.of(Double.NaN))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("a finite double is wanted, but it is NaN");
  }
}
