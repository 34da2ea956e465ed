package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class PlanCellsTest {

  private static final String TWO_ENTRIES =
      """
      seed = 4
      [timing]
      [[weigh]]
      task = "sum"
      families = ["same-sign", "cancelling"]
      candidates = ["recursive"]
      conditions = [1e8, 1, 1e4]
      sizes = [20, 10]
      repeats = 1
      time = "cancelling"
      timeout_ms = 100
      [[weigh]]
      task = "solve"
      families = ["hilbert"]
      candidates = ["gepp"]
      sizes = [3]
      repeats = 2
      [[weigh]]
      task = "sum"
      families = ["cancelling"]
      candidates = ["kahan", "recursive"]
      conditions = [1]
      sizes = [10]
      repeats = 2
      timeout_ms = 900
      [[require]]
      task = "solve"
      error = 1e-8
      condition_up_to = 1e4
      size = 3
      """;

  private final Plan plan = new PlanReader(Catalogues.SMALL).read("p.toml", TWO_ENTRIES);

  @Test
  void goByTaskFamilyConditionSizeAndRepeat() {
    assertThat(plan.problems().stream().map(PlanCellsTest::text))
        .containsExactly(
            "0 sum same-sign - 10 1 [recursive] 100",
            "0 sum same-sign - 20 1 [recursive] 100",
            "0 sum cancelling 1.0 10 1 [recursive, kahan] 900",
            "2 sum cancelling 1.0 10 2 [kahan, recursive] 900",
            "0 sum cancelling 1.0 20 1 [recursive] 100",
            "0 sum cancelling 10000.0 10 1 [recursive] 100",
            "0 sum cancelling 10000.0 20 1 [recursive] 100",
            "0 sum cancelling 1.0E8 10 1 [recursive] 100",
            "0 sum cancelling 1.0E8 20 1 [recursive] 100",
            "1 solve hilbert - 3 1 [gepp] 10000",
            "1 solve hilbert - 3 2 [gepp] 10000");
  }

  @Test
  void timeOneProblemOfEachFamilyAndSizeAtTheMiddleCondition() {
    assertThat(plan.timings())
        .containsExactly(
            new TimingCell(
                0, "sum", "cancelling", OptionalDouble.of(1e4), 10, List.of("recursive", "kahan")),
            new TimingCell(
                0, "sum", "cancelling", OptionalDouble.of(1e4), 20, List.of("recursive")),
            new TimingCell(1, "solve", "hilbert", OptionalDouble.empty(), 3, List.of("gepp")));
  }

  @Test
  void timeAtTheSizesOfTheTimingTableIfItHasAny() {
    Plan sized =
        new PlanReader(Catalogues.SMALL)
            .read("p", TWO_ENTRIES.replace("[timing]", "[timing]\nsizes = [12, 6]"));

    assertThat(sized.timings().stream().map(cell -> cell.family() + " " + cell.size()))
        .containsExactly("cancelling 6", "cancelling 12", "hilbert 6", "hilbert 12");
  }

  @Test
  void timeNothingWithoutTimingOrWhereNoFamilyIsTimed() {
    assertThat(plan.withoutTiming().timings()).isEmpty();
    assertThat(plan.withoutTiming().problems()).isEqualTo(plan.problems());
    assertThat(
            new PlanReader(Catalogues.SMALL)
                .read("p", "[timing]\n[[weigh]]\ntask = 'sum'\ntime = 'none'")
                .timings())
        .isEmpty();
  }

  @Test
  void areTheSameUnderAnotherSeed() {
    assertThat(plan.withSeed(99).seed()).isEqualTo(99);
    assertThat(plan.withSeed(99).problems()).isEqualTo(plan.problems());
    assertThat(plan.withSeed(4)).isEqualTo(plan);
  }

  @Test
  void canBeThoseOfOneTaskOnly() {
    Plan sums = plan.only("sum");

    assertThat(sums.problems())
        .hasSize(9)
        .allSatisfy(cell -> assertThat(cell.task()).isEqualTo("sum"));
    assertThat(sums.requirements()).isEmpty();
    assertThat(plan.only("solve").requirements()).isEqualTo(plan.requirements());
    assertThatThrownBy(() -> plan.only("slove"))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage("plan 'p' does not weigh a task 'slove'; did you mean 'solve'?");
  }

  private static String text(ProblemCell cell) {
    String condition =
        cell.condition().isPresent() ? String.valueOf(cell.condition().getAsDouble()) : "-";
    return "%s %s %s %s %s %s %s %s"
        .formatted(
            cell.weighing(),
            cell.task(),
            cell.family(),
            condition,
            cell.size(),
            cell.repeat(),
            cell.candidates(),
            cell.timeoutMs());
  }
}
