package steelyard.problems.dot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.IndependentErrors;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.Trait;

class DotProblemTest {

  @Test
  void errorsAgreeWithIndependentPaths() {
    for (Family<Vectors> family : DotFamilies.all()) {
      for (int size : new int[] {3, 8, 40}) {
        for (int repeat = 0; repeat < 4; repeat++) {
          OptionalDouble condition =
              family.reach().controlled() ? OptionalDouble.of(1e12) : OptionalDouble.empty();
          ProblemId id = new ProblemId("dot", family.profile().id(), condition, size, repeat, 1);
          check(family.generate(id.request(), id.randomness()));
        }
      }
    }
  }

  @Test
  void errorsAgreeAtTheEnds() {
    check(problem(new double[] {3, 1}, new double[] {1, -3}));
    check(problem(new double[] {0, 1}, new double[] {1, -0.0}));
    double tiny = Double.MIN_VALUE;
    check(problem(new double[] {tiny, 1}, new double[] {tiny, 0}));
    check(problem(new double[] {0x1p1000, 0x1p1000}, new double[] {0x1p1000, -0x1p1000}));
    check(problem(new double[] {0x1p1000, 0x1p900}, new double[] {0x1p1000, -0x1p900}));
  }

  private static void check(Problem<Vectors> problem) {
    IndependentErrors.check(problem, problem.data().x(), problem.data().y(), 2);
  }

  private static DotProblem problem(double[] x, double[] y) {
    return new DotProblem(new Vectors(x, y));
  }

  private static DotProblem product(double x, double y) {
    return problem(new double[] {x}, new double[] {y});
  }

  @Test
  void traitsFollowFromTheVectors() {
    assertThat(product(2, 3).traits())
        .containsExactlyInAnyOrder(
            Trait.NO_INTERMEDIATE_OVERFLOW, Trait.NO_UNDERFLOW, Trait.SAME_SIGN);
    assertThat(problem(new double[] {1, -1}, new double[] {1, 1}).traits())
        .doesNotContain(Trait.SAME_SIGN);
    assertThat(product(0x1p-500, 0x1p-468).traits()).contains(Trait.NO_UNDERFLOW);
    assertThat(product(0x1p-500, 0x1p-469).traits()).doesNotContain(Trait.NO_UNDERFLOW);
    assertThat(product(0x1p-1000, 0).traits()).contains(Trait.NO_UNDERFLOW);
    assertThat(product(0x1p990, 0x1p-500).traits()).doesNotContain(Trait.NO_INTERMEDIATE_OVERFLOW);
    assertThat(product(0x1p600, 0x1p600).traits()).doesNotContain(Trait.NO_INTERMEDIATE_OVERFLOW);
  }

  @Test
  void dataIsBothVectors() {
    double[] x = {1, 2};
    double[] y = {3, 4};
    DotProblem problem = problem(x, y);
    assertThat(problem.size()).isEqualTo(2);
    assertThat(problem.data().parts())
        .containsExactly(new Data.Vector("x", x), new Data.Vector("y", y));
  }

  @Test
  void refusesVectorsThatDoNotMatch() {
    assertThatThrownBy(() -> problem(new double[0], new double[0]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("a dot product needs at least one pair of entries");
    assertThatThrownBy(() -> problem(new double[1], new double[2]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("1 and 2 entries");
  }
}
