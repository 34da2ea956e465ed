package steelyard.harness.input;

import java.util.Optional;

/**
 * How many values of a file lie between two doubles, so that a neighbour had to stand for them.
 *
 * @param values how many were read
 * @param count how many of them were rounded
 * @param belowNormal how many of the rounded ones lie below the least normal double, where rounding
 *     may change a value by more than a relative u
 * @param first the first rounded one and its place, such as {@code '0.1' at ledger.csv:2:8}
 */
public record Inexact(long values, long count, long belowNormal, Optional<String> first) {

  /** Nothing was read. */
  public static final Inexact NONE = new Inexact(0, 0, 0, Optional.empty());

  /** Returns a sentence without its end that says how many values were rounded. */
  public String words() {
    return first
        .map(
            example ->
                count
                    + " of "
                    + values
                    + " values are no doubles and were rounded to the nearest; the first is "
                    + example)
        .orElse("all " + values + " values are doubles, none was rounded");
  }

  /** Returns the counts of both. */
  public Inexact and(Inexact other) {
    return new Inexact(
        values + other.values,
        count + other.count,
        belowNormal + other.belowNormal,
        first.or(other::first));
  }
}
