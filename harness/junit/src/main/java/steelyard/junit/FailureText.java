package steelyard.junit;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Candidate;
import steelyard.harness.data.DoubleText;
import steelyard.harness.execution.Workbench;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.text.Figures;

/** Says in a few lines why an assertion failed, on which problem the most, and how to see it. */
final class FailureText<K, D extends Data> {

  private static final List<Status> ANSWERED =
      List.of(Status.OK, Status.NAN, Status.INFINITE, Status.MALFORMED);

  private final Task<K, D> task;
  private final Candidate<K> candidate;
  private final Scenario<D> scenario;
  private final Outcome outcome;
  private final StringBuilder text = new StringBuilder();

  FailureText(Task<K, D> task, Candidate<K> candidate, Scenario<D> scenario, Outcome outcome) {
    this.task = task;
    this.candidate = candidate;
    this.scenario = scenario;
    this.outcome = outcome;
  }

  AssertionFailedError error(String claim, Check.Finding finding) {
    text.append("expected the ")
        .append(task.id())
        .append(" '")
        .append(candidate.id())
        .append("' to ")
        .append(claim)
        .append(", but ")
        .append(finding.what());
    if (finding.worst().isEmpty()) {
      tried();
      return new AssertionFailedError(text.toString());
    }
    Observation worst = finding.worst().get();
    Problem<D> problem = problem(worst);
    Answers answers =
        ANSWERED.contains(worst.status())
            ? Answers.of(task, candidate.kernel(), problem)
            : Answers.expectedOf(problem);
    String got = answers.got().orElseGet(() -> noAnswer(worst));
    line("worst problem", worst.problem());
    line("condition", Figures.error(worst.condition()));
    line("expected", answers.expected());
    line("got", got);
    errors(worst);
    if (!finding.allowed().isEmpty()) {
      line("allowed", finding.allowed());
    }
    tried();
    line("make it again", "./steelyard problems " + worst.problem());
    line("", "Steelyard.standard().problem(\"" + worst.problem() + "\")");
    return new AssertionFailedError(text.toString(), answers.expected(), got);
  }

  private void errors(Observation worst) {
    if (worst.isJudged()) {
      line(
          "errors",
          "forward %s, backward %s, excess %s"
              .formatted(
                  Figures.error(worst.forwardError()),
                  Figures.error(worst.backwardError()),
                  Figures.plain(worst.excess())));
    } else {
      line("status", noAnswer(worst));
    }
  }

  private static String noAnswer(Observation row) {
    return row.detail().isEmpty() ? row.status().text() : row.status().text() + ": " + row.detail();
  }

  private void tried() {
    Map<String, Long> tried = outcome.triedByFamily();
    String families =
        tried.entrySet().stream()
            .map(each -> each.getKey() + " " + each.getValue())
            .collect(Collectors.joining(", "));
    long total = tried.values().stream().mapToLong(Long::longValue).sum();
    line(
        "tried",
        total + (total == 1 ? " problem" : " problems") + (total == 0 ? "" : ": " + families));
    line(
        "",
        "condition numbers up to %s, sizes %s, repeats %s, seed %s"
            .formatted(
                DoubleText.shortest(scenario.conditionUpTo()),
                scenario.sizesFor(task).stream()
                    .map(String::valueOf)
                    .collect(Collectors.joining(", ")),
                scenario.repeats(),
                scenario.seed()));
    Optional<String> leftOut = outcome.leftOut();
    leftOut.ifPresent(reasons -> line("left out", reasons));
    if (outcome.stopped()) {
      line("", "no more were tried after a call that did not return");
    }
  }

  private Problem<D> problem(Observation row) {
    ProblemId id = ProblemId.parse(row.problem());
    return new Workbench(List.of(task))
        .family(task, id.family())
        .generate(id.request(), id.randomness());
  }

  private void line(String label, String value) {
    text.append("\n  ");
    text.append(label).append(" ".repeat(15 - label.length())).append(value);
  }
}
