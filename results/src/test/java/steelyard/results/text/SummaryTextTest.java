package steelyard.results.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.results.Observation;
import steelyard.results.ObservationBuilder;
import steelyard.results.SampleRun;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.tradeoff.Tradeoffs;
import steelyard.results.verdict.Verdicts;

class SummaryTextTest {
  @Test
  void oneHardFamilyDoesNotHideTheRest() {
    assertThat(render(SampleRun.observations(), List.of()))
        .contains("backward stable; failed on overflow");
  }

  @Test
  void aFailureEverywhereIsJustFailed() {
    assertThat(render(List.of(new ObservationBuilder().status(Status.NAN).build()), List.of()))
        .containsPattern("naive +failed +-")
        .doesNotContain("failed on");
  }

  @Test
  void whatIsLeftOutIsSaid() {
    List<Observation> rows =
        List.of(
            new ObservationBuilder().build(),
            new ObservationBuilder().repeat(1).status(Status.NOT_APPLICABLE).build(),
            new ObservationBuilder().repeat(2).status(Status.UNCERTIFIED).build());
    assertThat(render(rows, List.of()))
        .contains("backward stable; not for 1 problem; 1 uncertified");
  }

  @Test
  void withoutTimes() {
    assertThat(render(SampleRun.observations(), List.of()))
        .contains("sum: no time was measured")
        .doesNotContain("per call");
  }

  @Test
  void theLargestTimedSizeIsShown() {
    List<Timing> timings = new ArrayList<>(SampleRun.timings());
    timings.add(SampleRun.timing("sum", "positive", "naive", 5000, 7000, 1));
    assertThat(render(SampleRun.observations(), timings))
        .contains("sum: time at n = 5000")
        .contains("1.40 [1.39, 1.41]")
        .doesNotContain("0.800 [");
  }

  @Test
  void aTimePerElementOnlyWhereItDiffersFromTheTimePerCall() {
    assertThat(render(SampleRun.observations(), SampleRun.timings()))
        .contains("ns per element")
        .contains("\u00B5s per call");
  }

  @Test
  void longNamesStayWithinTheWidth() {
    String name = "a very long name ".repeat(20).strip();
    List<Observation> rows = new ArrayList<>(SampleRun.observations());
    rows.add(new ObservationBuilder().at("sum", name, name).build());
    rows.add(new ObservationBuilder().at("sum", name, "naive").status(Status.NAN).build());
    assertThat(render(rows, SampleRun.timings()).lines())
        .allMatch(line -> line.length() <= SummaryText.WIDTH);
  }

  private static String render(List<Observation> rows, List<Timing> timings) {
    return SummaryText.render(Verdicts.of(rows), timings, Tradeoffs.of(rows, timings), false);
  }
}
