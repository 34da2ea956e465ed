package steelyard.results.verdict;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.Rounding;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.Verdict;

class VerdictsTest {
  private static final double U = 0x1p-53;

  @Test
  void aRowPerFamilyAndThenOneOverAll() {
    assertThat(Verdicts.of(SampleRun.observations()))
        .filteredOn(v -> v.candidate().equals("naive"))
        .extracting(Verdict::family)
        .containsExactly("positive", "cancelling", "overflow", "all");
  }

  @Test
  void theRowOverAllCountsTheProblemsOfAllFamiliesTogether() {
    List<Observation> rows = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      rows.add(row().family(i < 12 ? "a" : "b").repeat(i).rounding(Rounding.NEAREST).build());
    }
    assertThat(Verdicts.of(rows))
        .extracting(Verdict::grade)
        .containsExactly(Grade.BACKWARD_STABLE, Grade.BACKWARD_STABLE, Grade.CORRECTLY_ROUNDED);
  }

  @Test
  void theRowOverAllIsNotBetterThanTheHardestFamilyAllows() {
    List<Observation> rows =
        List.of(
            row().family("easy").build(),
            row().family("hard").condition(1e6).forward(1).backward(1).build());
    assertThat(Verdicts.of(rows))
        .extracting(Verdict::grade)
        .containsExactly(Grade.BACKWARD_STABLE, Grade.UNSTABLE, Grade.UNSTABLE);
  }

  @Test
  void aFailureOnOneFamilyDoesNotHideTheOthers() {
    List<Observation> rows =
        List.of(
            row().family("easy").build(),
            row().family("huge").repeat(1).build(),
            row().family("huge").repeat(2).status(Status.INFINITE).build(),
            row().family("huge").repeat(3).status(Status.NAN).build(),
            row().family("huge").repeat(4).status(Status.NAN).build());
    Verdict all = last(rows);
    assertThat(all.grade()).isEqualTo(Grade.FAILED);
    assertThat(all.elsewhere()).contains(Grade.BACKWARD_STABLE);
    assertThat(all.failedFamilies()).contains("huge");
    assertThat(all.failures()).isEqualTo(3);
    assertThat(all.failureStatuses()).contains("nan:2 infinite:1");
    assertThat(all.problems()).isEqualTo(2);
  }

  @Test
  void instabilityOnOneFamilyDoesNotHideTheOthers() {
    List<Observation> rows =
        List.of(
            row().family("easy").build(),
            row().family("growth").condition(1e6).forward(1).backward(1).build());
    Verdict all = last(rows);
    assertThat(all.grade()).isEqualTo(Grade.UNSTABLE);
    assertThat(all.elsewhere()).contains(Grade.BACKWARD_STABLE);
    assertThat(all.unstableFamilies()).contains("growth");
    assertThat(all.failedFamilies()).isEmpty();
    assertThat(all.failsFromCondition()).hasValue(1e6);
  }

  @Test
  void oneFamilyDoesNotHideTheDoubledPrecisionThatTheOthersProve() {
    Observation hard = row().family("hard").condition(1e18).forward(2 * U).build();
    Observation weak = row().family("weak").condition(10).forward(100 * U).backward(9 * U).build();
    Observation easy = row().family("easy").condition(1).forward(0).backward(0).build();
    Verdict all = last(List.of(hard, weak, easy));
    assertThat(all.grade()).isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(all.elsewhere()).contains(Grade.TWO_FOLD);
    assertThat(all.weakerFamily()).contains("weak");

    Verdict without = last(List.of(weak, easy));
    assertThat(without.weakerFamily()).as("no evidence, no family is left out").isEmpty();
    assertThat(without.elsewhere()).isEmpty();
    assertThat(last(List.of(hard, easy)).weakerFamily()).isEmpty();
  }

  @Test
  void instabilityEverywhereLeavesNoElsewhere() {
    Verdict all =
        last(List.of(row().family("growth").condition(1e6).forward(1).backward(1).build()));
    assertThat(all.elsewhere()).isEmpty();
    assertThat(all.unstableFamilies()).contains("growth");
  }

  @Test
  void aFailureEverywhereLeavesNoElsewhere() {
    Verdict all = last(List.of(row().status(Status.TIMEOUT).condition(7).build()));
    assertThat(all.elsewhere()).isEmpty();
    assertThat(all.failedFamilies()).contains("cancelling");
    assertThat(all.maxCondition()).as("of the failed problem").hasValue(7);
  }

  @Test
  void unstableNamesTheSmallestConditionAtWhichItFailsAndTheWorstExcess() {
    List<Observation> rows =
        List.of(
            row().problem("fine").condition(10).forward(U).backward(1).build(),
            row().problem("worst").condition(1e4).forward(1).backward(1).build(),
            row().problem("first").condition(1e2).forward(1e-9).backward(1).build());
    Verdict verdict = last(rows);
    assertThat(verdict.grade()).isEqualTo(Grade.UNSTABLE);
    assertThat(verdict.failsFromCondition()).hasValue(1e2);
    assertThat(verdict.failsFromProblem()).contains("first");
    assertThat(verdict.worstExcessProblem()).contains("worst");
    assertThat(verdict.worstExcess()).hasValue(1 / (1e4 * U));
  }

  @Test
  void aStableCandidateFailsFromNowhere() {
    Verdict verdict = last(List.of(row().build()));
    assertThat(verdict.failsFromCondition()).isEmpty();
    assertThat(verdict.failsFromProblem()).isEmpty();
  }

  @Test
  void whatIsLeftOutIsCounted() {
    Verdict verdict =
        last(
            List.of(
                row().condition(3).build(),
                row().condition(99).status(Status.UNCERTIFIED).build(),
                row().condition(99).status(Status.NOT_APPLICABLE).build(),
                row().condition(99).status(Status.NOT_APPLICABLE).build(),
                row().noCondition().build()));
    assertThat(verdict.problems()).isEqualTo(1);
    assertThat(verdict.uncertified()).isEqualTo(2);
    assertThat(verdict.notApplicable()).isEqualTo(2);
    assertThat(verdict.maxCondition()).hasValue(3);
  }

  @Test
  void worstAndMedian() {
    Verdict odd = last(List.of(forward(1), forward(5), forward(2)));
    assertThat(odd.worstForwardError()).hasValue(5);
    assertThat(odd.medianForwardError()).hasValue(2);
    Verdict even =
        last(List.of(forward(1), forward(3), forward(Double.POSITIVE_INFINITY), forward(2)));
    assertThat(even.worstForwardError()).hasValue(Double.POSITIVE_INFINITY);
    assertThat(even.medianForwardError()).hasValue(2.5);
  }

  @Test
  void brokenBoundsAreFindingsWhateverTheVerdict() {
    List<Observation> rows =
        List.of(
            row().problem("p1").claim(1, true).build(),
            row().problem("p2").forward(3 * U).claim(2 * U, false).build(),
            row().problem("p3").claim(U / 2, false).build());
    Verdict verdict = last(rows);
    assertThat(verdict.grade()).isEqualTo(Grade.BACKWARD_STABLE);
    assertThat(verdict.boundsHeld()).isEqualTo(1);
    assertThat(verdict.boundsBroken()).isEqualTo(2);
    assertThat(verdict.firstBrokenProblem()).contains("p2");
    assertThat(BrokenBound.in(rows)).extracting(BrokenBound::problem).containsExactly("p2", "p3");
    BrokenBound first = BrokenBound.in(rows).get(0);
    assertThat(first.limits()).isEqualTo("forward_error");
    assertThat(first.observed()).hasValue(3 * U);
    assertThat(first.bound()).isEqualTo(2 * U);
  }

  private static ObservationBuilder row() {
    return new ObservationBuilder();
  }

  private static Observation forward(double error) {
    return row().forward(error).build();
  }

  private static Verdict last(List<Observation> rows) {
    List<Verdict> verdicts = Verdicts.of(rows);
    return verdicts.get(verdicts.size() - 1);
  }
}
