package steelyard.harness.benchmark;

import java.util.Locale;

/**
 * A line of the table.
 *
 * @param work what is compared
 * @param ratio the figure, with its bounds
 * @param goal what it should be, in words
 * @param met whether it is
 * @param figures what was measured
 */
record Row(String work, String ratio, String goal, boolean met, String figures) {

  static Row of(Goal goal, Cost kernel, Cost yardstick) {
    Ratio ratio = goal.ratio(kernel, yardstick);
    return new Row(
        goal.work(),
        text(ratio),
        (goal.speedUp() ? "at least " : "at most ") + number(goal.limit()),
        goal.isMet(ratio.value()),
        time(kernel) + " and " + time(yardstick));
  }

  static String text(Ratio ratio) {
    return number(ratio.value())
        + " ("
        + number(ratio.lower())
        + " to "
        + number(ratio.upper())
        + ")";
  }

  /** Three significant digits. */
  static String number(double value) {
    int digits = value >= 100 ? 0 : value >= 10 ? 1 : 2;
    return String.format(Locale.ROOT, "%." + digits + "f", value);
  }

  private static String time(Cost cost) {
    double ns = cost.mean();
    return ns < 1e3
        ? number(ns) + " ns"
        : ns < 1e6
            ? number(ns / 1e3) + " µs"
            : ns < 1e9 ? number(ns / 1e6) + " ms" : number(ns / 1e9) + " s";
  }
}
