package steelyard.problems.solve.rational;

import java.math.BigInteger;
import java.util.Arrays;
import steelyard.problems.exact.Dyadic;

/**
 * A square matrix of doubles, each row multiplied by a power of two so that its entries are
 * integers, of which at least one is odd unless the row is zero.
 */
final class IntegerRows {

  // Digits of so few bits that 2048 products with residues add up in a long.
  private static final int DIGIT_BITS = 24;
  private static final long DIGIT_MASK = (1L << DIGIT_BITS) - 1;

  /** The largest number of columns. */
  static final int LARGEST_SIZE = 1 << (63 - DIGIT_BITS - PrimeField.BITS);

  final int size;
  private final BigInteger[][] entries;
  private final int[] exponents;

  // The entries' digits, all of the sign of their entry: by place, row and column.
  private final long[][][] digits;

  /** Converts a matrix of finite entries, given row by row in one array. */
  IntegerRows(int size, double[] matrix) {
    this.size = size;
    entries = new BigInteger[size][size];
    exponents = new int[size];
    int bits = 0;
    for (int i = 0; i < size; i++) {
      Dyadic[] row = new Dyadic[size];
      for (int j = 0; j < size; j++) {
        row[j] = Dyadic.of(matrix[i * size + j]);
      }
      exponents[i] = leastExponent(row);
      for (int j = 0; j < size; j++) {
        entries[i][j] = integer(row[j], exponents[i]);
        bits = Math.max(bits, entries[i][j].bitLength());
      }
    }
    digits = new long[bits / DIGIT_BITS + 1][size][size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        storeDigits(i, j);
      }
    }
  }

  private static int leastExponent(Dyadic[] row) {
    return Arrays.stream(row)
        .filter(entry -> entry.signum() != 0)
        .mapToInt(Dyadic::exponent)
        .min()
        .orElse(0);
  }

  private void storeDigits(int i, int j) {
    BigInteger rest = entries[i][j].abs();
    int sign = entries[i][j].signum();
    for (int place = 0; rest.signum() != 0; place++) {
      digits[place][i][j] = sign * (rest.longValue() & DIGIT_MASK);
      rest = rest.shiftRight(DIGIT_BITS);
    }
  }

  /** Returns a number times the power of two by which row i was multiplied. */
  Dyadic scaled(Dyadic number, int i) {
    return number.scalb(-exponents[i]);
  }

  /** Returns a number, a multiple of 2 to the given power, divided by that power. */
  static BigInteger integer(Dyadic number, int exponent) {
    return number.significand().shiftLeft(number.exponent() - exponent);
  }

  /** Returns the residues of the entries. */
  long[][] modulo(PrimeField field) {
    BigInteger prime = BigInteger.valueOf(field.prime());
    long[][] residues = new long[size][size];
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        residues[i][j] = entries[i][j].mod(prime).longValue();
      }
    }
    return residues;
  }

  /**
   * Returns a row times a vector of residues.
   *
   * @param x n entries in [0, 2^28)
   */
  BigInteger times(int i, long[] x) {
    BigInteger sum = BigInteger.ZERO;
    for (int place = digits.length - 1; place >= 0; place--) {
      long[] row = digits[place][i];
      long part = 0;
      for (int j = 0; j < size; j++) {
        part += row[j] * x[j];
      }
      sum = sum.shiftLeft(DIGIT_BITS).add(BigInteger.valueOf(part));
    }
    return sum;
  }

  /** Returns a row times a vector. */
  BigInteger times(int i, BigInteger[] x) {
    BigInteger sum = BigInteger.ZERO;
    for (int j = 0; j < size; j++) {
      if (entries[i][j].signum() != 0) {
        sum = sum.add(entries[i][j].multiply(x[j]));
      }
    }
    return sum;
  }

  /**
   * Returns an upper bound on log2 |det|, by Hadamard's inequality: the product of the Euclidean
   * norms of the rows, each at most the sum of the magnitudes.
   */
  long determinantBits() {
    long bits = 0;
    for (BigInteger[] row : entries) {
      bits +=
          Arrays.stream(row).map(BigInteger::abs).reduce(BigInteger::add).orElseThrow().bitLength();
    }
    return bits;
  }
}
