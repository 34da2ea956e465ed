package steelyard.harness.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.apache.commons.rng.UniformRandomProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Condition;
import steelyard.problems.Family;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.Reach;
import steelyard.problems.Reference;
import steelyard.problems.solve.LinearSystem;
import steelyard.problems.solve.SystemProblem;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.Verdict;
import steelyard.results.table.ErrorsTable;
import steelyard.results.table.TableWriter;
import steelyard.results.verdict.Verdicts;

/**
 * A problem whose reference cannot be certified gets a status and a sentence in every row, and no
 * number that could be taken for an error: from the family to the table and the verdict.
 */
final class UncertifiedProblemsTest {

  private static final List<String> ERRORS =
      List.of(
          "backward_error",
          "forward_error",
          "componentwise_backward_error",
          "componentwise_forward_error",
          "excess",
          "rounding",
          "bound_limits",
          "bound",
          "bound_held");
  private static final List<String> CERTIFIED =
      List.of("condition", "componentwise_condition", "target_met", "reference_bound");

  private static final double[][] WELL_CONDITIONED = {{3, 1}, {1, 2}};

  /** The systems that the family makes, one for each size. */
  private static LinearSystem system(int size) {
    return switch (size) {
      case 1 -> new LinearSystem(WELL_CONDITIONED, new double[] {1, 1});
      case 2 -> new LinearSystem(new double[][] {{1, 2}, {2, 4}}, new double[] {1, 1});
      case 3 ->
          new LinearSystem(
              new double[][] {{1, 2, 3}, {4, 5, 6}, {7, 8, 9}}, new double[] {1, 1, 1});
      default ->
          new LinearSystem(new double[][] {{1e300, 1}, {1, 1e-300 / 3}}, new double[] {1, 1e-320});
    };
  }

  @ParameterizedTest
  @CsvSource({"2, singular", "3, determinant is exactly zero", "4, powers of two"})
  void aProblemWithoutAReferenceGivesASentenceAndNoNumber(int size, String reason)
      throws IOException {
    List<Observation> rows = run(size, SystemProblem::of);
    List<CSVRecord> records = records(rows);
    assertThat(records).hasSameSizeAs(task().candidates()).isNotEmpty();
    for (CSVRecord row : records) {
      assertThat(row.get("status")).isEqualTo("uncertified");
      assertThat(row.get("detail")).contains(reason);
      ERRORS.forEach(column -> assertThat(row.get(column)).as(column).isEmpty());
      CERTIFIED.forEach(column -> assertThat(row.get(column)).as(column).isEmpty());
      assertThat(row.get("answer_hex")).isEmpty();
    }
    requireUnjudged(rows);
  }

  @Test
  void aBoundTooCoarseForTheErrorGivesASentenceAndNoError() throws IOException {
    List<Observation> rows = run(1, system -> new Vague(SystemProblem.of(system)));
    List<CSVRecord> records = records(rows);
    assertThat(records).anyMatch(row -> row.get("status").equals("uncertified"));
    for (CSVRecord row : records) {
      if (!row.get("status").equals("not applicable")) {
        assertThat(row.get("status")).isEqualTo("uncertified");
        assertThat(row.get("detail")).contains("too coarse to tell the error");
        assertThat(row.get("condition")).isNotEmpty();
        assertThat(row.get("reference_bound")).isNotEmpty();
        ERRORS.forEach(column -> assertThat(row.get(column)).as(column).isEmpty());
      }
    }
    requireUnjudged(rows);
  }

  // The same system with its own reference is judged, so that what is missing above is missing for
  // want of a certificate.
  @Test
  void theSameSystemWithItsReferenceIsJudged() {
    assertThat(run(1, SystemProblem::of))
        .anyMatch(row -> row.status() == Status.OK && row.forwardError().isPresent());
  }

  private static void requireUnjudged(List<Observation> rows) {
    for (Verdict verdict : Verdicts.of(rows)) {
      assertThat(verdict.problems()).isZero();
      assertThat(verdict.uncertified() + verdict.notApplicable()).isEqualTo(1);
      assertThat(verdict.grade()).isEqualTo(Grade.UNJUDGED);
      assertThat(verdict.worstForwardError()).isEmpty();
      assertThat(verdict.worstExcess()).isEmpty();
    }
  }

  private static List<CSVRecord> records(List<Observation> rows) throws IOException {
    CSVFormat format = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get();
    return format.parse(new StringReader(TableWriter.text(ErrorsTable.SCHEMA, rows))).getRecords();
  }

  private static List<Observation> run(int size, Certifier certifier) {
    ProblemId id = new ProblemId("solve", "for-a-test", OptionalDouble.empty(), size, 0, 1);
    List<Assignment<?, ?>> assignments = new ArrayList<>();
    Task<LinearSolver, LinearSystem> task = task();
    assignments.add(
        new Assignment<>(
            task, new Fixed(certifier), id, task.candidates(), Duration.ofSeconds(30)));
    AccuracyPhase.Outcome outcome =
        new AccuracyPhase(2, Progress.SILENT, new Interruption()).run(assignments);
    assertThat(outcome.complete()).isTrue();
    return outcome.observations();
  }

  @SuppressWarnings("unchecked")
  private static Task<LinearSolver, LinearSystem> task() {
    return (Task<LinearSolver, LinearSystem>) Tasks.find("solve").orElseThrow();
  }

  /** Makes a problem of a system, or refuses. */
  @FunctionalInterface
  private interface Certifier {
    Problem<LinearSystem> certify(LinearSystem system);
  }

  private record Fixed(Certifier certifier) implements Family<LinearSystem> {
    @Override
    public Profile profile() {
      return new Profile("for-a-test", "for a test", "none", "own construction");
    }

    @Override
    public Reach reach() {
      return Reach.uncontrolled(1, 4);
    }

    @Override
    public Problem<LinearSystem> generate(Request request, UniformRandomProvider random) {
      return certifier.certify(system(request.size()));
    }
  }

  /** A problem with a certified reference that is too coarse for every answer. */
  private record Vague(SystemProblem certified) implements Problem<LinearSystem> {
    @Override
    public LinearSystem data() {
      return certified.data();
    }

    @Override
    public int size() {
      return certified.size();
    }

    @Override
    public Condition condition() {
      return certified.condition();
    }

    @Override
    public Reference reference() {
      return certified.reference();
    }

    @Override
    public Set<String> traits() {
      return certified.traits();
    }

    @Override
    public Judgement judge(double[] answer) {
      return Judgement.without(Judgement.Standing.UNCERTIFIED);
    }
  }
}
