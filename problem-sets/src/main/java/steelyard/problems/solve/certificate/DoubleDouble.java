package steelyard.problems.solve.certificate;

/**
 * An unevaluated sum of two doubles, the low one at most half a unit in the last place of the high
 * one.
 *
 * <p>The computed result of each operation has a relative error of at most 2^-102 in the absence of
 * overflow and underflow. Where a part underflows, an absolute error of at most 2^-960 is added, as
 * long as no operand exceeds 2^50 and no divisor is below 2^-100 in magnitude.
 *
 * @see <a href="https://doi.org/10.1145/3121432">Joldes, Muller and Popescu, Tight and rigorous
 *     error bounds for basic building blocks of double-word arithmetic, ACM TOMS 44 (2017)</a>: sum
 *     3u²+13u³, product 5u², quotient 15u²+56u³
 * @see <a href="https://doi.org/10.1145/3568672">Lefèvre, Louvet, Muller, Picot and Rideau,
 *     Accurate calculation of Euclidean norms using double-word arithmetic, ACM TOMS 49 (2023)</a>:
 *     square root 25/8 u²
 * @param high the number rounded to a double
 * @param low what is left
 */
record DoubleDouble(double high, double low) {

  /** The largest relative error of an operation. */
  static final double UNIT_ROUNDOFF = 0x1p-102;

  /** Returns a double. */
  static DoubleDouble of(double value) {
    return new DoubleDouble(value, 0);
  }

  DoubleDouble plus(DoubleDouble other) {
    double sum = high + other.high;
    double sumLow = error(high, other.high, sum);
    double tail = low + other.low;
    double tailLow = error(low, other.low, tail);
    double carried = sumLow + tail;
    double first = sum + carried;
    return normalized(first, tailLow + (carried - (first - sum)));
  }

  DoubleDouble minus(DoubleDouble other) {
    return plus(new DoubleDouble(-other.high, -other.low));
  }

  DoubleDouble times(DoubleDouble other) {
    double product = high * other.high;
    double crossed = Math.fma(low, other.high, Math.fma(high, other.low, low * other.low));
    return normalized(product, Math.fma(high, other.high, -product) + crossed);
  }

  DoubleDouble dividedBy(DoubleDouble other) {
    double quotient = high / other.high;
    double product = other.high * quotient;
    DoubleDouble back =
        normalized(
            product, Math.fma(other.low, quotient, Math.fma(other.high, quotient, -product)));
    double rest = (high - back.high) + (low - back.low);
    return normalized(quotient, rest / other.high);
  }

  /** Returns the square root of a positive number. */
  DoubleDouble sqrt() {
    double root = Math.sqrt(high);
    double rest = Math.fma(-root, root, high) + low;
    return normalized(root, rest / (2 * root));
  }

  // The sum of two doubles of which the first is the larger, split anew.
  private static DoubleDouble normalized(double first, double second) {
    double sum = first + second;
    return new DoubleDouble(sum, second - (sum - first));
  }

  private static double error(double x, double y, double sum) {
    double part = sum - x;
    return (x - (sum - part)) + (y - part);
  }
}
