package steelyard.problems.solve.rational;

import java.math.BigInteger;
import steelyard.problems.exact.Dyadic;

/**
 * A vector of rational numbers with a common denominator.
 *
 * @param numerators n integers
 * @param denominator a positive integer
 */
public record RationalVector(BigInteger[] numerators, BigInteger denominator) {

  /** Returns n. */
  public int size() {
    return numerators.length;
  }

  /** Returns the double nearest to entry i. */
  public double nearest(int i) {
    return Dyadic.quotient(new Dyadic(numerators[i], 0), new Dyadic(denominator, 0));
  }

  /** Returns the largest multiple of 2 to the given power that is not above entry i. */
  public Dyadic floor(int i, int exponent) {
    BigInteger numerator = exponent < 0 ? numerators[i].shiftLeft(-exponent) : numerators[i];
    BigInteger divisor = exponent > 0 ? denominator.shiftLeft(exponent) : denominator;
    BigInteger[] parts = numerator.divideAndRemainder(divisor);
    boolean below = parts[1].signum() < 0;
    return new Dyadic(below ? parts[0].subtract(BigInteger.ONE) : parts[0], exponent);
  }
}
