package steelyard.harness.bring;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import steelyard.harness.execution.Execution;
import steelyard.harness.execution.PlanExecution;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Catalogue;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.PlanReader;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Tasks;
import steelyard.results.Observation;
import steelyard.results.Status;

/** What a candidate from outside does costs its own cells a status, and nobody else anything. */
class HostileCandidatesTest {
  private static final String PLAN =
      """
      [[weigh]]
      task = "sum"
      families = ["random-signs"]
      candidates = ["recursive", "kahan"]
      sizes = [64]
      repeats = 2
      timeout_ms = 8000

      [[weigh]]
      task = "solve"
      families = ["hilbert"]
      candidates = ["gauss-partial"]
      sizes = [4]
      repeats = 1
      """;

  @Test
  void eachGetsItsStatusAndTheOthersTheirNumbers() throws IOException {
    Map<String, Status> expected = new LinkedHashMap<>();
    expected.put("net", Status.OK);
    expected.put("backwards", Status.OK);
    expected.put("throwing", Status.EXCEPTION);
    expected.put("nan", Status.NAN);
    expected.put("recursing", Status.EXCEPTION);
    expected.put("hoarding", Status.EXCEPTION);
    expected.put("writing", Status.MODIFIED_INPUT);
    expected.put("counting", Status.NONDETERMINISTIC);
    expected.put("printing", Status.OK);
    expected.put("starting", Status.OK);
    expected.put("exiting", Status.CRASHED);
    expected.put("halting", Status.CRASHED);
    List<Addition> additions = new ArrayList<>();
    expected.keySet().forEach(name -> additions.add(addition("sum", name, name)));
    additions.add(addition("sum", "single", "net(float[])"));
    additions.add(addition("sum", "writing-single", "writing(float[])"));
    additions.add(addition("solve", "empty", "empty"));
    additions.add(addition("solve", "nothing", "nothing"));
    expected.put("single", Status.OK);
    expected.put("writing-single", Status.MODIFIED_INPUT);
    expected.put("empty", Status.MALFORMED);
    expected.put("nothing", Status.MALFORMED);

    Execution alone = execution(List.of(), 1);
    Execution among = execution(additions, 2);

    assertThat(among.complete()).isTrue();
    assertThat(among.strayCalls()).isZero();
    expected.forEach(
        (candidate, status) ->
            assertThat(rows(among, candidate))
                .as(candidate)
                .isNotEmpty()
                .allSatisfy(row -> assertThat(row.status()).isEqualTo(status)));
    assertThat(rows(among, "exiting").get(0).detail()).isEqualTo("its JVM ended with exit code 7");
    assertThat(rows(among, "hoarding").get(0).detail()).startsWith("OutOfMemoryError");
    assertThat(rows(among, "single").get(0).precisionBits()).isEqualTo(24);
    assertThat(rows(among, "net").get(0).answer())
        .isEqualTo(rows(among, "recursive").get(0).answer());
    for (String candidate : List.of("recursive", "kahan", "gauss-partial")) {
      assertThat(rows(among, candidate)).isEqualTo(rows(alone, candidate));
    }
  }

  @Test
  void aCallThatNeverReturnsEndsWithItsJvm() throws IOException {
    Plan plan = new PlanReader(catalogue()).read("p", PLAN.replace("8000", "700")).only("sum");
    List<Addition> additions = List.of(addition("sum", "endless", "endless"));

    Execution execution = execution(plan.with(additions), 2);

    assertThat(rows(execution, "endless"))
        .allSatisfy(row -> assertThat(row.status()).isEqualTo(Status.TIMEOUT));
    assertThat(execution.complete()).isTrue();
    assertThat(execution.strayCalls()).isZero();
  }

  private static Execution execution(List<Addition> additions, int threads) throws IOException {
    return execution(new PlanReader(catalogue()).read("p", PLAN).with(additions), threads);
  }

  private static Execution execution(Plan plan, int threads) throws IOException {
    try (Bringing bringing =
        new Bringing(Tasks.all(), plan.additions(), Bringing.Isolation.OWN_JVM, threads)) {
      return new PlanExecution(
              bringing.tasks(),
              (task, candidate, data, effort) -> {
                throw new AssertionError("nothing is timed here");
              },
              threads,
              Progress.SILENT,
              new Interruption())
          .execute(plan);
    }
  }

  private static Catalogue catalogue() {
    return Catalogue.of(Tasks.all());
  }

  private static Addition addition(String task, String id, String method) {
    return new Addition(task, id, Ledger.class.getName() + "#" + method, List.of());
  }

  private static List<Observation> rows(Execution execution, String candidate) {
    return execution.observations().stream()
        .filter(row -> row.candidate().equals(candidate))
        .toList();
  }
}
