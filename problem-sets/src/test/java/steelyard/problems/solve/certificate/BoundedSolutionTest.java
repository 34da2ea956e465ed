package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;

class BoundedSolutionTest {
  private final ScaledSystem system =
      new ScaledSystem(new double[][] {{0.5, 0}, {0, 0.5}}, new double[] {0.5, 0.5});

  @Test
  void nothingIsCertainWithinTheRadii() {
    BoundedSolution solution = solution(3, 0.5);
    assertThat(solution.norm().lower()).isBetween(2.49, 2.5);
    assertThat(solution.norm().upper()).isBetween(3.5, 3.51);
    assertThat(solution.magnitude(0).lower()).isBetween(2.49, 2.5);
    assertThat(solution.magnitude(0).upper()).isBetween(3.5, 3.51);
    assertThat(solution.relativeBound()).isBetween(0.2, 0.21);
    assertThat(solution.isZero()).isFalse();
  }

  @Test
  void exactEntriesHaveNoWidthWhereTheyAreZero() {
    BoundedSolution solution = solution(0, 0);
    assertThat(solution.magnitude(0)).isEqualTo(Enclosure.of(0));
    assertThat(solution.relativeBound()).isZero();
    BoundedSolution unsure = solution(0, 0.25);
    assertThat(unsure.magnitude(0).lower()).isZero();
    assertThat(unsure.magnitude(0).upper()).isBetween(0.25, 0.26);
  }

  private BoundedSolution solution(double value, double radius) {
    return BoundedSolution.of(
        system, new Dyadic[] {Dyadic.of(value), Dyadic.of(-1.0)}, new double[] {radius, 0});
  }
}
