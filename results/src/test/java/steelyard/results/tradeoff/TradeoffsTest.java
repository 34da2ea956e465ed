package steelyard.results.tradeoff;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.Tradeoff;

class TradeoffsTest {
  private static final Timing NAIVE = time("positive", "naive", 100, 10);
  private static final Timing KAHAN = time("positive", "kahan", 100, 40);

  @Test
  void theTimeOfOneFamilyStandsForAllOfItsSize() {
    List<Tradeoff> rows =
        Tradeoffs.of(
            List.of(row("positive", "naive", 1), row("cancelling", "naive", 1)), List.of(NAIVE));
    assertThat(rows).extracting(t -> t.timeNs().orElseThrow()).containsExactly(10.0, 10.0);
    assertThat(rows).extracting(t -> t.timedFamily().orElseThrow()).containsOnly("positive");
  }

  @Test
  void theTimeOfAnotherSizeDoesNot() {
    List<Tradeoff> rows =
        Tradeoffs.of(
            List.of(row("positive", "naive", 1)), List.of(time("positive", "naive", 99, 10)));
    assertThat(rows.get(0).timeNs()).isEmpty();
    assertThat(rows.get(0).onFrontier()).isEmpty();
  }

  @Test
  void aFamilyThatWasTimedItselfHasItsOwnTime() {
    TimeLookup times = new TimeLookup(List.of(NAIVE, time("slow", "naive", 100, 99)));
    assertThat(times.find("sum", "naive", 100, Set.of("positive"))).contains(NAIVE);
    assertThat(times.find("sum", "naive", 100, Set.of()).orElseThrow().timeNs())
        .as("the longest, where any will do")
        .hasValue(99);
  }

  @Test
  void theFrontierIsThatOfTheFamilyAndSize() {
    List<Tradeoff> rows =
        Tradeoffs.of(
            List.of(
                row("positive", "naive", 1e-16),
                row("positive", "kahan", 1e-16),
                row("cancelling", "naive", 1e-8),
                row("cancelling", "kahan", 1e-16)),
            List.of(NAIVE, KAHAN));
    assertThat(rows)
        .extracting(t -> t.onFrontier().orElseThrow())
        .containsExactly(true, false, true, true);
  }

  @Test
  void aFailedCandidateIsNeverOnTheFrontierAndHidesNobody() {
    Observation failed =
        new ObservationBuilder().candidate("naive").repeat(1).status(Status.NAN).build();
    List<Tradeoff> rows =
        Tradeoffs.of(
            List.of(row("cancelling", "naive", 0), failed, row("cancelling", "kahan", 1e-16)),
            List.of(NAIVE, KAHAN));
    assertThat(rows).extracting(t -> t.onFrontier().orElseThrow()).containsExactly(false, true);
    assertThat(rows.get(0).failures()).isEqualTo(1);
    assertThat(rows.get(0).problems()).isEqualTo(1);
  }

  @Test
  void aCandidateThatIsNotForTheProblemsHasNoRow() {
    Observation row = new ObservationBuilder().status(Status.NOT_APPLICABLE).build();
    assertThat(Tradeoffs.of(List.of(row), List.of(NAIVE))).isEmpty();
  }

  private static Observation row(String family, String candidate, double error) {
    return new ObservationBuilder().at("sum", family, candidate).forward(error).build();
  }

  private static Timing time(String family, String candidate, int size, double ns) {
    return SampleRun.timing("sum", family, candidate, size, ns, 1);
  }
}
