package steelyard.results.attainment;

import java.util.OptionalDouble;
import steelyard.results.Observation;
import steelyard.results.Rounding;
import steelyard.results.verdict.Allowances;

/** How accurate one answer is, from the best that a double can be downwards. */
public enum Level {
  /** Every entry is one of the two doubles around the exact one. */
  LAST_BIT("last bit"),

  /** The forward error is at most max(κ, 1) u: what a relative change of u in the data explains. */
  DATA("data"),

  /** The forward error is at most C(n) max(κ, 1) u: what a stable algorithm may lose. */
  STABLE("stable"),

  /** The error is larger. */
  WORSE("worse"),

  /** There is no answer that could be judged. */
  NONE("");

  private final String word;

  Level(String word) {
    this.word = word;
  }

  /** Returns the word for a table. */
  public String word() {
    return word;
  }

  /**
   * Returns the level of a row. Where the exact answer is zero, so that the condition number is
   * infinite, the backward error decides what is stable.
   */
  public static Level of(Observation row) {
    if (!row.isJudged()) {
      return NONE;
    }
    boolean isLastBit = row.rounding().filter(r -> r != Rounding.OTHER).isPresent();
    if (isLastBit) {
      return LAST_BIT;
    }
    double stable = Allowances.c(row.size());
    OptionalDouble excess = row.excess();
    if (excess.isPresent()) {
      return excess.getAsDouble() <= 1 ? DATA : excess.getAsDouble() <= stable ? STABLE : WORSE;
    }
    double allowed = stable * Allowances.unitRoundoff(row.precisionBits());
    return row.backwardError().orElse(Double.POSITIVE_INFINITY) <= allowed ? STABLE : WORSE;
  }
}
