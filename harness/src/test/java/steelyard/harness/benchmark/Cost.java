package steelyard.harness.benchmark;

/**
 * Time per call with its 99.9 % interval, in nanoseconds.
 *
 * @param mean the mean
 * @param lower the interval's lower end
 * @param upper the interval's upper end
 */
record Cost(double mean, double lower, double upper) {

  /** Returns the quotient; its interval is the widest that the two intervals allow. */
  Ratio over(Cost other) {
    return new Ratio(mean / other.mean, lower / other.upper, upper / other.lower);
  }
}
