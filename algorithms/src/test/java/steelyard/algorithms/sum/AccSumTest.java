package steelyard.algorithms.sum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.util.Random;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.exact.ExactValue;
import steelyard.algorithms.exact.IllConditioned;

class AccSumTest {

  private final Random random = new Random(2008);

  @Test
  void isFaithfulUpToConditionNumbersBeyondTenToTheHundred() {
    double worst = 0;
    for (int bits = 10; bits <= 400; bits += 2) {
      double[] terms = IllConditioned.sum(6 + 2 * random.nextInt(100), bits, random);
      worst =
          Math.max(
              worst, ExactValue.ratio(ExactValue.sumOfMagnitudes(terms), ExactValue.sum(terms)));
      assertFaithful(terms);
    }
    assertThat(worst).isGreaterThan(1e100);
  }

  @Test
  void isFaithfulForRandomExponents() {
    for (int i = 0; i < 1000; i++) {
      int range = 1 + random.nextInt(1500);
      assertFaithful(
          DoubleStream.generate(
                  () -> Math.scalb(random.nextGaussian(), random.nextInt(range) - 900))
              .limit(1 + random.nextInt(70))
              .toArray());
    }
  }

  @Test
  void startsAgainWhenAllThatWasCutOffCancels() {
    assertFaithful(0x1p900, 3, -0x1p900, 0x1p-900, -3, 0x1.8p-950);
    assertFaithful(1, -1);
    assertFaithful(1e200, 1e-200, -1e200, -1e-200);
    for (int i = 0; i < 300; i++) {
      double[] half =
          random.doubles(20, -1, 1).map(x -> Math.scalb(x, random.nextInt(300))).toArray();
      double rest = Math.scalb(random.nextGaussian(), -random.nextInt(900));
      assertFaithful(
          DoubleStream.concat(
                  DoubleStream.concat(DoubleStream.of(half), DoubleStream.of(rest)),
                  DoubleStream.of(half).map(x -> -x))
              .toArray());
    }
  }

  @Test
  void isFaithfulAmongSubnormals() {
    for (int i = 0; i < 500; i++) {
      double[] terms = IllConditioned.sum(6 + 2 * (i % 10), 60, random);
      int down = 1000 + random.nextInt(60);
      assertFaithful(DoubleStream.of(terms).map(x -> Math.scalb(x, -down)).toArray());
    }
  }

  @Test
  void scalesTermsNearTheOverflowThreshold() {
    assertFaithful(Double.MAX_VALUE, Double.MAX_VALUE, -Double.MAX_VALUE, 1);
    assertFaithful(Double.MAX_VALUE, Double.MAX_VALUE);
    assertFaithful(-Double.MAX_VALUE, -0x1p969);
    for (int i = 0; i < 300; i++) {
      double[] terms = IllConditioned.sum(6 + 2 * (i % 30), 100, random);
      int up = 1023 - DoubleStream.of(terms).mapToInt(Math::getExponent).max().orElseThrow();
      assertFaithful(DoubleStream.of(terms).map(x -> Math.scalb(x, up)).toArray());
    }
  }

  @Test
  void refusesToScaleWhereBitsWouldBeLost() {
    double[] terms = {Double.MAX_VALUE, Double.MIN_VALUE, -Double.MAX_VALUE};
    assertThatThrownBy(() -> new AccSum().sum(terms))
        .isInstanceOf(ArithmeticException.class)
        .hasMessageContaining("index 1");
  }

  @Test
  void sizesAroundPowersOfTwo() {
    for (int n = 1; n <= 130; n++) {
      double[] terms = random.doubles(n, -1, 1).toArray();
      // All but the last ulps of the sum cancel.
      terms[n - 1] = -ExactValue.sum(terms).subtract(new BigDecimal(terms[n - 1])).doubleValue();
      assertFaithful(terms);
    }
  }

  private static void assertFaithful(double... terms) {
    double sum = new AccSum().sum(terms);
    assertThat(ExactValue.isFaithful(sum, ExactValue.sum(terms)))
        .as(() -> Double.toHexString(sum))
        .isTrue();
  }
}
