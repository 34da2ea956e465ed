package steelyard.results.table;

import static steelyard.results.table.Column.choice;
import static steelyard.results.table.Column.flag;
import static steelyard.results.table.Column.hex;
import static steelyard.results.table.Column.integer;
import static steelyard.results.table.Column.note;
import static steelyard.results.table.Column.number;
import static steelyard.results.table.Column.text;
import static steelyard.results.table.Column.whole;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.results.Observation;
import steelyard.results.Observation.Claim;
import steelyard.results.Rounding;
import steelyard.results.Status;

/** The columns of {@code errors.csv}. */
public final class ErrorsTable {
  private static final Labels<Status> STATUSES = new Labels<>(Status.values(), Status::text);

  private static final Labels<Rounding> ROUNDINGS =
      new Labels<>(Rounding.values(), ErrorsTable::roundingText);

  /** One row per candidate and problem. */
  public static final TableSchema<Observation> SCHEMA =
      new TableSchema<>(
          "errors",
          "One row per candidate and problem: the errors of its answer.",
          columns(),
          ErrorsTable::row);

  private ErrorsTable() {}

  private static List<Column<Observation>> columns() {
    return List.of(
        text("task", "what is computed", Observation::task),
        text("family", "the generator of the problem", Observation::family),
        text("problem", "the id from which the problem can be made again", Observation::problem),
        text("candidate", "the implementation", Observation::candidate),
        integer("size", "1", "the size n of the problem", Observation::size),
        number(
            "target_condition",
            "1",
            "the condition number that the generator aimed at",
            Observation::targetCondition),
        integer("repeat", "1", "the number of this instance, from 0", Observation::repeat),
        whole("seed", "1", "the seed of this instance", Observation::seed),
        integer(
            "precision_bits",
            "bit",
            "the significand p of the working precision; u is 2 to the power -p",
            Observation::precisionBits),
        number(
            "condition",
            "1",
            "the achieved condition number; INF where the exact answer is 0",
            Observation::condition),
        number(
            "componentwise_condition",
            "1",
            "the achieved componentwise condition number",
            Observation::componentwiseCondition),
        flag(
            "target_met",
            "whether the achieved condition number is within a factor of 2 of the target",
            Observation::targetMet),
        note("data_digest", "a digest of the problem's stored data", Observation::dataDigest),
        note("reference_route", "how the reference was computed", Observation::referenceRoute),
        number(
            "reference_bound",
            "1",
            "a rigorous bound on the relative error of the reference; 0 where it is exact",
            Observation::referenceBound),
        choice(
            "status",
            "what became of the candidate on the problem",
            true,
            STATUSES.texts(),
            o -> Optional.of(o.status().text())),
        note("detail", "why the status is not ok; empty where it is", o -> Optional.of(o.detail())),
        number(
            "backward_error", "1", "the backward error of the answer", Observation::backwardError),
        number("forward_error", "1", "the relative error of the answer", Observation::forwardError),
        number(
            "componentwise_backward_error",
            "1",
            "the componentwise backward error of the answer",
            Observation::componentwiseBackwardError),
        number(
            "componentwise_forward_error",
            "1",
            "the largest relative error of a component of the answer",
            Observation::componentwiseForwardError),
        number(
            "excess",
            "1",
            "forward_error / (max(condition, 1) u): how many times worse than conditioning alone"
                + " explains",
            Observation::excess),
        choice(
            "rounding",
            "how the answer sits among the floating-point numbers",
            false,
            ROUNDINGS.texts(),
            o -> o.rounding().map(ErrorsTable::roundingText)),
        note(
            "bound_limits",
            "the error that a claimed bound limits",
            o -> o.claim().map(Claim::limits)),
        number("bound", "1", "the value of the claimed bound here", ErrorsTable::bound),
        flag(
            "bound_held", "whether the error is within the bound", o -> o.claim().map(Claim::held)),
        hex(
            "answer_hex",
            "1",
            "the answer to the last bit, where it is one number",
            Observation::answer),
        note("answer_digest", "a digest of the answer", Observation::answerDigest));
  }

  private static Observation row(Cells cells) {
    return new Observation(
        cells.text("task"),
        cells.text("family"),
        cells.text("problem"),
        cells.text("candidate"),
        cells.integer("size"),
        cells.number("target_condition"),
        cells.integer("repeat"),
        cells.whole("seed"),
        cells.integer("precision_bits"),
        cells.number("condition"),
        cells.number("componentwise_condition"),
        cells.flag("target_met"),
        cells.note("data_digest"),
        cells.note("reference_route"),
        cells.number("reference_bound"),
        STATUSES.value(cells.text("status")),
        cells.text("detail"),
        cells.number("backward_error"),
        cells.number("forward_error"),
        cells.number("componentwise_backward_error"),
        cells.number("componentwise_forward_error"),
        cells.number("excess"),
        cells.note("rounding").map(ROUNDINGS::value),
        claim(cells),
        cells.hex("answer_hex"),
        cells.note("answer_digest"));
  }

  private static String roundingText(Rounding rounding) {
    return rounding.name().toLowerCase(Locale.ROOT);
  }

  private static OptionalDouble bound(Observation observation) {
    return observation.claim().stream().mapToDouble(Claim::bound).findFirst();
  }

  private static Optional<Claim> claim(Cells cells) {
    Optional<String> limits = cells.note("bound_limits");
    OptionalDouble bound = cells.number("bound");
    Optional<Boolean> held = cells.flag("bound_held");
    if (limits.isEmpty() && bound.isEmpty() && held.isEmpty()) {
      return Optional.empty();
    }
    if (limits.isEmpty() || bound.isEmpty() || held.isEmpty()) {
      throw cells.wrong(
          "bound_limits", "bound_limits, bound and bound_held must be all filled or all empty");
    }
    return Optional.of(new Claim(limits.get(), bound.getAsDouble(), held.get()));
  }
}
