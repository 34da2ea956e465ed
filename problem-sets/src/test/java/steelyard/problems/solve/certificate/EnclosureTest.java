package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.RationalInverse;

class EnclosureTest {
  @Test
  void operationsContainTheExactResults() {
    UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(2L);
    for (int trial = 0; trial < 2000; trial++) {
      double x = Math.scalb(1 + random.nextDouble(), random.nextInt(1060) - 1060);
      double y = Math.scalb(1 + random.nextDouble(), random.nextInt(60) - 30);
      Enclosure ex = Enclosure.of(x);
      Enclosure ey = Enclosure.of(y);
      BigFraction fx = RationalInverse.exact(x);
      BigFraction fy = RationalInverse.exact(y);
      requireInside(ex.plus(ey), fx.add(fy));
      requireInside(ex.times(ey), fx.multiply(fy));
      requireInside(ex.over(ey), fx.divide(fy));
      requireInside(ex.scalb(-30), RationalInverse.exact(Dyadic.of(x).scalb(-30)));
    }
  }

  @Test
  void quotientByWhatMayBeZeroIsUnbounded() {
    assertThat(Enclosure.of(1).over(new Enclosure(0, 2)).upper()).isInfinite();
    assertThat(Enclosure.of(1).over(new Enclosure(0, 2)).isWithin(0.01)).isFalse();
  }

  @Test
  void endsBelongToIt() {
    Enclosure enclosure = new Enclosure(1, 3);
    assertThat(enclosure.contains(1)).isTrue();
    assertThat(enclosure.contains(3)).isTrue();
    assertThat(enclosure.contains(Math.nextDown(1.0))).isFalse();
    assertThat(enclosure.contains(Math.nextUp(3.0))).isFalse();
    assertThat(enclosure.midpoint()).isEqualTo(2);
  }

  @Test
  void narrownessCountsFromTheLowerEnd() {
    assertThat(new Enclosure(2, 3).isWithin(0.5)).isTrue();
    assertThat(new Enclosure(2, 3).isWithin(0.49)).isFalse();
    assertThat(new Enclosure(0, 0).isWithin(1)).isFalse();
    assertThat(new Enclosure(1, Double.POSITIVE_INFINITY).isWithin(Double.POSITIVE_INFINITY))
        .isFalse();
  }

  private static void requireInside(Enclosure enclosure, BigFraction exact) {
    assertThat(RationalInverse.exact(enclosure.lower()).compareTo(exact)).isNotPositive();
    assertThat(RationalInverse.exact(enclosure.upper()).compareTo(exact)).isNotNegative();
  }
}
