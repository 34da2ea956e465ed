package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.harness.task.Tasks;
import steelyard.problems.Reach;

class BuiltInPlansTest {

  /** What a verdict of correct rounding asks for. */
  private static final long ENOUGH = 20;

  private final Catalogue catalogue = Catalogue.of(Tasks.all());
  private final PlanReader reader = new PlanReader(catalogue);

  @ParameterizedTest
  @ValueSource(strings = {"tour", "nightly"})
  void weighEveryCandidateOnEveryFamily(String name) {
    Plan plan = reader.find(name);

    assertThat(plan.name()).isEqualTo(name);
    for (Catalogue.TaskEntry task : catalogue.tasks()) {
      assertThat(plan.only(task.id()).problems())
          .allSatisfy(cell -> assertThat(cell.candidates()).isEqualTo(task.candidates()))
          .extracting(ProblemCell::family)
          .containsAll(task.familyIds());
      assertThat(plan.only(task.id()).timings()).isNotEmpty();
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"tour", "nightly"})
  void takeUpAFamilyThatIsAdded(String name) {
    Catalogue.FamilyEntry tiny = new Catalogue.FamilyEntry("tiny", Reach.upTo(10, 4, 5));
    List<Catalogue.TaskEntry> grown =
        catalogue.tasks().stream()
            .map(
                task ->
                    new Catalogue.TaskEntry(
                        task.id(),
                        Stream.concat(task.families().stream(), Stream.of(tiny)).toList(),
                        task.candidates()))
            .toList();
    Plan plan = new PlanReader(new Catalogue(grown)).find(name);

    assertThat(plan.problems())
        .filteredOn(cell -> cell.family().equals("tiny"))
        .isNotEmpty()
        .allSatisfy(cell -> assertThat(cell.size()).isEqualTo(5));
  }

  @Test
  void haveEnoughSumsAndDotProductsOfEachFamilyForAVerdictOfCorrectRounding() {
    Map<String, Long> counts =
        reader.find("tour").problems().stream()
            .filter(cell -> !cell.task().equals("solve"))
            .collect(
                Collectors.groupingBy(
                    cell -> cell.task() + "/" + cell.family(), Collectors.counting()));

    assertThat(counts)
        .hasSize(15)
        .allSatisfy((family, n) -> assertThat(n).isGreaterThanOrEqualTo(ENOUGH));
  }

  @Test
  void keepTheTourShort() {
    Plan tour = reader.find("tour");

    assertThat(tour.problems()).hasSizeLessThan(1000);
    assertThat(tour.timings().stream().map(cell -> cell.task() + " " + cell.size()))
        .containsExactly("sum 1000", "dot 1000", "solve 8", "solve 50");
  }

  @Test
  void goDeeperByNight() {
    assertThat(reader.find("nightly").problems())
        .hasSizeGreaterThan(3 * reader.find("tour").problems().size());
    assertThat(reader.find("nightly").timing().orElseThrow().forks()).isEqualTo(2);
  }

  @Test
  void areFoundByNameAlone() {
    assertThat(BuiltInPlans.names()).containsExactly("tour", "nightly");
    assertThat(BuiltInPlans.find("./tour")).isEmpty();
    assertThatThrownBy(() -> reader.find("toru"))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessage("there is neither a built-in plan nor a file 'toru'; did you mean 'tour'?");
    assertThatThrownBy(() -> reader.find("no\0name"))
        .isExactlyInstanceOf(PlanException.class)
        .hasMessageStartingWith("there is neither a built-in plan nor a file 'no");
  }
}
