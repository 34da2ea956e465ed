package steelyard.problems.solve.rational;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** A growing sequence of digits to a prime base, the lowest first. */
final class PadicNumber {
  private static final int LEAF = 8;

  private final BigInteger base;
  private final List<Integer> digits = new ArrayList<>();

  PadicNumber(BigInteger base) {
    this.base = base;
  }

  void append(long digit) {
    digits.add((int) digit);
  }

  /** Returns the sum of the digits times powers of the base. */
  BigInteger value() {
    return value(0, digits.size());
  }

  // Halves, so that the products are of numbers of like size.
  private BigInteger value(int from, int to) {
    if (to - from <= LEAF) {
      BigInteger value = BigInteger.ZERO;
      for (int i = to - 1; i >= from; i--) {
        value = value.multiply(base).add(BigInteger.valueOf(digits.get(i)));
      }
      return value;
    }
    int half = from + Integer.highestOneBit(to - from - 1);
    return value(half, to).multiply(base.pow(half - from)).add(value(from, half));
  }
}
