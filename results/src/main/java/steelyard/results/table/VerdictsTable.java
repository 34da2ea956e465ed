package steelyard.results.table;

import static steelyard.results.table.Column.choice;
import static steelyard.results.table.Column.integer;
import static steelyard.results.table.Column.note;
import static steelyard.results.table.Column.number;
import static steelyard.results.table.Column.text;

import java.util.List;
import java.util.Optional;
import steelyard.results.Grade;
import steelyard.results.Verdict;

/** The columns of {@code verdicts.csv}. */
public final class VerdictsTable {
  private static final Labels<Grade> GRADES = new Labels<>(Grade.values(), Grade::text);

  /** One row per candidate and family, and one per candidate over all families of a task. */
  public static final TableSchema<Verdict> SCHEMA =
      new TableSchema<>(
          "verdicts",
          "One row per candidate and family, and one per candidate over all families of a task:"
              + " what its observations amount to.",
          columns(),
          VerdictsTable::row);

  private VerdictsTable() {}

  private static List<Column<Verdict>> columns() {
    return List.of(
        text("task", "what is computed", Verdict::task),
        text("candidate", "the implementation", Verdict::candidate),
        text("family", "the family, or all for all families together", Verdict::family),
        choice(
            "verdict",
            "the best that holds on every problem",
            true,
            GRADES.texts(),
            v -> Optional.of(v.grade().text())),
        choice(
            "verdict_elsewhere",
            "over all families: the verdict over those where it is neither failed nor unstable nor weaker",
            false,
            GRADES.texts(),
            v -> v.elsewhere().map(Grade::text)),
        note(
            "failed_families",
            "over all families: those where the candidate failed, separated by spaces",
            Verdict::failedFamilies),
        note(
            "unstable_families",
            "over all families: those where the candidate is unstable, separated by spaces",
            Verdict::unstableFamilies),
        note(
            "weaker_family",
            "over all families: the one family without which the verdict elsewhere is k-fold",
            Verdict::weakerFamily),
        integer("problems", "1", "on how many problems the answer was judged", Verdict::problems),
        integer(
            "not_applicable",
            "1",
            "how many problems the candidate is not for",
            Verdict::notApplicable),
        integer(
            "uncertified",
            "1",
            "on how many problems the reference could not tell the error",
            Verdict::uncertified),
        integer("failures", "1", "on how many problems the candidate failed", Verdict::failures),
        note(
            "failure_statuses",
            "how often with which status, such as nan:3 timeout:1",
            Verdict::failureStatuses),
        number(
            "min_condition",
            "1",
            "the smallest condition number of a problem judged or failed",
            Verdict::minCondition),
        number(
            "max_condition",
            "1",
            "the largest condition number of a problem judged or failed",
            Verdict::maxCondition),
        number("worst_forward_error", "1", "the largest forward error", Verdict::worstForwardError),
        number(
            "median_forward_error", "1", "the median forward error", Verdict::medianForwardError),
        number(
            "worst_backward_error", "1", "the largest backward error", Verdict::worstBackwardError),
        number("worst_excess", "1", "the largest excess", Verdict::worstExcess),
        note("worst_excess_problem", "the problem of that excess", Verdict::worstExcessProblem),
        number(
            "fails_from_condition",
            "1",
            "where it is unstable: the smallest condition number at which forward stability is"
                + " violated",
            Verdict::failsFromCondition),
        note(
            "fails_from_problem",
            "the problem of that condition number",
            Verdict::failsFromProblem),
        integer("bounds_held", "1", "how often a claimed bound held", Verdict::boundsHeld),
        integer(
            "bounds_broken", "1", "how often a claimed bound was broken", Verdict::boundsBroken),
        note(
            "first_broken_problem",
            "the first problem on which a claimed bound was broken",
            Verdict::firstBrokenProblem));
  }

  private static Verdict row(Cells cells) {
    return new Verdict(
        cells.text("task"),
        cells.text("candidate"),
        cells.text("family"),
        GRADES.value(cells.text("verdict")),
        cells.note("verdict_elsewhere").map(GRADES::value),
        cells.note("failed_families"),
        cells.note("unstable_families"),
        cells.note("weaker_family"),
        cells.integer("problems"),
        cells.integer("not_applicable"),
        cells.integer("uncertified"),
        cells.integer("failures"),
        cells.note("failure_statuses"),
        cells.number("min_condition"),
        cells.number("max_condition"),
        cells.number("worst_forward_error"),
        cells.number("median_forward_error"),
        cells.number("worst_backward_error"),
        cells.number("worst_excess"),
        cells.note("worst_excess_problem"),
        cells.number("fails_from_condition"),
        cells.note("fails_from_problem"),
        cells.integer("bounds_held"),
        cells.integer("bounds_broken"),
        cells.note("first_broken_problem"));
  }
}
