package steelyard.results.table;

import static steelyard.results.table.Column.flag;
import static steelyard.results.table.Column.integer;
import static steelyard.results.table.Column.note;
import static steelyard.results.table.Column.number;
import static steelyard.results.table.Column.text;

import java.util.List;
import steelyard.results.Tradeoff;

/** The columns of {@code tradeoffs.csv}. */
public final class TradeoffsTable {
  /** One row per candidate, family and size. */
  public static final TableSchema<Tradeoff> SCHEMA =
      new TableSchema<>(
          "tradeoffs",
          "One row per candidate, family and size: its errors beside its time.",
          columns(),
          TradeoffsTable::row);

  private TradeoffsTable() {}

  private static List<Column<Tradeoff>> columns() {
    return List.of(
        text("task", "what is computed", Tradeoff::task),
        text("family", "the generator of the problems", Tradeoff::family),
        integer("size", "1", "the size n of the problems", Tradeoff::size),
        text("candidate", "the implementation", Tradeoff::candidate),
        integer("problems", "1", "on how many problems the answer was judged", Tradeoff::problems),
        integer("failures", "1", "on how many problems the candidate failed", Tradeoff::failures),
        number(
            "worst_forward_error", "1", "the largest forward error", Tradeoff::worstForwardError),
        number(
            "median_forward_error", "1", "the median forward error", Tradeoff::medianForwardError),
        number(
            "worst_backward_error",
            "1",
            "the largest backward error",
            Tradeoff::worstBackwardError),
        number("worst_excess", "1", "the largest excess", Tradeoff::worstExcess),
        note(
            "timed_family",
            "the family on which the time was measured; one may stand for all of a size",
            Tradeoff::timedFamily),
        number("time_ns", "ns", "the time of one call", Tradeoff::timeNs),
        number("time_low_ns", "ns", "the lower end of its 99.9 % interval", Tradeoff::timeLowNs),
        number("time_high_ns", "ns", "the upper end of its 99.9 % interval", Tradeoff::timeHighNs),
        number("ratio", "1", "the time over that of the textbook candidate", Tradeoff::ratio),
        number("ratio_low", "1", "the lower end of the ratio's interval", Tradeoff::ratioLow),
        number("ratio_high", "1", "the upper end of the ratio's interval", Tradeoff::ratioHigh),
        flag(
            "on_frontier",
            "whether no other candidate of this family and size has a worst forward error and a"
                + " time that are both as small, and one of them smaller; empty without a time",
            Tradeoff::onFrontier));
  }

  private static Tradeoff row(Cells cells) {
    return new Tradeoff(
        cells.text("task"),
        cells.text("family"),
        cells.integer("size"),
        cells.text("candidate"),
        cells.integer("problems"),
        cells.integer("failures"),
        cells.number("worst_forward_error"),
        cells.number("median_forward_error"),
        cells.number("worst_backward_error"),
        cells.number("worst_excess"),
        cells.note("timed_family"),
        cells.number("time_ns"),
        cells.number("time_low_ns"),
        cells.number("time_high_ns"),
        cells.number("ratio"),
        cells.number("ratio_low"),
        cells.number("ratio_high"),
        cells.flag("on_frontier"));
  }
}
