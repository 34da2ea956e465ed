package steelyard.results.choice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.choice.Rejected.Reason;

class ChooserTest {
  private static final Requirement NEED =
      new Requirement("sum", 1e-10, 1e6, 100, List.of(), List.of());
  private static final Timing FAST = time("fast", 10);
  private static final Timing SLOW = time("slow", 20);

  @Test
  void theFastestThatQualifies() {
    Choice choice = choose(List.of(row("slow", 1e-16), row("fast", 1e-11)), List.of(SLOW, FAST));
    Qualified winner = choice.winner().orElseThrow();
    assertThat(winner.candidate()).isEqualTo("fast");
    assertThat(winner.margin()).isEqualTo(1e-10 / 1e-11);
    assertThat(choice.runnerUp()).map(Qualified::candidate).contains("slow");
    assertThat(choice.tied()).isEmpty();
  }

  @Test
  void anErrorOfExactlyTheRequirementQualifies() {
    assertThat(choose(List.of(row("fast", 1e-10)), List.of(FAST)).winner()).isPresent();
    assertThat(choose(List.of(row("fast", Math.nextUp(1e-10))), List.of(FAST)).winner()).isEmpty();
  }

  @Test
  void oneBadProblemDisqualifiesAndIsNamed() {
    Choice choice =
        choose(
            List.of(
                on("p1", "fast").forward(1e-9).build(),
                on("p2", "fast").forward(1e-8).build(),
                on("p3", "fast").forward(1e-12).build(),
                on("p1", "slow").build(),
                on("p2", "slow").build(),
                on("p3", "slow").build()),
            List.of(SLOW, FAST));
    assertThat(choice.winner()).map(Qualified::candidate).contains("slow");
    assertThat(choice.rejected())
        .containsExactly(
            new Rejected(
                "fast",
                Reason.INACCURATE,
                Optional.of(Status.OK),
                OptionalDouble.of(1e-8),
                "p2",
                2));
    assertThat(choice.nearestMiss()).as("somebody qualifies").isEmpty();
  }

  @Test
  void aProblemBeyondTheConditionDoesNotCount() {
    List<Observation> rows =
        List.of(
            on("p1", "fast").condition(1e6).build(),
            on("p2", "fast").condition(1.001e6).forward(1).build());
    Choice choice = choose(rows, List.of(FAST));
    assertThat(choice.winner()).isPresent();
    assertThat(choice.problems()).isEqualTo(1);
    assertThat(choice.maxCondition()).isEqualTo(1e6);
  }

  @Test
  void aProblemWithoutAKnownConditionIsLeftOutAndCounted() {
    List<Observation> rows =
        List.of(row("fast", 1e-16), on("p2", "fast").noCondition().forward(1).build());
    assertThat(choose(rows, List.of(FAST)).unplaced()).isEqualTo(1);
  }

  @Test
  void onlyTheNamedFamiliesCount() {
    List<Observation> rows =
        List.of(
            row("fast", 1e-16),
            new ObservationBuilder().at("sum", "other", "fast").forward(1).build());
    Requirement narrow = new Requirement("sum", 1e-10, 1e6, 100, List.of("cancelling"), List.of());
    assertThat(Chooser.choose(narrow, rows, List.of(FAST)).winner()).isPresent();
    assertThat(choose(rows, List.of(FAST)).winner()).isEmpty();
  }

  @Test
  void failuresUncertifiedAndUntriedDisqualify() {
    List<Observation> rows =
        List.of(
            on("p1", "a").build(),
            on("p2", "a").status(Status.TIMEOUT).build(),
            on("p1", "b").build(),
            on("p2", "b").status(Status.UNCERTIFIED).build(),
            on("p1", "c").build());
    assertThat(choose(rows, List.of()).rejected())
        .extracting(Rejected::reason)
        .containsExactly(Reason.FAILED, Reason.UNCERTIFIED, Reason.UNTRIED);
    assertThat(choose(rows, List.of()).rejected()).extracting(Rejected::problem).containsOnly("p2");
  }

  @Test
  void aCandidateThatIsNotForAllTheProblemsIsListedApart() {
    List<Observation> rows =
        List.of(
            on("p1", "fast").build(),
            on("p2", "fast").status(Status.NOT_APPLICABLE).build(),
            on("p1", "slow").build(),
            on("p2", "slow").build());
    Choice choice = choose(rows, List.of(FAST, SLOW));
    assertThat(choice.winner()).map(Qualified::candidate).contains("slow");
    assertThat(choice.rejected()).isEmpty();
    assertThat(choice.inapplicable()).containsExactly(new Inapplicable("fast", 1, "p2"));
  }

  @Test
  void overlappingIntervalsAreATie() {
    List<Observation> rows = List.of(row("fast", 1e-16), row("slow", 1e-16));
    // Each interval is one per cent to either side.
    assertThat(choose(rows, List.of(FAST, time("slow", 10.1))).tied())
        .extracting(Qualified::candidate)
        .containsExactly("slow");
    assertThat(choose(rows, List.of(FAST, time("slow", 10.3))).tied()).isEmpty();
    assertThat(ChoiceText.render(choose(rows, List.of(FAST, time("slow", 10.1)))))
        .contains("TIE: its time cannot be told apart from that of slow");
  }

  @Test
  void whereNoneQualifiesTheNearestMiss() {
    List<Observation> rows =
        List.of(
            row("a", 1e-3),
            row("b", 1e-9),
            on("sum/cancelling/n100/r0", "c").status(Status.NAN).build());
    Choice choice = choose(rows, List.of());
    assertThat(choice.qualified()).isEmpty();
    assertThat(choice.nearestMiss()).map(Rejected::candidate).contains("b");
  }

  @Test
  void withoutTimesThereIsNoWinner() {
    Choice choice = choose(List.of(row("a", 1e-16), row("b", 1e-16)), List.of());
    assertThat(choice.winner()).isEmpty();
    assertThat(choice.qualified()).hasSize(2);
    assertThat(ChoiceText.render(choice)).contains("No time was measured");
  }

  @Test
  void aCandidateWithoutATimeDoesNotWin() {
    Choice choice = choose(List.of(row("untimed", 1e-16), row("slow", 1e-16)), List.of(SLOW));
    assertThat(choice.winner()).map(Qualified::candidate).contains("slow");
    assertThat(choice.runnerUp()).isEmpty();
  }

  @Test
  void timesOfAnotherSizeAreNamed() {
    Timing other = SampleRun.timing("sum", "positive", "fast", 1000, 10, 1);
    assertThat(ChoiceText.render(choose(List.of(row("fast", 1e-16)), List.of(other))))
        .contains("(only at n = 1000)");
  }

  @Test
  void unknownNamesAndSizes() {
    List<Observation> rows = List.of(row("fast", 1e-16));
    assertRefused(
        new Requirement("smu", 1, 1e6, 100, List.of(), List.of()),
        rows,
        "The run has no task \"smu\"; perhaps sum is meant; it has sum.");
    assertRefused(
        new Requirement("bridge", 1, 1e6, 100, List.of(), List.of()),
        rows,
        "The run has no task \"bridge\"; it has sum.");
    assertRefused(
        new Requirement("sums", 1, 1e6, 100, List.of(), List.of()),
        rows,
        "The run has no task \"sums\"; perhaps sum is meant; it has sum.");
    assertRefused(
        new Requirement("sum", 1, 1e6, 100, List.of("canceling"), List.of()),
        rows,
        "The run has no family \"canceling\"; perhaps cancelling is meant; it has cancelling.");
    assertRefused(
        new Requirement("sum", 1, 1e6, 50, List.of(), List.of()),
        rows,
        "The run has no problem of size 50 for this; choose one of 100.");
    assertRefused(
        new Requirement("sum", 1, 0.5, 100, List.of(), List.of()),
        rows,
        "The run has no problem with a condition number up to 5.00000e-01 for this; the smallest is"
            + " 1.00000e+00.");
    assertRefused(
        new Requirement("sum", 1, 1e6, 100, List.of(), List.of()),
        List.of(),
        "The run has no task \"sum\"; it has none.");
  }

  @Test
  void figuresThatAreNone() {
    assertThatThrownBy(() -> new Requirement("sum", Double.NaN, 1, 1, List.of(), List.of()))
        .isInstanceOf(RequirementException.class);
    assertThatThrownBy(() -> new Requirement("sum", -1, 1, 1, List.of(), List.of()))
        .isInstanceOf(RequirementException.class);
    assertThatThrownBy(() -> new Requirement("sum", 1, 0, 1, List.of(), List.of()))
        .isInstanceOf(RequirementException.class);
  }

  @Test
  void longAndHostileNamesStayWithinTheWidth() {
    String name = "a-very-long-name-".repeat(12) + "\u001B[31m%s";
    String text =
        ChoiceText.render(
            choose(List.of(row(name, 1e-16), row("b", 1), row("slow", 1e-12)), List.of(SLOW)));
    assertThat(text.lines()).allMatch(line -> line.length() <= ChoiceText.WIDTH);
    assertThat(text).doesNotContain("\u001B");
  }

  private static void assertRefused(Requirement need, List<Observation> rows, String sentence) {
    assertThatThrownBy(() -> Chooser.choose(need, rows, List.of()))
        .isInstanceOf(RequirementException.class)
        .hasMessage(sentence);
  }

  @Test
  void aFamilyOnWhichTheFastestFailsIsSparedInASecondChoice() {
    List<Observation> rows =
        List.of(
            row("fast", 1e-12),
            on("p2", "fast").family("huge").status(Status.INFINITE).build(),
            row("slow", 1e-12),
            on("p2", "slow").family("huge").build());
    Choice choice = choose(rows, List.of(FAST, SLOW));
    assertThat(choice.leaders()).containsExactly("slow");
    Choice spared = Chooser.spared(choice, rows, List.of(FAST, SLOW)).orElseThrow();
    assertThat(spared.leaders()).containsExactly("fast");
    assertThat(spared.requirement().except()).containsExactly("huge");
    assertThat(ChoiceText.render(choice, Optional.of(spared)))
        .contains("DECISION: slow", "Without huge, on which 1 candidate failed: fast.");
  }

  @Test
  void nothingIsSparedWhereItWouldChangeNothing() {
    List<Observation> rows =
        List.of(
            row("fast", 1e-12),
            on("p2", "fast").family("huge").build(),
            row("slow", 1e-12),
            on("p2", "slow").family("huge").status(Status.NAN).build());
    assertThat(Chooser.spared(choose(rows, List.of(FAST, SLOW)), rows, List.of(FAST, SLOW)))
        .isEmpty();
    List<Observation> failingEverywhere = List.of(on("p2", "fast").status(Status.NAN).build());
    assertThat(Chooser.spared(choose(failingEverywhere, List.of()), failingEverywhere, List.of()))
        .isEmpty();
  }

  @Test
  void anExceptedFamilyDoesNotCountAndMustBeKnown() {
    List<Observation> rows =
        List.of(row("fast", 1e-12), on("p2", "fast").family("huge").forward(1).build());
    Requirement without = NEED.without(List.of("huge"));
    assertThat(Chooser.choose(without, rows, List.of(FAST)).winner()).isPresent();
    assertThat(choose(rows, List.of(FAST)).winner()).isEmpty();
    assertThatThrownBy(() -> Chooser.choose(NEED.without(List.of("hugs")), rows, List.of(FAST)))
        .isInstanceOf(RequirementException.class)
        .hasMessageContaining("huge");
  }

  private static Choice choose(List<Observation> rows, List<Timing> timings) {
    return Chooser.choose(NEED, rows, timings);
  }

  private static Observation row(String candidate, double error) {
    return new ObservationBuilder().candidate(candidate).forward(error).build();
  }

  private static ObservationBuilder on(String problem, String candidate) {
    return new ObservationBuilder().candidate(candidate).problem(problem);
  }

  private static Timing time(String candidate, double ns) {
    return SampleRun.timing("sum", "positive", candidate, 100, ns, ns / 10);
  }
}
