package steelyard.results.tradeoff;

import java.util.Collection;

/**
 * The accuracy-time frontier: a candidate is on it if no other has a worst forward error and a time
 * that are both as small or smaller, and one of them smaller. Two candidates that are equal in both
 * are on it together. One that failed, or whose error or time is not known, is left out by the
 * caller: it is never on the frontier and hides nobody.
 */
public final class Frontier {
  /**
   * One candidate.
   *
   * @param error the worst forward error
   * @param timeNs the time of one call
   */
  public record Point(double error, double timeNs) {
    private boolean dominates(Point other) {
      return error <= other.error
          && timeNs <= other.timeNs
          && (error < other.error || timeNs < other.timeNs);
    }
  }

  private Frontier() {}

  /** Says whether a point is on the frontier of some points. */
  public static boolean isOn(Point point, Collection<Point> all) {
    return all.stream().noneMatch(other -> other.dominates(point));
  }
}
