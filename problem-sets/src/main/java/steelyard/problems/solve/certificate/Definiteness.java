package steelyard.problems.solve.certificate;

/**
 * Proves that a symmetric matrix is positive definite, by a Cholesky factorization in double-double
 * of the matrix shifted down.
 *
 * <p>Let v = 2^-102 bound the relative error of an operation ({@link DoubleDouble}), let B = fl(A -
 * s I), and let the factorization of B run to completion with factor L. Then L Lᵀ = B + E with |E|
 * &lt;= &gamma;_{n+1} |L||Lᵀ|, &gamma;_k = k v/(1 - k v) (Higham, Accuracy and Stability of
 * Numerical Algorithms, 2nd ed., SIAM 2002, chapter 10, whose argument takes completion alone). The
 * 2-norm of |L||Lᵀ| is at most the squared Frobenius norm of L, which is the trace of L Lᵀ, at most
 * trace(B)/(1 - &gamma;_{n+1}). L Lᵀ is positive semidefinite, so that no eigenvalue of B is below
 * -&gamma;_{n+1}/(1 - &gamma;_{n+1}) trace(B), and no eigenvalue of A below s minus that minus v
 * times the largest diagonal entry for the rounding of the shift. With s = 4 (n + 2) v trace(A),
 * more than twice what is subtracted, A is positive definite.
 *
 * <p>A is first scaled by a power of two so that its largest diagonal entry lies in [1/2, 1), and
 * pivots below 2^-200 are refused; then every entry of L is below 2 and every divisor at least
 * 2^-100. What underflows, in the scaling or in an operation, contributes to E at most n (n + 2)
 * 2^-950 in norm, for which 2^-900 is added to s.
 *
 * @see "S. M. Rump, Verification of positive definiteness, BIT 46 (2006), 433-452"
 */
public final class Definiteness {
  private static final double UNDERFLOW = 0x1p-900;
  private static final double LEAST_PIVOT = 0x1p-200;

  private Definiteness() {}

  /**
   * Says whether positive definiteness was proved.
   *
   * @param a a symmetric matrix of which the lower triangle is read
   * @return false if it is not positive definite, or so nearly indefinite that this does not tell
   */
  public static boolean isProved(double[][] a) {
    int n = a.length;
    double largest = 0;
    for (int i = 0; i < n; i++) {
      if (!(a[i][i] > 0)) {
        return false;
      }
      largest = Math.max(largest, a[i][i]);
    }
    int shift = -ScaledSystem.magnitude(largest);
    double trace = 0;
    for (int i = 0; i < n; i++) {
      trace += Math.scalb(a[i][i], shift);
    }
    // The rounding of this product and of the trace is far within the factor of two to spare.
    double lowered = 4.0 * (n + 2) * DoubleDouble.UNIT_ROUNDOFF * trace + UNDERFLOW;
    return completes(a, shift, lowered);
  }

  private static boolean completes(double[][] a, int shift, double lowered) {
    DoubleDouble[][] factor = new DoubleDouble[a.length][];
    for (int i = 0; i < a.length; i++) {
      factor[i] = new DoubleDouble[i + 1];
      for (int j = 0; j < i; j++) {
        DoubleDouble rest = remainder(Math.scalb(a[i][j], shift), factor[i], factor[j], j);
        factor[i][j] = rest.dividedBy(factor[j][j]);
      }
      DoubleDouble diagonal = DoubleDouble.of(Math.scalb(a[i][i], shift));
      DoubleDouble rest = diagonal.minus(DoubleDouble.of(lowered));
      for (int k = 0; k < i; k++) {
        rest = rest.minus(factor[i][k].times(factor[i][k]));
      }
      if (!(rest.high() > LEAST_PIVOT)) {
        return false;
      }
      factor[i][i] = rest.sqrt();
    }
    return true;
  }

  private static DoubleDouble remainder(
      double entry, DoubleDouble[] row, DoubleDouble[] column, int length) {
    DoubleDouble rest = DoubleDouble.of(entry);
    for (int k = 0; k < length; k++) {
      rest = rest.minus(row[k].times(column[k]));
    }
    return rest;
  }
}
