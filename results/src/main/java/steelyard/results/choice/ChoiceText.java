package steelyard.results.choice;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.table.GuardedText;
import steelyard.results.text.Figures;
import steelyard.results.text.TextTable;
import steelyard.results.text.TextTable.Heading;
import steelyard.results.text.TimeScale;
import steelyard.results.text.Wrap;

/** A choice as plain text that can be pasted into a ticket. */
public final class ChoiceText {
  /** No line is wider. */
  public static final int WIDTH = 100;

  private final Choice choice;
  private final StringBuilder out = new StringBuilder();

  private ChoiceText(Choice choice) {
    this.choice = choice;
  }

  /** Renders a choice. */
  public static String render(Choice choice) {
    return render(choice, Optional.empty());
  }

  /** Renders a choice, and says what would be chosen without the families that nearly all fail. */
  public static String render(Choice choice, Optional<Choice> spared) {
    return new ChoiceText(choice).text(spared);
  }

  private String text(Optional<Choice> spared) {
    Requirement need = choice.requirement();
    say(
        "Required of %s at n = %s: forward error at most %s for condition numbers up to %s.",
        need.task(), need.size(), e(need.maxForwardError()), e(need.conditionUpTo()));
    say(
        "Tried: %s, condition numbers up to %s, families %s.",
        count(choice.problems(), "problem"),
        e(choice.maxCondition()),
        String.join(", ", choice.families()));
    if (choice.unplaced() > 0) {
      say(
          "Left out: %s whose condition number is not known.",
          count(choice.unplaced(), "observation"));
    }
    out.append('\n');
    decide();
    spared.ifPresent(this::spare);
    out.append('\n');
    qualified();
    rejected();
    inapplicable();
    say("This is evidence from the problems tried, not a proof.");
    return out.toString();
  }

  private void decide() {
    Optional<Qualified> winner = choice.winner();
    if (winner.isPresent()) {
      decideFor(winner.get());
    } else if (!choice.qualified().isEmpty()) {
      say(
          "DECISION: open. No time was measured at this size%s, so the fastest is not known; %s.",
          choice.timedSizes().isEmpty() ? "" : " (only at " + sizes() + ")",
          choice.qualified().size() == 1
              ? choice.qualified().get(0).candidate() + " alone meets the requirement"
              : choice.qualified().size() + " candidates meet the requirement");
    } else {
      say("DECISION: none. No candidate meets the requirement.");
      choice
          .nearestMiss()
          .ifPresent(
              miss ->
                  say(
                      "Nearest miss: %s with a worst error of %s on %s.",
                      miss.candidate(), e(miss.error().orElseThrow()), miss.problem()));
    }
  }

  private void spare(Choice other) {
    List<String> left = new ArrayList<>(other.requirement().except());
    left.removeAll(choice.requirement().except());
    long failing =
        choice.rejected().stream().filter(r -> r.reason() == Rejected.Reason.FAILED).count();
    String leaders = other.leaders().isEmpty() ? "none" : String.join(", ", other.leaders());
    say(
        "Without %s, on which %s: %s. Leave out what cannot occur where you are.",
        String.join(", ", left), count((int) failing, "candidate") + " failed", leaders);
  }

  private void decideFor(Qualified winner) {
    say(
        "DECISION: %s, %s the requirement.",
        winner.candidate(),
        choice.qualified().size() == 1
            ? "the only candidate that meets"
            : "the fastest of " + choice.qualified().size() + " candidates that meet");
    say(
        "Its worst error is %s on %s: %s below the requirement.",
        e(winner.worstError()),
        winner.worstProblem(),
        Double.isInfinite(winner.margin())
            ? "infinitely far"
            : "a factor of " + Figures.plain(winner.margin()));
    if (!choice.tied().isEmpty()) {
      say(
          "TIE: its time cannot be told apart from that of %s (the intervals overlap).",
          choice.tied().stream().map(Qualified::candidate).collect(Collectors.joining(", ")));
    } else {
      choice.runnerUp().ifPresent(next -> say("Runner-up: %s.", next.candidate()));
    }
  }

  private void qualified() {
    if (choice.qualified().isEmpty()) {
      return;
    }
    double shortest = choice.qualified().get(0).timeOrInfinity();
    TimeScale scale = TimeScale.forShortest(Double.isInfinite(shortest) ? 1 : shortest);
    TextTable table =
        new TextTable(
            List.of(
                Heading.text("meets it"),
                Heading.number("worst error"),
                Heading.number("margin"),
                Heading.number("problems"),
                Heading.number("condition up to"),
                Heading.number(Double.isInfinite(shortest) ? "time" : scale.unit() + " per call"),
                Heading.number("x textbook")));
    for (Qualified q : choice.qualified()) {
      table.add(
          List.of(
              q.candidate(),
              e(q.worstError()),
              Figures.plain(q.margin()),
              Integer.toString(q.problems()),
              e(q.maxCondition()),
              scale.interval(
                  time(q, Timing::timeNs), time(q, Timing::timeLowNs), time(q, Timing::timeHighNs)),
              Figures.interval(
                  time(q, Timing::ratio), time(q, Timing::ratioLow), time(q, Timing::ratioHigh))));
    }
    out.append(table.render(WIDTH)).append('\n');
  }

  private void rejected() {
    if (choice.rejected().isEmpty()) {
      return;
    }
    TextTable table =
        new TextTable(
            List.of(Heading.text("does not"), Heading.text("why"), Heading.text("worst problem")));
    choice.rejected().forEach(r -> table.add(List.of(r.candidate(), why(r), r.problem())));
    out.append(table.render(WIDTH)).append('\n');
  }

  private void inapplicable() {
    if (choice.inapplicable().isEmpty()) {
      return;
    }
    TextTable table =
        new TextTable(
            List.of(Heading.text("not for these"), Heading.text("why"), Heading.text("such as")));
    for (Inapplicable i : choice.inapplicable()) {
      table.add(
          List.of(
              i.candidate(),
              "not applicable to " + i.count() + " of " + count(choice.problems(), "problem"),
              i.problem()));
    }
    out.append(table.render(WIDTH)).append('\n');
  }

  private static String why(Rejected r) {
    String on = " on " + count(r.count(), "problem");
    return switch (r.reason()) {
      case FAILED -> r.status().map(Status::text).orElseThrow() + on;
      case INACCURATE -> "error up to " + e(r.error().orElseThrow()) + ", too large" + on;
      case UNCERTIFIED -> "error not certified" + on;
      case UNTRIED -> "not tried" + on;
    };
  }

  private static OptionalDouble time(Qualified q, Function<Timing, OptionalDouble> figure) {
    return q.timing().map(figure).orElse(OptionalDouble.empty());
  }

  private String sizes() {
    return choice.timedSizes().stream()
        .map(size -> "n = " + size)
        .collect(Collectors.joining(", "));
  }

  private static String e(double value) {
    return Figures.error(value);
  }

  private static String count(int count, String noun) {
    return count + " " + noun + (count == 1 ? "" : "s");
  }

  private void say(String template, Object... texts) {
    String[] parts = template.split("%s", -1);
    StringBuilder sentence = new StringBuilder(parts[0]);
    for (int i = 1; i < parts.length; i++) {
      sentence.append(texts[i - 1]).append(parts[i]);
    }
    Wrap.lines(GuardedText.visible(sentence.toString()), WIDTH)
        .forEach(line -> out.append(line).append('\n'));
  }
}
