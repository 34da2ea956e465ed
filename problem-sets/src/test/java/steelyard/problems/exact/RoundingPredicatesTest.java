package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Nearest and faithful around every kind of boundary, against a search among the doubles nearby
 * whose distances are told by BigDecimal.
 */
class RoundingPredicatesTest {
  private static final BigDecimal EIGHTH = new BigDecimal("0.125");
  private static final BigDecimal TWO_TO_1024 = new BigDecimal(2).pow(1024);

  @Test
  void agreeWithASearchAmongTheNeighbours() {
    List<Double> places =
        new ArrayList<>(
            List.of(0.0, Double.MIN_VALUE, Double.MIN_NORMAL, 1.0, 2.0, 0.1, Double.MAX_VALUE));
    places.add(Math.nextDown(Double.MIN_NORMAL));
    places.add(Math.nextDown(Double.MAX_VALUE));
    RandomDoubles doubles = new RandomDoubles(1);
    for (int i = 0; i < 60; i++) {
      places.add(Math.abs(doubles.any()));
    }
    for (double place : places) {
      for (int eighths = -20; eighths <= 20; eighths++) {
        BigDecimal step = new BigDecimal(Math.ulp(place)).multiply(EIGHTH);
        BigDecimal value = new BigDecimal(place).add(step.multiply(BigDecimal.valueOf(eighths)));
        assertAround(place, value);
        assertAround(-place, value.negate());
      }
    }
  }

  private static void assertAround(double place, BigDecimal value) {
    Dyadic number = dyadic(value);
    List<Double> near = neighbourhood(place);
    BigDecimal least = near.stream().map(d -> distance(d, value)).min(BigDecimal::compareTo).get();
    for (int i = 1; i < near.size() - 1; i++) {
      double candidate = near.get(i);
      boolean nearest = distance(candidate, value).compareTo(least) == 0;
      boolean faithful =
          isBelow(near.get(i - 1), value) && isBelow(-near.get(i + 1), value.negate());
      assertThat(number.isNearest(candidate)).as("%s for %s", candidate, value).isEqualTo(nearest);
      assertThat(number.isFaithful(candidate))
          .as("%s for %s", candidate, value)
          .isEqualTo(faithful);
    }
    assertThat(number.isNearest(number.doubleValue())).isTrue();
    assertThat(number.isFaithful(number.doubleValue())).isTrue();
  }

  // Here infinity is beyond every number, not the 2^1024 of rounding to nearest.
  private static boolean isBelow(double neighbour, BigDecimal value) {
    return Double.isInfinite(neighbour)
        ? neighbour < 0
        : new BigDecimal(neighbour).compareTo(value) < 0;
  }

  private static List<Double> neighbourhood(double place) {
    double lowest = place;
    for (int i = 0; i < 8; i++) {
      lowest = Math.nextDown(lowest);
    }
    List<Double> near = new ArrayList<>();
    for (double d = lowest; near.size() < 17; d = Math.nextUp(d)) {
      if (!near.isEmpty() && near.get(near.size() - 1) == d) {
        break;
      }
      near.add(d);
    }
    return near;
  }

  private static BigDecimal distance(double candidate, BigDecimal value) {
    return position(candidate).subtract(value).abs();
  }

  private static BigDecimal position(double value) {
    if (Double.isInfinite(value)) {
      return value > 0 ? TWO_TO_1024 : TWO_TO_1024.negate();
    }
    return new BigDecimal(value);
  }

  private static Dyadic dyadic(BigDecimal value) {
    int power = 1080;
    return new Dyadic(value.multiply(new BigDecimal(2).pow(power)).toBigIntegerExact(), -power);
  }

  @Test
  void overflowThreshold() {
    Dyadic threshold = Dyadic.powerOfTwo(1024).subtract(Dyadic.powerOfTwo(970));
    Dyadic speck = Dyadic.powerOfTwo(-2000);
    Dyadic inside = threshold.subtract(speck);
    Dyadic beyond = threshold.add(speck);
    assertThat(inside.isNearest(Double.MAX_VALUE)).isTrue();
    assertThat(inside.isNearest(Double.POSITIVE_INFINITY)).isFalse();
    assertThat(threshold.isNearest(Double.MAX_VALUE)).isTrue();
    assertThat(threshold.isNearest(Double.POSITIVE_INFINITY)).isTrue();
    assertThat(beyond.isNearest(Double.MAX_VALUE)).isFalse();
    assertThat(beyond.isNearest(Double.POSITIVE_INFINITY)).isTrue();
    assertThat(beyond.isNearest(Double.NEGATIVE_INFINITY)).isFalse();
    assertThat(Dyadic.powerOfTwo(1500).isNearest(Double.POSITIVE_INFINITY)).isTrue();
    assertThat(Dyadic.powerOfTwo(1500).isFaithful(Double.POSITIVE_INFINITY)).isTrue();
    assertThat(Dyadic.powerOfTwo(1500).isFaithful(Double.MAX_VALUE)).isTrue();
    assertThat(Dyadic.of(Double.MAX_VALUE).isFaithful(Double.POSITIVE_INFINITY)).isFalse();
    assertThat(Dyadic.of(Double.MAX_VALUE).add(speck).isFaithful(Double.POSITIVE_INFINITY))
        .isTrue();
  }

  @Test
  void exactValueIsItsOwnOnlyRounding() {
    for (double value : new double[] {0, -0.0, 1, Double.MIN_VALUE, -Double.MAX_VALUE, 0.1}) {
      Dyadic number = Dyadic.of(value);
      assertThat(number.isFaithful(value)).isTrue();
      assertThat(number.isNearest(value)).isTrue();
      assertThat(number.isFaithful(Math.nextUp(value))).isFalse();
      assertThat(number.isFaithful(Math.nextDown(value))).isFalse();
      assertThat(number.isNearest(Math.nextUp(value))).isFalse();
    }
    assertThat(Dyadic.ZERO.isFaithful(-0.0)).isTrue();
    assertThat(Dyadic.ONE.isFaithful(Double.NaN)).isFalse();
    assertThat(Dyadic.ONE.isNearest(Double.NaN)).isFalse();
  }
}
