package steelyard.harness.timing;

import java.util.OptionalDouble;

/**
 * The time of one call in nanoseconds, with its 99.9 % confidence interval.
 *
 * @param ns the mean
 * @param lowNs the lower end of the interval, at least 0
 * @param highNs the upper end
 * @param allocatedBytes bytes allocated by one call, if it was measured
 */
public record Score(double ns, double lowNs, double highNs, OptionalDouble allocatedBytes) {}
