package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class PlanReaderTest {

  private final PlanReader reader = new PlanReader(Catalogues.SMALL);

  @Test
  void takesEveryKeyAsWritten() {
    Plan plan =
        reader.read(
            "p.toml",
            """
            name = "harvest"
            seed = -7

            [timing]
            forks = 2
            warmup = 0
            measurement = 4
            iteration_ms = 20
            sizes = [64, 32]

            [[weigh]]
            task = "sum"
            families = ["same-sign", "cancelling"]
            candidates = ["kahan", "recursive"]
            conditions = [1, 1e4, 2.5e8]
            sizes = [1_000, 10]
            repeats = 5
            time = "cancelling"
            timeout_ms = 250

            [[require]]
            task = "sum"
            error = 1e-14
            condition_up_to = 1e10
            size = 1000
            """);

    assertThat(plan)
        .isEqualTo(
            new Plan(
                "harvest",
                -7,
                List.of(),
                Optional.of(new TimingEffort(2, 0, 4, 20, List.of(64, 32))),
                List.of(
                    new Weighing(
                        "sum",
                        List.of(
                            new FamilyShare("same-sign", List.of(), List.of(1000, 10)),
                            new FamilyShare(
                                "cancelling", List.of(1.0, 1e4, 2.5e8), List.of(1000, 10))),
                        List.of("kahan", "recursive"),
                        5,
                        Optional.of("cancelling"),
                        250)),
                List.of(new Requirement("sum", 1e-14, 1e10, 1000))));
  }

  @Test
  void fillsInWhatIsLeftOut() {
    Plan plan = reader.read("fields/harvest.toml", "[timing]\n[[weigh]]\ntask = 'solve'");

    assertThat(plan)
        .isEqualTo(
            new Plan(
                "harvest",
                PlanReader.DEFAULT_SEED,
                List.of(),
                Optional.of(new TimingEffort(1, 3, 5, 100, List.of())),
                List.of(
                    new Weighing(
                        "solve",
                        List.of(
                            new FamilyShare("spectrum", List.of(1.0, 1e4, 1e8, 1e12), List.of(100)),
                            new FamilyShare("hilbert", List.of(), List.of(12))),
                        List.of("gepp", "cramer"),
                        3,
                        Optional.of("spectrum"),
                        10_000)),
                List.of()));
  }

  @Test
  void timesNothingWithoutATimingTable() {
    assertThat(reader.read("p", "weigh = [{ task = 'sum' }]").timing()).isEmpty();
  }

  @Test
  void cutsWhatIsAskedOfFamiliesThatAreNotNamed() {
    Weighing weighing =
        reader
            .read("p", "[[weigh]]\ntask = 'solve'\nconditions = [10, 1e13]\nsizes = [8, 100, 1]")
            .weighings()
            .get(0);

    assertThat(weighing.families())
        .containsExactly(
            new FamilyShare("spectrum", List.of(10.0, 1e13), List.of(8, 100, 1)),
            new FamilyShare("hilbert", List.of(), List.of(8, 12, 2)));
  }

  @Test
  void givesAFamilyThatReachesNoneOfTheConditionsItsLargest() {
    Catalogue catalogue = Catalogues.three();
    Weighing weighing =
        new PlanReader(catalogue)
            .read("p", "[[weigh]]\ntask = 'solve'\nconditions = [1e15]")
            .weighings()
            .get(0);

    assertThat(weighing.share("badly-scaled").conditions()).containsExactly(1e12);
    assertThat(weighing.share("spectrum-geometric").conditions()).containsExactly(1e15);
  }

  @Test
  void setsConditionsAndSizesFamilyByFamily() {
    Weighing weighing =
        reader
            .read(
                "p",
                """
                [[weigh]]
                task = "solve"
                conditions.spectrum = [1e3]
                sizes.hilbert = [5]
                time = "none"
                """)
            .weighings()
            .get(0);

    assertThat(weighing.families())
        .containsExactly(
            new FamilyShare("spectrum", List.of(1e3), List.of(100)),
            new FamilyShare("hilbert", List.of(), List.of(5)));
    assertThat(weighing.time()).isEmpty();
  }

  @Test
  void letsFamiliesWithoutAKnobIgnoreConditions() {
    Weighing weighing =
        reader
            .read("p", "[[weigh]]\ntask = 'sum'\nfamilies = ['same-sign']\nconditions = [1e300]")
            .weighings()
            .get(0);

    assertThat(weighing.families())
        .containsExactly(new FamilyShare("same-sign", List.of(), List.of(100)));
  }
}
