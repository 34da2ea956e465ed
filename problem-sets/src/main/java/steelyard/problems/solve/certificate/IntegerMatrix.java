package steelyard.problems.solve.certificate;

import java.math.BigInteger;
import steelyard.problems.exact.Dyadic;

/**
 * A matrix of doubles as integers times one power of two, exactly.
 *
 * @param entries the integers, row by row
 * @param exponent the power of two, at most 0
 */
record IntegerMatrix(BigInteger[] entries, int exponent) {

  /** Converts a matrix, row by row in one array. */
  static IntegerMatrix of(int size, double[] matrix) {
    Dyadic[] exact = new Dyadic[size * size];
    int exponent = 0;
    for (int i = 0; i < exact.length; i++) {
      exact[i] = Dyadic.of(matrix[i]);
      exponent = Math.min(exponent, exact[i].exponent());
    }
    BigInteger[] entries = new BigInteger[exact.length];
    for (int i = 0; i < exact.length; i++) {
      entries[i] = exact[i].significand().shiftLeft(exact[i].exponent() - exponent);
    }
    return new IntegerMatrix(entries, exponent);
  }
}
