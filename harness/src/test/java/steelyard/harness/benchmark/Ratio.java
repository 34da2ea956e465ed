package steelyard.harness.benchmark;

/**
 * A quotient of two costs.
 *
 * @param value the quotient of the means
 * @param lower a lower bound from the two intervals
 * @param upper an upper bound from the two intervals
 */
record Ratio(double value, double lower, double upper) {}
