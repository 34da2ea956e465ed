package steelyard.problems.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;

/**
 * An exact number of the form integer times power of two. Every finite double is one, and so is
 * every sum, difference and product of them.
 *
 * <p>The significand is kept odd (or zero, with exponent 0), so that equal numbers are equal
 * records.
 *
 * @param significand the integer
 * @param exponent the power of two
 */
public record Dyadic(BigInteger significand, int exponent) implements Comparable<Dyadic> {

  /** Zero. */
  public static final Dyadic ZERO = new Dyadic(BigInteger.ZERO, 0);

  /** One. */
  public static final Dyadic ONE = new Dyadic(BigInteger.ONE, 0);

  // A quotient is developed to more bits than any double has, and one more that tells whether
  // anything is left; its rounding is then that of the exact quotient.
  private static final int QUOTIENT_BITS = 64;

  /** Removes the factors of two from the significand. */
  public Dyadic {
    int zeros = significand.getLowestSetBit();
    if (zeros > 0) {
      significand = significand.shiftRight(zeros);
      exponent = Math.addExact(exponent, zeros);
    } else if (zeros < 0) {
      exponent = 0;
    }
  }

  /**
   * Returns the exact value of a double.
   *
   * @param value the double
   * @return its value; both zeros give {@link #ZERO}
   * @throws IllegalArgumentException if it is infinite or NaN
   */
  public static Dyadic of(double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException("a finite double is wanted, but it is " + value);
    }
    int exponent = Math.max(Math.getExponent(value), Double.MIN_EXPONENT) - 52;
    // The scaled value is an integer below 2^53. Two steps, since 2^1074 is no double.
    double integer = Math.scalb(Math.scalb(value, -(exponent / 2)), -(exponent - exponent / 2));
    return new Dyadic(BigInteger.valueOf((long) integer), exponent);
  }

  /** Returns an integer. */
  public static Dyadic of(long value) {
    return new Dyadic(BigInteger.valueOf(value), 0);
  }

  /** Returns 2 to a power. */
  public static Dyadic powerOfTwo(int exponent) {
    return new Dyadic(BigInteger.ONE, exponent);
  }

  /**
   * Returns a quotient, correctly rounded: the double nearest to a/b, ties to even, with gradual
   * underflow, and infinity where a/b lies halfway between the largest double and 2^1024 or beyond.
   *
   * @param a the dividend
   * @param b the divisor
   * @return the double nearest to a/b; zero where a is zero
   * @throws ArithmeticException if b is zero
   */
  public static double quotient(Dyadic a, Dyadic b) {
    if (b.signum() == 0) {
      throw new ArithmeticException("the divisor is zero");
    }
    BigInteger dividend = a.significand.abs();
    BigInteger divisor = b.significand.abs();
    // A longer dividend is cut: its lower bits do not reach the quotient's whole part.
    int shift = QUOTIENT_BITS + 1 + divisor.bitLength() - dividend.bitLength();
    BigInteger[] parts = dividend.shiftLeft(shift).divideAndRemainder(divisor);
    boolean isCut = shift < 0 && dividend.getLowestSetBit() < -shift;
    BigInteger developed = parts[0].shiftLeft(1);
    if (isCut || parts[1].signum() != 0) {
      developed = developed.setBit(0);
    }
    if (a.signum() * b.signum() < 0) {
      developed = developed.negate();
    }
    return new Dyadic(developed, a.exponent - b.exponent - shift - 1).doubleValue();
  }

  /** Returns this + other, exactly. */
  public Dyadic add(Dyadic other) {
    if (other.signum() == 0) {
      return this;
    }
    if (signum() == 0) {
      return other;
    }
    int common = Math.min(exponent, other.exponent);
    return new Dyadic(
        significand
            .shiftLeft(exponent - common)
            .add(other.significand.shiftLeft(other.exponent - common)),
        common);
  }

  /** Returns this - other, exactly. */
  public Dyadic subtract(Dyadic other) {
    return add(other.negate());
  }

  /** Returns this times other, exactly. */
  public Dyadic multiply(Dyadic other) {
    return new Dyadic(
        significand.multiply(other.significand), Math.addExact(exponent, other.exponent));
  }

  /** Returns this times a power of two, exactly. */
  public Dyadic scalb(int power) {
    return signum() == 0 ? this : new Dyadic(significand, Math.addExact(exponent, power));
  }

  /** Returns the negative. */
  public Dyadic negate() {
    return new Dyadic(significand.negate(), exponent);
  }

  /** Returns the absolute value. */
  public Dyadic abs() {
    return signum() < 0 ? negate() : this;
  }

  /** Returns -1, 0 or 1. */
  public int signum() {
    return significand.signum();
  }

  @Override
  public int compareTo(Dyadic other) {
    if (signum() != other.signum()) {
      return Integer.compare(signum(), other.signum());
    }
    return subtract(other).signum();
  }

  /**
   * Returns the nearest double, correctly rounded: ties to even, with gradual underflow, and an
   * infinity from halfway between the largest double and 2^1024 on. A negative number that
   * underflows gives negative zero.
   *
   * @return the nearest double
   */
  public double doubleValue() {
    BigInteger magnitude = significand.abs();
    int leading = exponent + magnitude.bitLength() - 1;
    if (leading >= Binary64.OVERFLOW_EXPONENT) {
      return signum() * Double.POSITIVE_INFINITY;
    }
    int lowest = Math.max(leading - Binary64.PRECISION + 1, Binary64.LEAST_EXPONENT);
    int dropped = lowest - exponent;
    if (dropped <= 0) {
      return Math.scalb((double) significand.longValue(), exponent);
    }
    long kept = magnitude.shiftRight(dropped).longValue();
    boolean half = magnitude.testBit(dropped - 1);
    boolean beyondHalf = magnitude.getLowestSetBit() < dropped - 1;
    if (half && (beyondHalf || (kept & 1) == 1)) {
      kept++;
    }
    return signum() * Math.scalb((double) kept, lowest);
  }

  /**
   * Says whether a double is nearest to this number. Halfway between two doubles both are, and
   * infinity counts as 2^1024, which is how rounding to nearest treats it.
   *
   * @param candidate the double; a NaN is never nearest
   * @return whether no other double is closer
   */
  public boolean isNearest(double candidate) {
    if (Double.isNaN(candidate)) {
      return false;
    }
    Dyadic position = position(candidate);
    int side = compareTo(position);
    if (side == 0) {
      return true;
    }
    double neighbour = side > 0 ? Math.nextUp(candidate) : Math.nextDown(candidate);
    if (neighbour == candidate) {
      return true;
    }
    Dyadic fromNeighbour = subtract(position(neighbour)).abs();
    return subtract(position).abs().compareTo(fromNeighbour) <= 0;
  }

  /**
   * Says whether a double is a faithful rounding of this number: the number itself where it is a
   * double, and otherwise one of the two doubles around it. Beyond the largest double, that double
   * and infinity are around it.
   *
   * @param candidate the double; a NaN is never faithful
   * @return whether no double lies between it and this number, nor equals this number unless it is
   *     the candidate
   */
  public boolean isFaithful(double candidate) {
    if (Double.isNaN(candidate)) {
      return false;
    }
    double below = Math.nextDown(candidate);
    double above = Math.nextUp(candidate);
    return (Double.isInfinite(below) || of(below).compareTo(this) < 0)
        && (Double.isInfinite(above) || of(above).compareTo(this) > 0);
  }

  private static Dyadic position(double value) {
    return Double.isInfinite(value)
        ? new Dyadic(BigInteger.valueOf((long) Math.signum(value)), Binary64.OVERFLOW_EXPONENT)
        : of(value);
  }

  /** Returns this number in decimal, exactly. */
  public BigDecimal toBigDecimal() {
    if (exponent >= 0) {
      return new BigDecimal(significand.shiftLeft(exponent));
    }
    return new BigDecimal(significand.multiply(BigInteger.valueOf(5).pow(-exponent)), -exponent);
  }

  /** Returns this number in decimal, rounded once to the given precision. */
  public BigDecimal toBigDecimal(MathContext precision) {
    return toBigDecimal().round(precision);
  }
}
