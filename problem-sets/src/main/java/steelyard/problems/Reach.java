package steelyard.problems;

/**
 * The condition numbers and sizes that a family can make.
 *
 * @param controlled whether the target condition number is a knob of the family; if not, the
 *     condition number follows from the size and the data
 * @param maxCondition the largest target; the smallest is 1. A small size may allow less, which the
 *     family then says when asked
 * @param minSize the smallest size, at least 1
 * @param maxSize the largest size
 */
public record Reach(boolean controlled, double maxCondition, int minSize, int maxSize) {

  /** Returns the reach of a family whose condition number is a knob. */
  public static Reach upTo(double maxCondition, int minSize, int maxSize) {
    return new Reach(true, maxCondition, minSize, maxSize);
  }

  /** Returns the reach of a family without a knob. */
  public static Reach uncontrolled(int minSize, int maxSize) {
    return new Reach(false, 1, minSize, maxSize);
  }
}
