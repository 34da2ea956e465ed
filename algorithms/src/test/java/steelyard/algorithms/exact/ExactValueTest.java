package steelyard.algorithms.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;

class ExactValueTest {

  private static final BigDecimal TIE = ExactValue.sum(1, 0x1p-53);

  @Test
  void nearestMeansEvenInATie() {
    assertThat(ExactValue.isNearest(1, TIE)).isTrue();
    assertThat(ExactValue.isNearest(Math.nextUp(1.0), TIE)).isFalse();
    assertThat(ExactValue.isNearest(Math.nextUp(1.0), TIE.add(ExactValue.sum(0x1p-900)))).isTrue();
    assertThat(ExactValue.isNearest(1, TIE.add(ExactValue.sum(0x1p-900)))).isFalse();
  }

  @Test
  void faithfulMeansEitherNeighbour() {
    assertThat(ExactValue.isFaithful(1, TIE)).isTrue();
    assertThat(ExactValue.isFaithful(Math.nextUp(1.0), TIE)).isTrue();
    assertThat(ExactValue.isFaithful(Math.nextDown(1.0), TIE)).isFalse();
    assertThat(ExactValue.isFaithful(Math.nextUp(1.0), BigDecimal.ONE)).isFalse();
  }

  @Test
  void infinityIsNearestFromHalfWayOn() {
    BigDecimal halfWay = ExactValue.sum(Double.MAX_VALUE, 0x1p970);
    assertThat(ExactValue.isNearest(Double.POSITIVE_INFINITY, halfWay)).isTrue();
    assertThat(ExactValue.isNearest(Double.MAX_VALUE, halfWay)).isFalse();
    BigDecimal justBelow = halfWay.subtract(BigDecimal.ONE);
    assertThat(ExactValue.isNearest(Double.POSITIVE_INFINITY, justBelow)).isFalse();
    assertThat(ExactValue.isNearest(Double.MAX_VALUE, justBelow)).isTrue();
  }
}
