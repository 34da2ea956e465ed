package steelyard.results.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.EnumSource.Mode;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.Rounding;

/** How near an observation of size 100, so C = 1000, comes to a limit. */
class GradeLimitTest {
  private static final double U = 0x1p-53;
  private static final double C = 1000;

  @Test
  void isTheErrorOverWhatTheGradeAllows() {
    GradeLimit backward = new GradeLimit(Grade.BACKWARD_STABLE);
    assertThat(backward.used(new ObservationBuilder().backward(C * U / 4).build()))
        .isCloseTo(0.25, within(1e-12));
    assertThat(backward.used(new ObservationBuilder().backward(C * U).build())).isEqualTo(1);
    assertThat(backward.used(new ObservationBuilder().backward(3 * C * U).build()))
        .isCloseTo(3, within(1e-12));
    assertThat(backward.used(new ObservationBuilder().backward(Math.nextUp(C * U)).build()))
        .isGreaterThan(1);
    assertThat(backward.used(new ObservationBuilder().noBackward().build()))
        .isEqualTo(Double.POSITIVE_INFINITY);
  }

  @Test
  void isUntouchedWhereTheLimitIsInfinite() {
    Observation zero =
        new ObservationBuilder()
            .condition(Double.POSITIVE_INFINITY)
            .forward(Double.POSITIVE_INFINITY)
            .build();
    assertThat(new GradeLimit(Grade.FORWARD_STABLE).used(zero)).isZero();
  }

  @Test
  void hasNoDegreesWhereAnAnswerIsRoundedOtherwise() {
    GradeLimit faithful = new GradeLimit(Grade.FAITHFUL);
    assertThat(faithful.used(new ObservationBuilder().rounding(Rounding.NEAREST).build())).isZero();
    assertThat(faithful.used(new ObservationBuilder().rounding(Rounding.OTHER).build()))
        .isEqualTo(Double.POSITIVE_INFINITY);
  }

  @Test
  void needsEvidenceWhereTheGradeDoes() {
    List<Observation> one = List.of(new ObservationBuilder().build());
    assertThat(new GradeLimit(Grade.BACKWARD_STABLE).isProvable(one)).isTrue();
    assertThat(new GradeLimit(Grade.BACKWARD_STABLE).isProvable(List.of())).isFalse();
    assertThat(new GradeLimit(Grade.FAITHFUL).isProvable(one)).isFalse();
    assertThat(new GradeLimit(Grade.TWO_FOLD).isProvable(one)).isFalse();
  }

  @ParameterizedTest
  @EnumSource(
      value = Grade.class,
      names = {"UNSTABLE", "FAILED", "UNJUDGED", "NOT_APPLICABLE"})
  void isNoneForWhatNobodyEarns(Grade grade) {
    assertThatThrownBy(() -> new GradeLimit(grade))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining(grade.words());
  }

  @ParameterizedTest
  @EnumSource(
      value = Grade.class,
      mode = Mode.EXCLUDE,
      names = {"UNSTABLE", "FAILED", "UNJUDGED", "NOT_APPLICABLE"})
  void isThereForEveryOtherGrade(Grade grade) {
    assertThat(new GradeLimit(grade).grade()).isEqualTo(grade);
  }
}
