package steelyard.problems.solve.certificate;

/**
 * An interval that certainly contains a nonnegative number.
 *
 * <p>Operations round outwards: a result of the default rounding is moved to the next double, which
 * covers its error, underflow included, since that error is no larger than the distance moved.
 *
 * @param lower a lower bound, at least 0
 * @param upper an upper bound; infinite where none is known
 */
public record Enclosure(double lower, double upper) {

  /** Returns the enclosure of a nonnegative double, without any width. */
  public static Enclosure of(double value) {
    return new Enclosure(value, value);
  }

  /** Returns the sum. */
  public Enclosure plus(Enclosure other) {
    return new Enclosure(down(lower + other.lower), Math.nextUp(upper + other.upper));
  }

  /** Returns the product. */
  public Enclosure times(Enclosure other) {
    return new Enclosure(down(lower * other.lower), Math.nextUp(upper * other.upper));
  }

  /** Returns the quotient; its upper bound is infinite where the divisor may be zero. */
  public Enclosure over(Enclosure other) {
    double top = other.lower > 0 ? Math.nextUp(upper / other.lower) : Double.POSITIVE_INFINITY;
    return new Enclosure(down(lower / other.upper), top);
  }

  /** Returns this times 2 to the given power. */
  public Enclosure scalb(int power) {
    return new Enclosure(down(Math.scalb(lower, power)), Math.nextUp(Math.scalb(upper, power)));
  }

  /** Returns the midpoint. */
  public double midpoint() {
    return lower + (upper - lower) / 2;
  }

  /** Says whether a number lies inside. */
  public boolean contains(double value) {
    return lower <= value && value <= upper;
  }

  /** Says whether both bounds are finite, positive, and within the given relative distance. */
  public boolean isWithin(double relative) {
    return lower > 0 && upper < Double.POSITIVE_INFINITY && upper - lower <= relative * lower;
  }

  private static double down(double value) {
    return Math.max(0, Math.nextDown(value));
  }
}
