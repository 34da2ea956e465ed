package steelyard.harness.input;

import java.util.Arrays;

/**
 * Collects the numbers of one column of a file, up to a limit, and counts those that it rounded.
 */
final class NumberList {

  /** The most numbers of a vector, or entries of a matrix. */
  static final int MAX_NUMBERS = 10_000_000;

  private static final int FIRST_CAPACITY = 1024;

  private final InexactTally tally = new InexactTally();
  private double[] values = new double[FIRST_CAPACITY];
  private int size;

  void add(String text, Place place) {
    double value = tally.read(text, place);
    if (size == MAX_NUMBERS) {
      throw place.fail(
          "this is number "
              + (size + 1)
              + ", of at most "
              + MAX_NUMBERS
              + " that a vector may have");
    }
    if (size == values.length) {
      values = Arrays.copyOf(values, Math.min(MAX_NUMBERS, 2 * size));
    }
    values[size++] = value;
  }

  int size() {
    return size;
  }

  Column column() {
    return new Column(Arrays.copyOf(values, size), tally.inexact());
  }
}
