package steelyard.results.verdict;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.Rounding;
import steelyard.results.Status;

/** Each rule from both sides. The size is 100: C = 1000 and D = 100. */
class VerdictRulesTest {
  private static final double U = 0x1p-53;
  private static final double C = 1000;
  private static final double D = 100;
  private static final double INF = Double.POSITIVE_INFINITY;

  @Test
  void correctlyRoundedNeedsTwentyProblems() {
    assertThat(grade(problems(20, b -> b.rounding(Rounding.NEAREST))))
        .isEqualTo(Grade.CORRECTLY_ROUNDED);
    assertThat(grade(problems(19, b -> b.rounding(Rounding.NEAREST))))
        .isEqualTo(Grade.BACKWARD_STABLE);
  }

  @Test
  void oneProblemManyTimesIsOneProblem() {
    assertThat(grade(problems(20, b -> b.rounding(Rounding.NEAREST).problem("the same"))))
        .isEqualTo(Grade.BACKWARD_STABLE);
  }

  @Test
  void faithfulNeedsTwentyProblems() {
    assertThat(grade(problems(20, b -> b.rounding(Rounding.FAITHFUL)))).isEqualTo(Grade.FAITHFUL);
    assertThat(grade(problems(19, b -> b.rounding(Rounding.FAITHFUL))))
        .isEqualTo(Grade.BACKWARD_STABLE);
  }

  @Test
  void oneAnswerOfAnotherRoundingTakesTheGradeAway() {
    List<Observation> rows = problems(20, b -> b.rounding(Rounding.NEAREST));
    rows.add(one(b -> b.repeat(20).rounding(Rounding.FAITHFUL)));
    assertThat(grade(rows)).isEqualTo(Grade.FAITHFUL);
    rows.add(one(b -> b.repeat(21).rounding(Rounding.OTHER)));
    assertThat(grade(rows)).isEqualTo(Grade.BACKWARD_STABLE);
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8})
  void kFold(int k) {
    double condition = power(D * U, -(k - 1)) * 1.01;
    double limit = 2 * U + power(D * U, k) * condition;
    assertThat(grade(bad(condition, limit * 0.999))).isEqualTo(Grade.ofFolds(k));
    assertThat(grade(bad(condition, limit * 1.001))).isNotEqualTo(Grade.ofFolds(k));
  }

  @Test
  void noEvidenceForTwoFoldWhereOneFoldLosesNothing() {
    assertThat(grade(bad(0.99 / (D * U), U))).isEqualTo(Grade.FORWARD_STABLE);
    assertThat(grade(bad(1.01 / (D * U), U))).isEqualTo(Grade.TWO_FOLD);
  }

  @Test
  void noEvidenceForTwoFoldWhereTwoFoldLosesToo() {
    // Between 0.01 and 1 two-fold precision loses digits, and three-fold is not put to the test.
    assertThat(grade(bad(0.0101 / power(D * U, 2), U))).isEqualTo(Grade.FORWARD_STABLE);
    assertThat(grade(bad(0.0099 / power(D * U, 2), U))).isEqualTo(Grade.TWO_FOLD);
  }

  @Test
  void theLargestKForWhichThereIsEvidenceAndNoCounterexample() {
    List<Observation> rows = new ArrayList<>(bad(2 / (D * U), U));
    double hard = 2 / power(D * U, 2);
    rows.addAll(bad(hard, 2 * U + power(D * U, 3) * hard));
    assertThat(grade(rows)).isEqualTo(Grade.THREE_FOLD);
    rows.addAll(bad(hard, 1));
    assertThat(grade(rows)).isEqualTo(Grade.TWO_FOLD);
    rows.addAll(bad(1, 3 * U));
    assertThat(grade(rows)).isEqualTo(Grade.FORWARD_STABLE);
  }

  @Test
  void backwardStable() {
    assertThat(grade(problems(1, b -> b.backward(C * U)))).isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(grade(problems(1, b -> b.backward(C * U * 1.0001)))).isEqualTo(Grade.FORWARD_STABLE);
  }

  @Test
  void anUnknownBackwardErrorIsNotBackwardStable() {
    assertThat(grade(problems(1, ObservationBuilder::noBackward))).isEqualTo(Grade.FORWARD_STABLE);
  }

  @Test
  void forwardStable() {
    double condition = 1e6;
    assertThat(grade(bad(condition, C * U * condition))).isEqualTo(Grade.FORWARD_STABLE);
    assertThat(grade(bad(condition, C * U * condition * 1.0001))).isEqualTo(Grade.UNSTABLE);
  }

  @Test
  void aConditionBelowOneCountsAsOne() {
    assertThat(grade(bad(1e-3, C * U))).isEqualTo(Grade.FORWARD_STABLE);
    assertThat(grade(bad(1e-3, C * U * 1.0001))).isEqualTo(Grade.UNSTABLE);
  }

  @Test
  void theAllowancesGrowWithTheSize() {
    Consumer<ObservationBuilder> wrong = b -> b.backward(2 * C * U).forward(2 * C * U);
    assertThat(grade(problems(1, wrong))).isEqualTo(Grade.UNSTABLE);
    assertThat(grade(problems(1, wrong.andThen(b -> b.size(200)))))
        .isEqualTo(Grade.BACKWARD_STABLE);
  }

  @Test
  void theUnitRoundoffIsThatOfTheWorkingPrecision() {
    Consumer<ObservationBuilder> single = b -> b.backward(0x1p-24).forward(0x1p-24);
    assertThat(grade(problems(1, single.andThen(b -> b.precision(24)))))
        .isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(grade(problems(1, single))).isEqualTo(Grade.UNSTABLE);
  }

  @Test
  void whereTheExactAnswerIsZeroOnlyTheBackwardErrorJudges() {
    assertThat(grade(problems(1, b -> b.condition(INF).forward(INF).backward(U))))
        .isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(grade(problems(1, b -> b.condition(INF).forward(0).backward(0))))
        .isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(grade(problems(1, b -> b.condition(INF).forward(INF).backward(1))))
        .isEqualTo(Grade.FORWARD_STABLE);
  }

  @Test
  void anInfiniteConditionIsNoEvidenceAndNoCounterexample() {
    List<Observation> rows = new ArrayList<>(bad(2 / (D * U), U));
    rows.add(one(b -> b.condition(INF).forward(INF).backward(1)));
    assertThat(grade(rows)).isEqualTo(Grade.TWO_FOLD);
  }

  @ParameterizedTest
  @EnumSource(
      value = Status.class,
      names = {"OK", "UNCERTIFIED", "NOT_APPLICABLE"},
      mode = EnumSource.Mode.EXCLUDE)
  void anyFailureIsFailed(Status status) {
    List<Observation> rows = problems(20, b -> b.rounding(Rounding.NEAREST));
    rows.add(one(b -> b.repeat(20).status(status)));
    assertThat(grade(rows)).isEqualTo(Grade.FAILED);
  }

  @Test
  void whatCannotBeJudgedIsLeftOut() {
    List<Observation> rows = problems(1, b -> {});
    rows.add(one(b -> b.status(Status.UNCERTIFIED)));
    rows.add(one(b -> b.status(Status.NOT_APPLICABLE)));
    rows.add(one(b -> b.noCondition().forward(1).backward(1)));
    assertThat(grade(rows)).isEqualTo(Grade.BACKWARD_STABLE);
  }

  @Test
  void nothingToJudge() {
    assertThat(grade(problems(3, b -> b.status(Status.NOT_APPLICABLE))))
        .isEqualTo(Grade.NOT_APPLICABLE);
    assertThat(grade(problems(3, b -> b.status(Status.UNCERTIFIED)))).isEqualTo(Grade.UNJUDGED);
  }

  private static Grade grade(List<Observation> rows) {
    return Grader.grade(rows);
  }

  /** One problem of a candidate that is not backward stable. */
  private static List<Observation> bad(double condition, double forward) {
    return problems(1, b -> b.condition(condition).forward(forward).backward(1));
  }

  private static Observation one(Consumer<ObservationBuilder> change) {
    ObservationBuilder builder = new ObservationBuilder();
    change.accept(builder);
    return builder.build();
  }

  private static List<Observation> problems(int count, Consumer<ObservationBuilder> change) {
    List<Observation> rows = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      int repeat = i;
      Consumer<ObservationBuilder> numbered = b -> b.repeat(repeat);
      rows.add(one(numbered.andThen(change)));
    }
    return rows;
  }

  private static double power(double base, int exponent) {
    double power = 1;
    for (int i = 0; i < Math.abs(exponent); i++) {
      power *= base;
    }
    return exponent < 0 ? 1 / power : power;
  }
}
