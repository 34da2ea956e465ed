package steelyard.problems.solve.rational;

/**
 * Arithmetic modulo a prime below 2^28, so that many products of residues add up in a long.
 *
 * @param prime p
 */
record PrimeField(long prime) {
  static final int BITS = 28;

  // So many products of two residues, and one residue more, add up to less than 2^63.
  private static final int PRODUCTS_AT_ONCE = 127;

  /** Returns the field of the largest prime below 2^28. */
  static PrimeField largest() {
    return below(1L << BITS);
  }

  /** Returns the field of the next smaller prime. */
  PrimeField next() {
    return below(prime);
  }

  private static PrimeField below(long limit) {
    long candidate = (limit - 2) | 1;
    while (!isPrime(candidate)) {
      candidate -= 2;
    }
    return new PrimeField(candidate);
  }

  private static boolean isPrime(long odd) {
    for (long divisor = 3; divisor * divisor <= odd; divisor += 2) {
      if (odd % divisor == 0) {
        return false;
      }
    }
    return true;
  }

  /** Returns a power of a residue. */
  long power(long base, long exponent) {
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

  /** Returns the reciprocal of a residue that is not zero. */
  long reciprocal(long residue) {
    return power(residue, prime - 2);
  }

  /** Returns the residue of a dot product of residues. */
  long dot(long[] x, long[] y) {
    long sum = 0;
    for (int from = 0; from < x.length; from += PRODUCTS_AT_ONCE) {
      int to = Math.min(x.length, from + PRODUCTS_AT_ONCE);
      for (int j = from; j < to; j++) {
        sum += x[j] * y[j];
      }
      sum %= prime;
    }
    return sum;
  }

  /**
   * Replaces a matrix of residues, given as rows, by its inverse.
   *
   * @return false if it has none, in which case the matrix is left half done
   */
  boolean invert(long[][] rows) {
    int n = rows.length;
    int[] pivotRow = new int[n];
    for (int k = 0; k < n; k++) {
      pivotRow[k] = k;
      while (pivotRow[k] < n && rows[pivotRow[k]][k] == 0) {
        pivotRow[k]++;
      }
      if (pivotRow[k] == n) {
        return false;
      }
      long[] pivot = rows[pivotRow[k]];
      rows[pivotRow[k]] = rows[k];
      rows[k] = pivot;
      long reciprocal = reciprocal(pivot[k]);
      pivot[k] = 1;
      for (int j = 0; j < n; j++) {
        pivot[j] = pivot[j] * reciprocal % prime;
      }
      for (long[] row : rows) {
        if (row != pivot && row[k] != 0) {
          eliminate(row, pivot, k);
        }
      }
    }
    for (int k = n - 1; k >= 0; k--) {
      for (long[] row : rows) {
        long kept = row[k];
        row[k] = row[pivotRow[k]];
        row[pivotRow[k]] = kept;
      }
    }
    return true;
  }

  private void eliminate(long[] row, long[] pivot, int k) {
    long factor = prime - row[k];
    row[k] = 0;
    for (int j = 0; j < row.length; j++) {
      row[j] = (row[j] + factor * pivot[j]) % prime;
    }
  }
}
