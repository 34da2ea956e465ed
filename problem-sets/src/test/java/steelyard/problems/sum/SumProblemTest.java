package steelyard.problems.sum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.IndependentErrors;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.Trait;

class SumProblemTest {

  @Test
  void errorsAgreeWithIndependentPaths() {
    for (Family<Terms> family : SumFamilies.all()) {
      for (int size : new int[] {3, 8, 40}) {
        for (int repeat = 0; repeat < 4; repeat++) {
          OptionalDouble condition =
              family.reach().controlled()
                  ? OptionalDouble.of(size == 40 ? 1e8 : 2)
                  : OptionalDouble.empty();
          ProblemId id = new ProblemId("sum", family.profile().id(), condition, size, repeat, 1);
          check(family.generate(id.request(), id.randomness()));
        }
      }
    }
  }

  @Test
  void errorsAgreeWhereTheSumIsZero() {
    check(problem(1, 0x1p-1074, -1, -0x1p-1074));
    check(problem(0, -0.0, 0));
  }

  private static void check(Problem<Terms> problem) {
    double[] terms = problem.data().values();
    double[] ones = new double[terms.length];
    Arrays.fill(ones, 1);
    IndependentErrors.check(problem, terms, ones, 1);
  }

  private static SumProblem problem(double... terms) {
    return new SumProblem(new Terms(terms));
  }

  @Test
  void traitsFollowFromTheTerms() {
    assertThat(problem(1, 2, 0, 3).traits())
        .containsExactlyInAnyOrder(
            Trait.NO_INTERMEDIATE_OVERFLOW, Trait.NO_UNDERFLOW, Trait.SAME_SIGN);
    assertThat(problem(-1, 2).traits()).doesNotContain(Trait.SAME_SIGN);
    assertThat(problem(1, Math.nextDown(Double.MIN_NORMAL)).traits())
        .doesNotContain(Trait.NO_UNDERFLOW);
    assertThat(problem(Math.nextDown(0x1p980)).traits()).contains(Trait.NO_INTERMEDIATE_OVERFLOW);
    assertThat(problem(0x1p979, -0x1p979).traits()).doesNotContain(Trait.NO_INTERMEDIATE_OVERFLOW);
  }

  @Test
  void dataIsTheTermsInOrder() {
    double[] terms = {3, 1, 2};
    SumProblem problem = problem(terms);
    assertThat(problem.size()).isEqualTo(3);
    assertThat(problem.data().parts()).containsExactly(new Data.Vector("terms", terms));
  }

  @Test
  void refusesTermsThatAreNoNumbers() {
    assertThatThrownBy(() -> problem())
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("a sum needs at least one term, but there are none");
    assertThatThrownBy(() -> problem(1, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("finite");
  }
}
