package steelyard.results.tradeoff;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.results.tradeoff.Frontier.Point;

class FrontierTest {
  @Test
  void neitherAsAccurateNorAsFastIsOff() {
    Point accurate = new Point(1e-16, 40);
    Point fast = new Point(1e-10, 10);
    Point useless = new Point(1e-9, 50);
    List<Point> all = List.of(accurate, fast, useless);
    assertThat(Frontier.isOn(accurate, all)).isTrue();
    assertThat(Frontier.isOn(fast, all)).isTrue();
    assertThat(Frontier.isOn(useless, all)).isFalse();
  }

  @Test
  void equalInOneAndWorseInTheOtherIsOff() {
    Point point = new Point(1e-16, 40);
    assertThat(Frontier.isOn(point, List.of(point, new Point(1e-16, 39)))).isFalse();
    assertThat(Frontier.isOn(point, List.of(point, new Point(0, 40)))).isFalse();
  }

  @Test
  void equalInBothAreOnTogether() {
    Point point = new Point(1e-16, 40);
    assertThat(Frontier.isOn(point, List.of(point, new Point(1e-16, 40)))).isTrue();
  }

  @Test
  void anInfiniteErrorIsOnOnlyIfFastest() {
    Point lost = new Point(Double.POSITIVE_INFINITY, 5);
    assertThat(Frontier.isOn(lost, List.of(lost, new Point(1, 6)))).isTrue();
    assertThat(Frontier.isOn(lost, List.of(lost, new Point(1, 5)))).isFalse();
  }
}
