package steelyard.harness.benchmark;

/**
 * A ratio of two costs and what it should be.
 *
 * @param work what is done, as the table names it
 * @param kernel the kernel whose cost is divided
 * @param yardstick the kernel whose cost divides it
 * @param limit the largest ratio wanted; for a speed-up, the least ratio the other way round
 * @param speedUp whether the yardstick's cost is divided by the kernel's
 */
record Goal(String work, String kernel, String yardstick, double limit, boolean speedUp) {

  static Goal atMost(double limit, String work, String kernel, String yardstick) {
    return new Goal(work, kernel, yardstick, limit, false);
  }

  static Goal fasterBy(double limit, String work, String kernel, String yardstick) {
    return new Goal(work, kernel, yardstick, limit, true);
  }

  Ratio ratio(Cost kernelCost, Cost yardstickCost) {
    return speedUp ? yardstickCost.over(kernelCost) : kernelCost.over(yardstickCost);
  }

  boolean isMet(double ratio) {
    return speedUp ? ratio >= limit : ratio <= limit;
  }
}
