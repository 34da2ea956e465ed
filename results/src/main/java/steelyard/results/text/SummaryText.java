package steelyard.results.text;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import steelyard.results.Grade;
import steelyard.results.Timing;
import steelyard.results.Tradeoff;
import steelyard.results.Verdict;
import steelyard.results.text.TextTable.Heading;

/** The summary of a run for a terminal: one compact table per task. */
public final class SummaryText {
  /** No line is wider. */
  public static final int WIDTH = 120;

  private static final String LEGEND =
      """
      worst excess: forward error / (max(condition number, 1) u), the largest seen.
      fails from \u03BA: where it is unstable, the smallest condition number at which forward stability is violated.
      frontier: on how many families, at the largest size, no candidate is both as accurate and as fast.
      A verdict is evidence from the problems tried, not a proof.
      """;

  private SummaryText() {}

  /**
   * Renders a run.
   *
   * @param colour whether rows that need attention are coloured by ANSI escape sequences
   */
  public static String render(
      List<Verdict> verdicts, List<Timing> timings, List<Tradeoff> tradeoffs, boolean colour) {
    Set<String> tasks =
        verdicts.stream().map(Verdict::task).collect(Collectors.toCollection(LinkedHashSet::new));
    StringBuilder out = new StringBuilder();
    for (String task : tasks) {
      List<Verdict> rows =
          verdicts.stream().filter(v -> v.task().equals(task) && v.spansAllFamilies()).toList();
      TaskTimes times = TaskTimes.of(task, timings);
      FrontierCount frontier = FrontierCount.of(task, tradeoffs);
      out.append(task).append(": ").append(times.title()).append('\n');
      out.append(table(rows, families(task, verdicts), times, frontier, colour)).append('\n');
    }
    return out.append(LEGEND).toString();
  }

  /** Counts the families that each candidate of a task is for. */
  private static Map<String, Integer> families(String task, List<Verdict> verdicts) {
    return verdicts.stream()
        .filter(v -> v.task().equals(task) && !v.spansAllFamilies())
        .filter(v -> v.grade() != Grade.NOT_APPLICABLE)
        .collect(Collectors.toMap(Verdict::candidate, v -> 1, Integer::sum));
  }

  private static String table(
      List<Verdict> rows,
      Map<String, Integer> families,
      TaskTimes times,
      FrontierCount frontier,
      boolean colour) {
    TextTable table =
        new TextTable(
            List.of(
                Heading.text("candidate"),
                Heading.text("verdict"),
                Heading.number("worst excess"),
                Heading.number("worst backward"),
                Heading.number("fails from \u03BA"),
                Heading.number(times.heading()),
                Heading.number("x textbook"),
                Heading.number("frontier")));
    for (Verdict v : rows) {
      table.add(
          List.of(
              v.candidate(),
              VerdictCell.text(v, families.getOrDefault(v.candidate(), 0)),
              Figures.plain(v.worstExcess()),
              Figures.error(v.worstBackwardError()),
              Figures.error(v.failsFromCondition()),
              times.time(v.candidate()),
              times.ratio(v.candidate()),
              frontier.text(v.candidate())));
    }
    return table.render(WIDTH, colour ? SummaryText::paint : TextTable.Paint.NONE);
  }

  private static String paint(List<String> cells, String line) {
    String verdict = cells.get(1);
    if (verdict.contains(Grade.FAILED.words()) || verdict.contains(VerdictCell.BROKEN)) {
      return "\u001B[31m" + line + "\u001B[0m";
    }
    return verdict.contains(Grade.UNSTABLE.words()) ? "\u001B[33m" + line + "\u001B[0m" : line;
  }
}
