package steelyard.results.text;

import java.util.OptionalDouble;

/** The unit in which some times are easy to read. */
public enum TimeScale {
  /** Nanoseconds. */
  NANOSECONDS("ns", 1),
  /** Microseconds. */
  MICROSECONDS("\u00B5s", 1e3),
  /** Milliseconds. */
  MILLISECONDS("ms", 1e6),
  /** Seconds. */
  SECONDS("s", 1e9);

  private final String unit;
  private final double ns;

  TimeScale(String unit, double ns) {
    this.unit = unit;
    this.ns = ns;
  }

  /** Returns the largest unit in which the shortest time is at least 1; else nanoseconds. */
  public static TimeScale forShortest(double shortestNs) {
    TimeScale best = NANOSECONDS;
    for (TimeScale scale : values()) {
      best = shortestNs >= scale.ns ? scale : best;
    }
    return best;
  }

  /** Returns the sign of the unit. */
  public String unit() {
    return unit;
  }

  /** Returns a time with its interval in this unit, without the unit. */
  public String interval(OptionalDouble timeNs, OptionalDouble lowNs, OptionalDouble highNs) {
    return Figures.interval(scaled(timeNs), scaled(lowNs), scaled(highNs));
  }

  private OptionalDouble scaled(OptionalDouble timeNs) {
    return timeNs.isPresent() ? OptionalDouble.of(timeNs.getAsDouble() / ns) : timeNs;
  }
}
