package steelyard.junit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.OptionalDouble;
import steelyard.algorithms.Candidate;
import steelyard.harness.api.Steelyard;
import steelyard.harness.data.DoubleText;
import steelyard.harness.data.PartsCopy;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.results.Observation;

/** Tells what happened on one problem, and how to see it again. */
final class Witness<K> {
  private static final MathContext DIGITS = new MathContext(20);
  private static final int SHOWN_DIGITS = 3;

  private final Task<K, ?> task;
  private final List<Candidate<K>> candidates;

  private Witness(Task<K, ?> task, List<Candidate<K>> candidates) {
    this.task = task;
    this.candidates = candidates;
  }

  // The task's interface is the candidates', as is compared.
  @SuppressWarnings("unchecked")
  static <K> Witness<K> of(Class<K> kernelType, List<Candidate<K>> candidates) {
    for (Task<?, ?> task : Tasks.all()) {
      if (task.kernelType() == kernelType) {
        return new Witness<>((Task<K, ?>) task, candidates);
      }
    }
    throw new IllegalArgumentException("no task has the interface " + kernelType.getName());
  }

  String taskId() {
    return task.id();
  }

  String name(String candidate) {
    return "the "
        + task.id()
        + " kernel "
        + (candidate.equals(Accuracy.SUBJECT) ? "under test" : "'" + candidate + "'");
  }

  /** Returns the lines about one observation. */
  String text(Observation row) {
    StringBuilder text = new StringBuilder();
    line(text, "problem", row.problem() + number(", condition number ", row.condition()));
    answers(text, task, row);
    if (row.status().isFailure()) {
      line(
          text,
          "status",
          row.status().text() + (row.detail().isEmpty() ? "" : ": " + row.detail()));
    }
    if (row.isJudged()) {
      line(
          text,
          "errors",
          "forward "
              + number("", row.forwardError())
              + number(", backward ", row.backwardError())
              + number(", excess over what conditioning explains ", row.excess()));
    }
    row.claim()
        .ifPresent(claim -> line(text, "bound", shown(claim.bound()) + " on " + claim.limits()));
    line(
        text,
        "see it again",
        "./steelyard problems "
            + row.problem()
            + ", or Steelyard.standard().problem(\""
            + row.problem()
            + "\")");
    return text.toString();
  }

  private <D extends Data> void answers(StringBuilder text, Task<K, D> bound, Observation row) {
    Problem<?> problem = Steelyard.standard().problem(row.problem());
    List<BigDecimal> exact = problem.reference().answer(DIGITS);
    double[] got = got(bound, problem, row);
    int worst = got.length == exact.size() ? worst(exact, got) : 0;
    String entry = exact.size() == 1 ? "" : "entry " + (worst + 1) + ": ";
    line(text, "expected", entry + exact.get(worst));
    if (got.length == exact.size()) {
      line(
          text,
          "got",
          entry + DoubleText.full(got[worst]) + " = " + Double.toHexString(got[worst]));
    }
  }

  private <D extends Data> double[] got(Task<K, D> bound, Problem<?> problem, Observation row) {
    if (row.status().isFailure()) {
      return new double[0];
    }
    K kernel =
        candidates.stream()
            .filter(each -> each.id().equals(row.candidate()))
            .findFirst()
            .orElseThrow()
            .kernel();
    double[] answer = bound.apply(kernel, bound.data(PartsCopy.of(problem.data().parts())));
    return answer == null ? new double[0] : answer;
  }

  private static int worst(List<BigDecimal> exact, double[] got) {
    int worst = 0;
    double largest = -1;
    for (int i = 0; i < got.length; i++) {
      double value = exact.get(i).doubleValue();
      double error = Math.abs(got[i] - value) / Math.abs(value);
      if (error > largest || Double.isNaN(error)) {
        largest = error;
        worst = i;
      }
    }
    return worst;
  }

  private static String number(String label, OptionalDouble value) {
    return value.isPresent() ? label + shown(value.getAsDouble()) : "";
  }

  private static String shown(double value) {
    return Double.isFinite(value) && value != 0
        ? DoubleText.scientific(new BigDecimal(value), SHOWN_DIGITS)
        : DoubleText.shortest(value);
  }

  private static void line(StringBuilder text, String label, String value) {
    text.append("  ").append(label).append(" ".repeat(Math.max(1, 14 - label.length())));
    text.append(value).append('\n');
  }
}
