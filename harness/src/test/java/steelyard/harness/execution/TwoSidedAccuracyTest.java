package steelyard.harness.execution;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import steelyard.harness.run.AccuracyPhase;
import steelyard.harness.run.Assignment;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.ProblemId;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Verdict;
import steelyard.results.verdict.Verdicts;

/**
 * Each candidate passes where theory says that it must, and fails where theory says that it must:
 * the second proves that the problems are hard. ASNA is Higham, Accuracy and Stability of Numerical
 * Algorithms, 2nd ed., 2002; its section and equation numbers in the table, other than (4.4) to
 * (4.8), 9.5 and 10.4, are from memory.
 */
final class TwoSidedAccuracyTest {

  private static final String TABLE = "two-sided.csv";
  private static final int PROBLEMS = 20;
  private static final Duration TIMEOUT = Duration.ofSeconds(30);

  @ParameterizedTest(name = "{0} {1} on {2} at {3}")
  @CsvFileSource(resources = TABLE, numLinesToSkip = 1)
  void theVerdictLiesBetweenWhatTheoryPromisesAndWhatItRulesOut(
      String task,
      String candidate,
      String family,
      Double condition,
      int size,
      String atLeast,
      String notBetter,
      String source) {
    Grade grade = verdict(task, candidate, family, condition, size).grade();
    assertThat(grade).as(source).isBetween(grade(notBetter), grade(atLeast));
  }

  @Test
  void everyCandidateIsInTheTable() throws Exception {
    Set<String> tabled = new TreeSet<>();
    try (var lines = TwoSidedAccuracyTest.class.getResourceAsStream(TABLE)) {
      new String(lines.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .skip(1)
          .map(line -> line.split(",", 3))
          .forEach(cells -> tabled.add(cells[0] + " " + cells[1]));
    }
    Set<String> known = new TreeSet<>();
    for (Task<?, ?> task : Tasks.all()) {
      task.candidates().forEach(each -> known.add(task.id() + " " + each.id()));
    }
    assertThat(tabled).isEqualTo(known);
  }

  private static Verdict verdict(
      String task, String candidate, String family, Double condition, int size) {
    Workbench workbench = new Workbench(Tasks.all());
    OptionalDouble target =
        condition == null ? OptionalDouble.empty() : OptionalDouble.of(condition);
    List<Assignment<?, ?>> assignments = new ArrayList<>();
    for (int repeat = 1; repeat <= PROBLEMS; repeat++) {
      ProblemId id = new ProblemId(task, family, target, size, repeat, 1);
      assignments.add(workbench.assignment(id, List.of(candidate), TIMEOUT));
    }
    List<Observation> rows =
        new AccuracyPhase(2, Progress.SILENT, new Interruption()).run(assignments).observations();
    return Verdicts.of(rows).stream().filter(Verdict::spansAllFamilies).findFirst().orElseThrow();
  }

  private static Grade grade(String text) {
    for (Grade grade : Grade.values()) {
      if (grade.text().equals(text)) {
        return grade;
      }
    }
    throw new IllegalArgumentException("no grade '" + text + "'");
  }
}
