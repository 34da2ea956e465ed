package steelyard.harness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.harness.task.Tasks;

class PlanRoundTripTest {

  private final PlanReader reader = new PlanReader(Catalogues.SMALL);

  @Test
  void spellsEverythingOut() {
    Plan plan =
        reader.read(
            "p.toml",
            """
            name = "two \\"silos\\" \\\\ é"
            [[weigh]]
            task = "sum"
            conditions = [1, 1.5, 1e16, 123456789012345678]
            [[weigh]]
            task = "solve"
            time = "none"
            [timing]
            [[require]]
            task = "sum"
            error = 1e-14
            condition_up_to = 1e10
            size = 1000
            """);

    assertThat(plan.toToml())
        .isEqualTo(
            """
            name = "two \\"silos\\" \\\\ é"
            seed = 1

            [timing]
            forks = 1
            warmup = 3
            measurement = 5
            iteration_ms = 100

            [[weigh]]
            task = "sum"
            families = ["cancelling", "same-sign"]
            candidates = ["recursive", "kahan", "pairwise"]
            conditions = [1, 1.5, 1e16, 1.2345678901234568e17]
            sizes = [100]
            repeats = 3
            time = "cancelling"
            timeout_ms = 10000

            [[weigh]]
            task = "solve"
            families = ["spectrum", "hilbert"]
            candidates = ["gepp", "cramer"]
            conditions = [1, 1e4, 1e8, 1e12]
            sizes.spectrum = [100]
            sizes.hilbert = [12]
            repeats = 3
            time = "none"
            timeout_ms = 10000

            [[require]]
            task = "sum"
            error = 1e-14
            condition_up_to = 1e10
            size = 1000
            """);
    assertThat(reader.read("other.toml", plan.toToml())).isEqualTo(plan);
  }

  @Test
  void keepsWhateverAPlanHolds() {
    Plan plan =
        new Plan(
            "p",
            Long.MIN_VALUE,
            List.of(
                new Addition("sum", "mine", "com.acme.Totals#net(double[])", List.of("/a b.jar")),
                new Addition("solve", "bare", "com.acme.Solver", List.of())),
            Optional.of(new TimingEffort(3, 0, 1, 1, List.of(7, 5))),
            List.of(
                new Weighing(
                    "sum",
                    List.of(
                        new FamilyShare("same-sign", List.of(), List.of(1, 1_000_000)),
                        new FamilyShare(
                            "cancelling", List.of(Math.nextUp(1.0), 1e32, 1.0), List.of(9))),
                    List.of("pairwise"),
                    10_000,
                    Optional.of("same-sign"),
                    1)),
            List.of(new Requirement("sum", Double.MIN_VALUE, Double.MAX_VALUE, 1)));

    assertThat(reader.read("q", plan.toToml())).isEqualTo(plan);
  }

  @ParameterizedTest
  @ValueSource(strings = {"tour", "nightly"})
  void keepsBuiltInPlans(String name) {
    PlanReader three = new PlanReader(Catalogue.of(Tasks.all()));
    Plan plan = three.find(name);

    assertThat(three.read("plan.toml", plan.toToml())).isEqualTo(plan);
  }

  @Test
  void isTheSameInEveryLocale() {
    Locale before = Locale.getDefault();
    String plain = new PlanReader(Catalogue.of(Tasks.all())).find("tour").toToml();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-SA-u-nu-arab"));
      assertThat(new PlanReader(Catalogue.of(Tasks.all())).find("tour").toToml()).isEqualTo(plain);
    } finally {
      Locale.setDefault(before);
    }
  }
}
