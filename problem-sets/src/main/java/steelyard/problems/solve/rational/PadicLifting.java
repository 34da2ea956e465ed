package steelyard.problems.solve.rational;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.Optional;
import steelyard.problems.exact.Dyadic;

/**
 * Solves systems exactly, by the digits of the solution to a prime base: with the inverse C of A
 * modulo p, the lowest digits of x are C b modulo p; what is left, (b - A x)/p, is again integer
 * and gives the next. From enough digits the fractions are found, and proved by putting them into
 * the system: A is nonsingular, so that it has no other solution.
 *
 * <p>n³ operations prepare all right-hand sides; each takes n² for every digit, and about as many
 * digits as twice the determinant has.
 *
 * @see "J. D. Dixon, Exact solution of linear equations using p-adic expansions, Numerische
 *     Mathematik 40 (1982), 137-141"
 */
public final class PadicLifting {
  /** The largest n. */
  public static final int LARGEST_SIZE = IntegerRows.LARGEST_SIZE;

  private static final int FIRST_DIGITS = 16;

  private final IntegerRows matrix;
  private final PrimeField field;
  private final BigInteger prime;
  private final long[][] inverse;

  private PadicLifting(IntegerRows matrix, PrimeField field, long[][] inverse) {
    this.matrix = matrix;
    this.field = field;
    prime = BigInteger.valueOf(field.prime());
    this.inverse = inverse;
  }

  /**
   * Prepares a matrix. If its determinant is nonzero modulo one prime, it is nonzero. If it is zero
   * modulo primes whose product exceeds Hadamard's bound, it is zero.
   *
   * @param size n, at most {@link #LARGEST_SIZE}
   * @param matrix finite entries, row by row in one array
   * @return empty if the matrix is singular, which is thereby proved
   * @throws IllegalArgumentException if n is too large
   */
  public static Optional<PadicLifting> of(int size, double[] matrix) {
    if (size > LARGEST_SIZE) {
      throw new IllegalArgumentException(
          "n is %s; it must be at most %s".formatted(size, LARGEST_SIZE));
    }
    IntegerRows integers = new IntegerRows(size, matrix);
    long bits = integers.determinantBits();
    PrimeField field = PrimeField.largest();
    for (long covered = 0; covered <= bits; covered += PrimeField.BITS - 1) {
      long[][] inverse = integers.modulo(field);
      if (field.invert(inverse)) {
        return Optional.of(new PadicLifting(integers, field, inverse));
      }
      field = field.next();
    }
    return Optional.empty();
  }

  /**
   * Returns the solution of A x = b.
   *
   * @param b n finite entries
   */
  public RationalVector solve(double[] b) {
    Dyadic[] scaled = new Dyadic[b.length];
    int exponent = 0;
    for (int i = 0; i < b.length; i++) {
      scaled[i] = matrix.scaled(Dyadic.of(b[i]), i);
      exponent = Math.min(exponent, scaled[i].exponent());
    }
    BigInteger[] integers = new BigInteger[b.length];
    for (int i = 0; i < b.length; i++) {
      integers[i] = IntegerRows.integer(scaled[i], exponent);
    }
    RationalVector multiple = solve(integers);
    return new RationalVector(multiple.numerators(), multiple.denominator().shiftLeft(-exponent));
  }

  private RationalVector solve(BigInteger[] b) {
    BigInteger[] rest = b.clone();
    PadicNumber[] x = new PadicNumber[b.length];
    Arrays.setAll(x, i -> new PadicNumber(prime));
    int wanted = FIRST_DIGITS;
    for (int count = 0; ; wanted *= 2) {
      for (; count < wanted; count++) {
        long[] digits = digits(rest);
        for (int i = 0; i < x.length; i++) {
          x[i].append(digits[i]);
        }
        subtract(digits, rest);
      }
      BigInteger modulus = prime.pow(count);
      BigInteger[] residues = Arrays.stream(x).map(PadicNumber::value).toArray(BigInteger[]::new);
      Optional<RationalVector> found =
          new Reconstruction(modulus).vector(residues).filter(v -> isSolution(v, b));
      if (found.isPresent()) {
        return found.get();
      }
    }
  }

  private long[] digits(BigInteger[] rest) {
    long[] residues = new long[rest.length];
    for (int i = 0; i < rest.length; i++) {
      residues[i] = rest[i].mod(prime).longValue();
    }
    long[] digits = new long[rest.length];
    for (int i = 0; i < rest.length; i++) {
      digits[i] = field.dot(inverse[i], residues);
    }
    return digits;
  }

  private void subtract(long[] digits, BigInteger[] rest) {
    for (int i = 0; i < rest.length; i++) {
      rest[i] = rest[i].subtract(matrix.times(i, digits)).divide(prime);
    }
  }

  private boolean isSolution(RationalVector x, BigInteger[] b) {
    for (int i = 0; i < b.length; i++) {
      if (!matrix.times(i, x.numerators()).equals(x.denominator().multiply(b[i]))) {
        return false;
      }
    }
    return true;
  }
}
