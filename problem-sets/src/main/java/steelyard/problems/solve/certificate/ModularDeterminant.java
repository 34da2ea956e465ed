package steelyard.problems.solve.certificate;

import steelyard.problems.exact.Dyadic;

/**
 * Decides whether a determinant is exactly zero.
 *
 * <p>With each row multiplied by a power of two the matrix is integer, and so is its determinant.
 * If the determinant is nonzero modulo one prime, it is nonzero. If it is zero modulo primes whose
 * product exceeds Hadamard's bound, the product of the Euclidean norms of the rows, it is zero.
 */
final class ModularDeterminant {
  private static final int LARGEST_PRIME_START = Integer.MAX_VALUE;
  private static final int BITS_PER_PRIME = 30;

  private ModularDeterminant() {}

  /** Says whether the determinant of a matrix, given row by row in one array, is zero. */
  static boolean isZero(int size, double[] matrix) {
    int[] rowExponents = rowExponents(size, matrix);
    long bits = hadamardBits(size, matrix, rowExponents);
    long prime = LARGEST_PRIME_START;
    for (long covered = 0; covered <= bits; covered += BITS_PER_PRIME) {
      prime = primeAtMost(prime);
      if (!isZeroModulo(prime, size, modulo(prime, size, matrix, rowExponents))) {
        return false;
      }
      prime--;
    }
    return true;
  }

  private static int[] rowExponents(int size, double[] matrix) {
    int[] exponents = new int[size];
    for (int i = 0; i < size; i++) {
      exponents[i] = Integer.MAX_VALUE;
      for (int j = 0; j < size; j++) {
        Dyadic entry = Dyadic.of(matrix[i * size + j]);
        if (entry.signum() != 0) {
          exponents[i] = Math.min(exponents[i], entry.exponent());
        }
      }
    }
    return exponents;
  }

  // log2 of the bound: each row's norm is at most sqrt(n) times its largest entry.
  private static long hadamardBits(int size, double[] matrix, int[] rowExponents) {
    long half = (33L - Integer.numberOfLeadingZeros(size)) / 2;
    long bits = 1;
    for (int i = 0; i < size; i++) {
      int largest = Integer.MIN_VALUE;
      for (int j = 0; j < size; j++) {
        largest = Math.max(largest, ScaledSystem.magnitude(matrix[i * size + j]));
      }
      bits += largest - rowExponents[i] + half;
    }
    return bits;
  }

  private static long[] modulo(long prime, int size, double[] matrix, int[] rowExponents) {
    long[] result = new long[size * size];
    for (int i = 0; i < result.length; i++) {
      Dyadic entry = Dyadic.of(matrix[i]);
      if (entry.signum() != 0) {
        long residue = Math.floorMod(entry.significand().longValueExact(), prime);
        long power = power(2, entry.exponent() - rowExponents[i / size], prime);
        result[i] = residue * power % prime;
      }
    }
    return result;
  }

  private static boolean isZeroModulo(long prime, int size, long[] m) {
    for (int k = 0; k < size; k++) {
      int pivotRow = k;
      while (pivotRow < size && m[pivotRow * size + k] == 0) {
        pivotRow++;
      }
      if (pivotRow == size) {
        return true;
      }
      for (int j = k; j < size; j++) {
        long kept = m[k * size + j];
        m[k * size + j] = m[pivotRow * size + j];
        m[pivotRow * size + j] = kept;
      }
      long reciprocal = power(m[k * size + k], prime - 2, prime);
      for (int i = k + 1; i < size; i++) {
        long factor = prime - m[i * size + k] * reciprocal % prime;
        for (int j = k + 1; j < size; j++) {
          m[i * size + j] = (m[i * size + j] + factor * m[k * size + j]) % prime;
        }
      }
    }
    return false;
  }

  private static long power(long base, long exponent, long prime) {
    long result = 1;
    long square = base % prime;
    for (long left = exponent; left > 0; left >>= 1) {
      if ((left & 1) == 1) {
        result = result * square % prime;
      }
      square = square * square % prime;
    }
    return result;
  }

  private static long primeAtMost(long start) {
    long candidate = start | 1;
    candidate = candidate > start ? candidate - 2 : candidate;
    while (!isPrime(candidate)) {
      candidate -= 2;
    }
    return candidate;
  }

  private static boolean isPrime(long odd) {
    for (long divisor = 3; divisor * divisor <= odd; divisor += 2) {
      if (odd % divisor == 0) {
        return false;
      }
    }
    return true;
  }
}
