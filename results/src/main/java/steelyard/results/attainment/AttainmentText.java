package steelyard.results.attainment;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.table.GuardedText;
import steelyard.results.text.Figures;
import steelyard.results.text.TextTable;
import steelyard.results.text.TextTable.Heading;
import steelyard.results.text.TimeScale;
import steelyard.results.text.Wrap;

/** The candidates on one problem as a table, and below it who gets how far at the least time. */
public final class AttainmentText {

  /** No line is wider. */
  public static final int WIDTH = 100;

  private static final int MOST_NAMED = 6;

  private final Attainment attainment;
  private final TimeScale scale;
  private final StringBuilder out = new StringBuilder();

  private AttainmentText(Attainment attainment) {
    this.attainment = attainment;
    this.scale =
        TimeScale.forShortest(
            attainment.standings().stream()
                .flatMapToDouble(s -> s.time().stream())
                .min()
                .orElse(1));
  }

  /** Renders the table and the decision. */
  public static String render(Attainment attainment) {
    return new AttainmentText(attainment).text();
  }

  private String text() {
    boolean timed = attainment.fastest(Level.NONE).isPresent();
    table(timed);
    out.append('\n');
    int before = -1;
    for (Level level : List.of(Level.LAST_BIT, Level.DATA, Level.STABLE)) {
      int reaching = attainment.reaching(level).size();
      if (reaching != before) {
        say(reached(level));
      }
      before = reaching;
    }
    out.append('\n');
    say(decision());
    return out.toString();
  }

  private void table(boolean timed) {
    TextTable table =
        new TextTable(
            List.of(
                Heading.text("candidate"),
                Heading.text("accuracy"),
                Heading.number("forward"),
                Heading.number("backward"),
                Heading.number("excess"),
                Heading.number(timed ? scale.unit() + " per call" : "time"),
                Heading.number("x textbook")));
    for (Standing each : attainment.standings()) {
      Observation row = each.row();
      table.add(
          List.of(
              row.candidate(),
              accuracy(each),
              Figures.error(row.forwardError()),
              Figures.error(row.backwardError()),
              Figures.plain(row.excess()),
              time(each),
              Figures.plain(each.timing().map(Timing::ratio).orElse(OptionalDouble.empty()))));
    }
    out.append(table.render(WIDTH));
  }

  private static String accuracy(Standing each) {
    Observation row = each.row();
    if (row.status() != Status.OK) {
      return row.detail().isEmpty()
          ? row.status().text()
          : row.status().text() + ": " + row.detail();
    }
    boolean broken = row.claim().filter(claim -> !claim.held()).isPresent();
    return each.level().word() + (broken ? ", bound broken" : "");
  }

  private String time(Standing each) {
    return each.timing()
        .map(t -> scale.interval(t.timeNs(), t.timeLowNs(), t.timeHighNs()))
        .orElse(Figures.NONE);
  }

  private String reached(Level level) {
    List<Standing> reaching = attainment.reaching(level);
    long judged = attainment.standings().stream().filter(s -> s.level() != Level.NONE).count();
    String head = meaning(level) + ": " + reaching.size() + " of " + judged + " get there";
    if (reaching.isEmpty()) {
      return head + ".";
    }
    return attainment
        .fastest(level)
        .map(
            best ->
                head
                    + "; the fastest is "
                    + best.candidate()
                    + " at "
                    + time(best)
                    + " "
                    + scale.unit()
                    + tie(level)
                    + ".")
        .orElseGet(() -> head + ": " + names(reaching) + ".");
  }

  private String tie(Level level) {
    List<Standing> tied = attainment.tied(level);
    return tied.isEmpty() ? "" : ", not told apart from " + names(tied);
  }

  private static String meaning(Level level) {
    return switch (level) {
      case LAST_BIT -> "To the last bit (one of the two doubles around the exact answer)";
      case DATA -> "Within max(\u03BA, 1) u (what a relative change of u in the data explains)";
      case STABLE -> "Within 10 n max(\u03BA, 1) u (what a stable algorithm may lose)";
      default -> throw new IllegalArgumentException("no accuracy to get to: " + level);
    };
  }

  private String decision() {
    Level best =
        attainment.standings().stream()
            .map(Standing::level)
            .min(Level::compareTo)
            .orElse(Level.NONE);
    if (best == Level.NONE) {
      return "DECISION: none. No candidate gave an answer that could be judged.";
    }
    if (best == Level.WORSE) {
      return "DECISION: none. No candidate is even as accurate as a stable algorithm.";
    }
    return attainment
        .fastest(best)
        .map(
            fastest ->
                "DECISION: "
                    + fastest.candidate()
                    + " is the fastest that gets "
                    + goal(best)
                    + lesser(best, fastest)
                    + ".")
        .orElseGet(
            () ->
                "DECISION: open. No time was taken, so the fastest is not known; "
                    + names(attainment.reaching(best))
                    + (attainment.reaching(best).size() == 1 ? " gets " : " get ")
                    + goal(best)
                    + ".");
  }

  /** What is faster where less will do: of each such candidate, the most accurate level. */
  private String lesser(Level best, Standing fastest) {
    Map<String, Level> faster = new LinkedHashMap<>();
    for (Level level : List.of(Level.DATA, Level.STABLE)) {
      attainment
          .fastest(level)
          .filter(s -> level.compareTo(best) > 0 && s.isFasterBeyondDoubt(fastest))
          .ifPresent(s -> faster.putIfAbsent(s.candidate(), level));
    }
    return faster.entrySet().stream()
        .map(each -> "; " + each.getKey() + " is faster and gets " + goal(each.getValue()))
        .collect(Collectors.joining());
  }

  private static String goal(Level level) {
    return switch (level) {
      case LAST_BIT -> "to the last bit";
      case DATA -> "within max(\u03BA, 1) u";
      default -> "within 10 n max(\u03BA, 1) u";
    };
  }

  private static String names(List<Standing> standings) {
    String names =
        standings.stream()
            .limit(MOST_NAMED)
            .map(Standing::candidate)
            .collect(Collectors.joining(", "));
    return standings.size() > MOST_NAMED
        ? names + " and " + (standings.size() - MOST_NAMED) + " more"
        : names;
  }

  private void say(String sentence) {
    for (String line : Wrap.lines(GuardedText.visible(sentence), WIDTH)) {
      out.append(line).append('\n');
    }
  }
}
