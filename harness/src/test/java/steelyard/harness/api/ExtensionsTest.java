package steelyard.harness.api;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;
import steelyard.algorithms.sum.Summation;
import steelyard.harness.plan.Plan;
import steelyard.problems.sum.Terms;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;

/** What the options of the command line do, from Java. */
class ExtensionsTest {

  private static final String CODE = ExtensionsTest.class.getName() + "#backwards";
  private static final String PLAN =
      """
      name = "tickets"
      [timing]
      forks = 1
      warmup = 1
      measurement = 3
      iteration_ms = 5
      [[weigh]]
      task = "sum"
      families = ["cancelling"]
      candidates = ["recursive"]
      conditions = [1e8]
      sizes = [10]
      repeats = 2
      [[require]]
      task = "sum"
      error = 1e-300
      condition_up_to = 1e9
      size = 10
      """;

  /** Sums the terms from the last to the first. */
  public static double backwards(double[] terms) {
    double sum = 0;
    for (int i = terms.length - 1; i >= 0; i--) {
      sum += terms[i];
    }
    return sum;
  }

  private static Steelyard both() {
    return Steelyard.standard()
        .with(Summation.class, "object", ExtensionsTest::backwards)
        .withCode("sum", "code", CODE);
  }

  @Test
  void timesCodeByItsNameAndNoObjects() {
    Run run = both().inThisJvm().runText(PLAN);

    Map<String, Timing> times =
        run.timings().stream().collect(Collectors.toMap(Timing::candidate, each -> each));
    assertThat(times).containsOnlyKeys("recursive", "object", "code");
    assertThat(times.get("recursive").timeNs()).isPresent();
    assertThat(times.get("code").timeNs()).isPresent();
    assertThat(times.get("object").timeNs()).isEmpty();
  }

  @Test
  void anObjectAndCodeInAnotherJvmGiveTheSameAnswers() {
    Run run = both().withoutTiming().runText(PLAN);

    assertThat(run.timings()).isEmpty();
    assertThat(answers(run, "code")).hasSize(2).isEqualTo(answers(run, "object"));
    assertThat(both().candidates("sum")).startsWith("recursive").endsWith("object", "code");
  }

  private static List<String> answers(Run run, String candidate) {
    return run.observations().stream()
        .filter(row -> row.candidate().equals(candidate))
        .map(row -> row.problem() + " " + row.answerDigest().orElseThrow())
        .toList();
  }

  @Test
  void threadsDoNotShowAndProgressDoes() {
    Steelyard steelyard = Steelyard.standard().withoutTiming();
    List<String> heard = Collections.synchronizedList(new ArrayList<>());

    List<Observation> alone = steelyard.withThreads(1).runText(PLAN).observations();
    List<Observation> together =
        steelyard
            .withThreads(4)
            .withProgress((phase, at, done, total) -> heard.add(at))
            .runText(PLAN)
            .observations();

    assertThat(together).isEqualTo(alone);
    assertThat(heard).hasSize(2);
  }

  @Test
  void plansAreAdjustedBeforeTheyRun() {
    Plan plan = Steelyard.standard().withoutTiming().plan("tour").only("dot").withSeed(7);

    assertThat(plan.weighings()).isNotEmpty().allMatch(each -> each.task().equals("dot"));
    assertThat(plan.seed()).isEqualTo(7);
    assertThat(plan.timing()).isEmpty();
  }

  @Test
  void aRunIsPutInWords(@TempDir Path folder) {
    Steelyard steelyard = Steelyard.standard().withoutTiming();
    Plan plan = steelyard.planOf(PLAN);
    Run run = steelyard.run(plan);
    Requirement easy = new Requirement("sum", 1, 1e9, 10, List.of(), List.of());

    assertThat(RunText.summary(run)).contains("recursive");
    assertThat(RunText.decision(run, easy)).contains("Required of sum at n = 10");
    assertThat(RunText.findings(plan, run))
        .singleElement()
        .asString()
        .contains("no candidate of sum meets the plan's requirement");
    Steelyard.write(run, folder.resolve("run"));
    Steelyard.replace(run, folder.resolve("run"));
    assertThat(Steelyard.read(folder.resolve("run")).observations()).hasSize(2);
    assertThatThrownBy(() -> Steelyard.write(run, folder.resolve("run")))
        .hasMessageContaining("a run is already there");
  }

  @Test
  void aCandidateSaysWhatItIsFor() {
    Candidate<Summation> picky =
        Candidate.<Summation>of("picky", ExtensionsTest::backwards, "few terms", "n", "invented")
            .within(Scope.upTo(9));

    Run run = Steelyard.standard().with(Summation.class, picky).withoutTiming().runText(PLAN);

    assertThat(run.observations())
        .filteredOn(row -> row.candidate().equals("picky"))
        .hasSize(2)
        .allMatch(row -> row.status() == Status.NOT_APPLICABLE);
  }

  @Test
  void weighsDataInMemory() {
    double[] terms = {0x1p60, 1, -0x1p60, 2};
    Run run = both().inThisJvm().withoutTiming().weigh("sum", new Terms(terms));

    assertThat(run.observations()).extracting(Observation::candidate).contains("object", "code");
    assertThat(run.observations())
        .filteredOn(row -> List.of("object", "code").contains(row.candidate()))
        .allSatisfy(row -> assertThat(row.answer()).hasValue(backwards(terms)));
    assertThat(run.observations())
        .filteredOn(row -> row.candidate().equals("exact"))
        .allSatisfy(row -> assertThat(row.answer()).hasValue(3));
    assertThat(RunText.attainment(run)).contains("exact", "object");
  }

  @Test
  void whatIsWrongWithCodeIsSaidInASentence() {
    Steelyard steelyard = Steelyard.standard();

    assertThatThrownBy(() -> steelyard.withCode("sum", "kahan", CODE))
        .hasMessageContaining("choose another id");
    assertThatThrownBy(() -> steelyard.withCode("summ", "mine", CODE))
        .hasMessageContaining("did you mean 'sum'?");
    assertThatThrownBy(
            () ->
                steelyard
                    .with(Summation.class, "mine", ExtensionsTest::backwards)
                    .withCode("sum", "mine", CODE))
        .hasMessageContaining("choose another id");
  }
}
