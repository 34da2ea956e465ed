package steelyard.problems;

import java.util.function.IntToDoubleFunction;

/**
 * The condition numbers and sizes that a family can make.
 *
 * @param controlled whether the target condition number is a knob of the family; if not, the
 *     condition number follows from the size and the data
 * @param maxCondition the largest target at any size; the smallest is 1
 * @param minSize the smallest size, at least 1
 * @param maxSize the largest size
 * @param limitAtSize what a size allows, where that is less
 */
public record Reach(
    boolean controlled,
    double maxCondition,
    int minSize,
    int maxSize,
    IntToDoubleFunction limitAtSize) {

  private static final IntToDoubleFunction NO_LIMIT = Reach::unlimited;

  /** Returns the reach of a family whose condition number is a knob. */
  public static Reach upTo(double maxCondition, int minSize, int maxSize) {
    return new Reach(true, maxCondition, minSize, maxSize, NO_LIMIT);
  }

  /** Returns the reach of a family without a knob. */
  public static Reach uncontrolled(int minSize, int maxSize) {
    return new Reach(false, 1, minSize, maxSize, NO_LIMIT);
  }

  /** Returns this reach where small sizes allow less. */
  public Reach limitedBy(IntToDoubleFunction limit) {
    return new Reach(controlled, maxCondition, minSize, maxSize, limit);
  }

  /** Returns the largest target at a size. */
  public double maxConditionAt(int size) {
    return Math.min(maxCondition, limitAtSize.applyAsDouble(size));
  }

  private static double unlimited(int size) {
    return Double.POSITIVE_INFINITY;
  }
}
