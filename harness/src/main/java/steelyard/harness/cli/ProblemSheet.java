package steelyard.harness.cli;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import steelyard.harness.data.DataDigest;
import steelyard.harness.data.DoubleText;
import steelyard.harness.input.Inexact;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.results.text.Figures;
import steelyard.results.text.Wrap;

/** What is known of a user's own problem before any candidate is tried, for the screen. */
final class ProblemSheet {

  private static final int WIDTH = 100;
  private static final String INDENT = "  ";
  private static final int DIGITS = 25;
  private static final int MOST_ENTRIES = 3;
  private static final double UNIT_ROUNDOFF = 0x1p-53;

  private final String id;
  private final String source;
  private final Problem<?> problem;
  private final Inexact inexact;
  private final double kappa;
  private final List<BigDecimal> answer;

  ProblemSheet(String id, String source, Problem<?> problem, Inexact inexact) {
    this.id = id;
    this.source = source;
    this.problem = problem;
    this.inexact = inexact;
    this.kappa = problem.condition().kappa();
    this.answer = problem.reference().answer(new MathContext(2 * DIGITS));
  }

  List<String> lines() {
    List<String> lines = new ArrayList<>();
    lines.add(id + " from " + source);
    say(
        lines,
        "size n: " + problem.size() + "; digest of the data: " + DataDigest.of(problem.data()));
    say(lines, "condition number \u03BA: " + condition());
    say(lines, "exact answer for the stored doubles: " + answerText());
    say(lines, inexact.words());
    lines.add("");
    lines.add("How accurate can any algorithm be here?");
    say(lines, best());
    say(lines, stable());
    if (inexact.count() > 0) {
      say(lines, dataError());
    }
    return lines;
  }

  private String condition() {
    String componentwise =
        problem.condition().componentwise().isPresent()
            ? " (componentwise " + Figures.error(problem.condition().componentwise()) + ")"
            : "";
    return Figures.error(kappa) + componentwise;
  }

  private String answerText() {
    String entries =
        answer.stream()
            .limit(MOST_ENTRIES)
            .map(entry -> DoubleText.scientific(entry, DIGITS))
            .collect(Collectors.joining(", "));
    return answer.size() > MOST_ENTRIES ? entries + ", ... " + answer.size() + " entries" : entries;
  }

  private String best() {
    double[] nearest = answer.stream().mapToDouble(BigDecimal::doubleValue).toArray();
    Judgement judgement = problem.judge(nearest);
    if (judgement.standing() != Judgement.Standing.OK) {
      return "Not at all: the exact answer lies beyond the largest double.";
    }
    String which = answer.size() == 1 ? "The double nearest" : "The doubles nearest";
    return which
        + " to the exact answer "
        + (answer.size() == 1 ? "has" : "have")
        + " a relative error of "
        + Figures.error(judgement.forwardError())
        + "; no algorithm that returns doubles can do better.";
  }

  private String stable() {
    if (Double.isInfinite(kappa)) {
      return "The exact answer is zero, so that any other answer is infinitely far away; a backward"
          + " stable algorithm may return one.";
    }
    return "A backward stable algorithm may lose about \u03BA u = "
        + Figures.error(Math.max(kappa, 1) * UNIT_ROUNDOFF)
        + ", times a modest function of n.";
  }

  private String dataError() {
    if (inexact.belowNormal() > 0) {
      return "Rounding the values of the file may have moved the exact answer by any amount, since "
          + inexact.belowNormal()
          + " of them lie below the least normal double.";
    }
    if (Double.isInfinite(kappa)) {
      return "Rounding the values of the file may have moved the exact answer by any amount,"
          + " relative to zero.";
    }
    return "Rounding the values of the file alone may have moved the exact answer by up to about"
        + " \u03BA u: an error far below that is exact for the stored doubles, and says nothing more"
        + " of the numbers as written.";
  }

  private static void say(List<String> lines, String sentence) {
    Wrap.lines(sentence, WIDTH - INDENT.length()).forEach(line -> lines.add(INDENT + line));
  }
}
