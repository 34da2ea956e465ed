package steelyard.results.table;

import static steelyard.results.table.Column.integer;
import static steelyard.results.table.Column.note;
import static steelyard.results.table.Column.number;
import static steelyard.results.table.Column.text;

import java.util.List;
import java.util.Optional;
import steelyard.results.Timing;

/** The columns of {@code timings.csv}. */
public final class TimingsTable {
  /** One row per candidate, family and size that was timed. */
  public static final TableSchema<Timing> SCHEMA =
      new TableSchema<>(
          "timings",
          "One row per candidate, family and size that was timed: its time per call.",
          columns(),
          TimingsTable::row);

  private TimingsTable() {}

  private static List<Column<Timing>> columns() {
    return List.of(
        text("task", "what is computed", Timing::task),
        text("family", "the generator of the problem", Timing::family),
        text("problem", "the id from which the timed problem can be made again", Timing::problem),
        text("candidate", "the implementation", Timing::candidate),
        integer("size", "1", "the size n of the problem", Timing::size),
        number("time_ns", "ns", "the time of one call", Timing::timeNs),
        number("time_low_ns", "ns", "the lower end of its 99.9 % interval", Timing::timeLowNs),
        number("time_high_ns", "ns", "the upper end of its 99.9 % interval", Timing::timeHighNs),
        number(
            "time_per_element_ns",
            "ns",
            "the time of one call over the number of elements that it works on",
            Timing::timePerElementNs),
        number(
            "allocated_bytes", "byte", "the memory allocated by one call", Timing::allocatedBytes),
        note(
            "textbook",
            "the task's plain textbook candidate, measured in the same run",
            t -> Optional.of(t.textbook())),
        number("ratio", "1", "the time over that of the textbook candidate", Timing::ratio),
        number("ratio_low", "1", "the lower end of the ratio's interval", Timing::ratioLow),
        number("ratio_high", "1", "the upper end of the ratio's interval", Timing::ratioHigh),
        integer("forks", "1", "how many fresh JVMs measured", Timing::forks),
        integer(
            "warmup_iterations",
            "1",
            "iterations of each JVM that were not counted",
            Timing::warmupIterations),
        integer(
            "measurement_iterations",
            "1",
            "iterations of each JVM that were counted",
            Timing::measurementIterations),
        integer("iteration_ms", "ms", "the length of one iteration", Timing::iterationMs),
        note(
            "detail",
            "why there is no time; empty where there is one",
            t -> Optional.of(t.detail())));
  }

  private static Timing row(Cells cells) {
    return new Timing(
        cells.text("task"),
        cells.text("family"),
        cells.text("problem"),
        cells.text("candidate"),
        cells.integer("size"),
        cells.number("time_ns"),
        cells.number("time_low_ns"),
        cells.number("time_high_ns"),
        cells.number("time_per_element_ns"),
        cells.number("allocated_bytes"),
        cells.text("textbook"),
        cells.number("ratio"),
        cells.number("ratio_low"),
        cells.number("ratio_high"),
        cells.integer("forks"),
        cells.integer("warmup_iterations"),
        cells.integer("measurement_iterations"),
        cells.integer("iteration_ms"),
        cells.text("detail"));
  }
}
