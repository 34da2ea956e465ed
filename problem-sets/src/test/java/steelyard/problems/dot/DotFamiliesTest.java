package steelyard.problems.dot;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.problems.ControlledCondition;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.Trait;
import steelyard.problems.exact.ErrorFree;

class DotFamiliesTest {

  private static Family<Vectors> family(String id) {
    return DotFamilies.all().stream()
        .filter(family -> family.profile().id().equals(id))
        .findFirst()
        .orElseThrow();
  }

  private static Problem<Vectors> problem(String text) {
    ProblemId id = ProblemId.parse("dot/" + text);
    return family(id.family()).generate(id.request(), id.randomness());
  }

  @Test
  void achievedConditionIsWithinAFactorOfTwo() {
    assertThat(ControlledCondition.checkFactorTwo("dot", family("cancelling"), 10, 5))
        .isGreaterThanOrEqualTo(850);
    assertThat(ControlledCondition.checkFactorTwo("dot", family("cancelling"), 1.3, 1))
        .isPositive();
  }

  @ParameterizedTest
  @CsvSource({"cancelling/k1e100/n10/r1", "cancelling/k1e100/n999/r1"})
  void largestConditionIsReached(String id) {
    assertThat(problem(id).condition().kappa()).isBetween(5e99, 2e100);
  }

  @Test
  void noConditionIsBelowTwo() {
    assertThat(problem("cancelling/k1/n100/r1").condition().kappa()).isEqualTo(2);
    assertThat(problem("same-sign/n100/r1").condition().kappa()).isEqualTo(2);
  }

  @Test
  void cancellingDefeatsTheLoopAndTheCorrectionOfSumsAlone() {
    Problem<Vectors> problem = problem("cancelling/k1e20/n100/r1");
    double[] x = problem.data().x();
    double[] y = problem.data().y();
    double plain = 0;
    double sum = 0;
    double lostBySums = 0;
    double lostByProducts = 0;
    for (int i = 0; i < x.length; i++) {
      double product = x[i] * y[i];
      plain += product;
      lostBySums += ErrorFree.sumError(sum, product);
      lostByProducts += ErrorFree.productError(x[i], y[i]);
      sum += product;
    }
    assertThat(forwardError(problem, plain)).isGreaterThan(1);
    assertThat(forwardError(problem, sum + lostBySums)).isGreaterThan(1);
    assertThat(forwardError(problem, sum + (lostBySums + lostByProducts))).isLessThan(1e-9);
  }

  private static double forwardError(Problem<Vectors> problem, double answer) {
    return problem.judge(new double[] {answer}).forwardError();
  }

  @Test
  void traitsOfTheFamilies() {
    for (String clear :
        new String[] {
          "same-sign/n100/r1",
          "random-signs/n100/r1",
          "wide-exponent/n1000/r1",
          "cancelling/k1e100/n100/r1"
        }) {
      assertThat(problem(clear).traits())
          .as(clear)
          .contains(Trait.NO_INTERMEDIATE_OVERFLOW, Trait.NO_UNDERFLOW);
    }
    assertThat(problem("near-overflow/n1000/r1").traits())
        .contains(Trait.NO_UNDERFLOW)
        .doesNotContain(Trait.NO_INTERMEDIATE_OVERFLOW);
    assertThat(problem("near-underflow/n1000/r1").traits())
        .contains(Trait.NO_INTERMEDIATE_OVERFLOW)
        .doesNotContain(Trait.NO_UNDERFLOW);
  }

  @Test
  void nearOverflowDefeatsSplittingAndNothingElse() {
    for (int size : new int[] {1, 1000, 1_000_000}) {
      Problem<Vectors> problem = problem("near-overflow/n" + size + "/r1");
      double absolute = 0;
      int split = 0;
      for (int i = 0; i < size; i++) {
        double x = problem.data().x()[i];
        absolute += Math.abs(x * problem.data().y()[i]);
        split += Double.isInfinite(x * 0x1p27) ? 1 : 0;
      }
      assertThat(absolute).isFinite();
      assertThat(split).isEqualTo(size);
    }
  }
}
