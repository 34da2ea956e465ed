package steelyard.results.attainment;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.Rounding;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.Timing;

final class AttainmentTest {

  private static final double KAPPA_U = 1e6 * 0x1p-53;

  private static final Observation EXACT = row("exact").rounding(Rounding.NEAREST).build();
  private static final Observation SUM2 = row("sum2").rounding(Rounding.FAITHFUL).build();
  private static final Observation PLAIN = row("plain").forward(KAPPA_U).build();
  private static final Observation LOOSE = row("loose").forward(900 * KAPPA_U).build();
  private static final Observation WRONG = row("wrong").forward(1100 * KAPPA_U).build();
  private static final Observation FAILED = row("failed").status(Status.NAN).build();
  private static final List<Observation> ALL = List.of(FAILED, WRONG, PLAIN, EXACT, LOOSE, SUM2);

  @Test
  void levelsFollowFromRoundingAndExcess() {
    assertThat(List.of(EXACT, SUM2, PLAIN, LOOSE, WRONG, FAILED).stream().map(Level::of))
        .containsExactly(
            Level.LAST_BIT, Level.LAST_BIT, Level.DATA, Level.STABLE, Level.WORSE, Level.NONE);
  }

  @Test
  void whereTheAnswerIsZeroTheBackwardErrorDecides() {
    ObservationBuilder zero = row("x").condition(Double.POSITIVE_INFINITY).forward(1 / 0.0);
    assertThat(Level.of(zero.backward(0x1p-53).build())).isEqualTo(Level.STABLE);
    assertThat(Level.of(zero.backward(1e-12).build())).isEqualTo(Level.WORSE);
    assertThat(Level.of(zero.forward(0).rounding(Rounding.NEAREST).build()))
        .isEqualTo(Level.LAST_BIT);
  }

  @Test
  void theFastestOfTheMostAccurateComesFirst() {
    Attainment attainment =
        Attainment.of(ALL, List.of(time("exact", 50), time("sum2", 20), time("plain", 10)));
    assertThat(attainment.standings().stream().map(Standing::candidate))
        .containsExactly("sum2", "exact", "plain", "loose", "wrong", "failed");
    assertThat(attainment.fastest(Level.LAST_BIT).orElseThrow().candidate()).isEqualTo("sum2");
    assertThat(attainment.fastest(Level.STABLE).orElseThrow().candidate()).isEqualTo("plain");
    assertThat(attainment.reaching(Level.DATA)).hasSize(3);
  }

  @Test
  void overlappingTimesAreATie() {
    Attainment attainment = Attainment.of(ALL, List.of(time("exact", 20.3), time("sum2", 20)));
    assertThat(attainment.tied(Level.LAST_BIT).stream().map(Standing::candidate))
        .containsExactly("exact");
    assertThat(AttainmentText.render(attainment))
        .contains("sum2 at 20.0", "not told apart from exact");
  }

  @Test
  void theDecisionNamesTheFastestThatGetsThereAndWhatIsFasterWhereLessWillDo() {
    String text =
        AttainmentText.render(
            Attainment.of(ALL, List.of(time("exact", 50), time("sum2", 20), time("plain", 10))));
    assertThat(flat(text))
        .contains("2 of 5 get there; the fastest is sum2 at 20.0")
        .endsWith(
            "DECISION: sum2 is the fastest that gets to the last bit; plain is faster and gets"
                + " within max(κ, 1) u.");
    assertThat(text.lines()).allMatch(line -> line.length() <= AttainmentText.WIDTH);
    assertThat(text).contains("nan: invented for a test");
  }

  @Test
  void withoutTimesTheDecisionIsOpen() {
    assertThat(flat(AttainmentText.render(Attainment.of(ALL, List.of()))))
        .endsWith(
            "DECISION: open. No time was taken, so the fastest is not known; exact, sum2 get to the"
                + " last bit.");
  }

  @Test
  void whereNobodyGetsAnywhereThatIsTheDecision() {
    assertThat(AttainmentText.render(Attainment.of(List.of(WRONG, FAILED), List.of())))
        .contains("DECISION: none. No candidate is even as accurate as a stable algorithm.");
    assertThat(AttainmentText.render(Attainment.of(List.of(FAILED), List.of())))
        .contains("DECISION: none. No candidate gave an answer");
  }

  private static String flat(String text) {
    return text.replaceAll("\\s+", " ").strip();
  }

  private static ObservationBuilder row(String candidate) {
    return new ObservationBuilder()
        .at("sum", "file-ledger", candidate)
        .problem("sum/file-ledger/n100/r0")
        .condition(1e6);
  }

  private static Timing time(String candidate, double ns) {
    Timing t = SampleRun.timing("sum", "file-ledger", candidate, 100, ns, ns / 10);
    assertThat(t.problem()).isEqualTo("sum/file-ledger/n100/r0");
    return t;
  }
}
