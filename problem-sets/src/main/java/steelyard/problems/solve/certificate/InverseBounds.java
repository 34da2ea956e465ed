package steelyard.problems.solve.certificate;

import java.util.Arrays;

/**
 * What an approximate inverse proves of the inverse: the one argument of every route.
 *
 * <p>Let G = I - R A, let g_i be upper bounds on the row sums of |G|, and &alpha; their maximum, so
 * that the norm of G is at most &alpha; (all norms are maximum norms). If &alpha; &lt; 1, then
 *
 * <ol>
 *   <li>A is nonsingular: otherwise A z = 0 for some z &ne; 0, hence z = G z, and the norm of z
 *       would be less than itself.
 *   <li>A⁻¹ - R = G A⁻¹, since (I - G) A⁻¹ = R A A⁻¹ = R. For a vector v &gt;= 0 let y = |A⁻¹| v
 *       and T = || |R| v ||. Then | y - |R| v | &lt;= |A⁻¹ - R| v &lt;= |G| y, hence ||y|| &lt;= T
 *       + &alpha; ||y||, hence ||y|| &lt;= T/(1 - &alpha;), and entry by entry
 *       <pre>  | y_i - (|R| v)_i | &lt;= g_i T/(1 - &alpha;).</pre>
 * </ol>
 *
 * <p>Everything that is certified follows from the second: norms of A⁻¹ with v = (1, ..., 1), the
 * componentwise condition number with v = |A||x| + |b|, and the error of any vector x̃ with the
 * residual r = b - A x̃ with v = |r|, because |x - x̃| = |A⁻¹ r| &lt;= |A⁻¹| |r|.
 *
 * <p>|R| v is evaluated in plain double arithmetic. The entries of |R| carry a relative error of at
 * most 2u, and a sum of n products at most &gamma;_n (Higham, Accuracy and Stability of Numerical
 * Algorithms, 2nd ed., SIAM 2002, section 3.1), which {@link Allowances#inflation} and {@link
 * Allowances#deflation} cover. An underflow costs at most 2^-1074 in an entry of |R|, hence 2^-1074
 * v_j in a product, and at most 2^-1075 in the product itself; 2^-1022 (sum of v + n) covers them
 * all.
 *
 * @see "S. M. Rump, Verification methods: rigorous results using floating-point arithmetic, Acta
 *     Numerica 19 (2010), 287-449, for the use of ||I - R A|| &lt; 1"
 */
final class InverseBounds {
  private final int size;
  private final double[] magnitudes;
  private final double[] residuals;
  private final double norm;
  private final Allowances allowances;

  InverseBounds(ApproximateInverse inverse) {
    this(inverse.magnitudes(), inverse.residualRowSums(), Allowances.PROVEN);
  }

  /**
   * Makes those that follow from the parts of an {@link ApproximateInverse}.
   *
   * @param magnitudes |R| as there
   * @param residualRowSums g as there
   * @param allowances what is allowed for rounding
   */
  InverseBounds(double[] magnitudes, double[] residualRowSums, Allowances allowances) {
    this.allowances = allowances;
    size = residualRowSums.length;
    this.magnitudes = magnitudes;
    residuals = residualRowSums;
    norm = largest(residuals);
  }

  /** Says whether the matrix is proved to be nonsingular; all else holds only then. */
  boolean isProven() {
    return norm < 1;
  }

  /** Returns upper bounds on |A⁻¹| v, given upper bounds on v &gt;= 0. */
  double[] upper(double[] v) {
    double[] bounds = product(v);
    double underflow = underflow(v);
    for (int i = 0; i < size; i++) {
      bounds[i] = Math.nextUp(bounds[i] * allowances.inflation(size) + underflow);
    }
    double largest = Math.nextUp(largest(bounds) / Math.nextDown(1 - norm));
    for (int i = 0; i < size; i++) {
      bounds[i] = Math.nextUp(bounds[i] + Math.nextUp(residuals[i] * largest));
    }
    return bounds;
  }

  /** Returns enclosures of |A⁻¹| v, given those of v &gt;= 0. */
  Enclosure[] enclose(Enclosure[] v) {
    double[] low = Arrays.stream(v).mapToDouble(Enclosure::lower).toArray();
    double[] upper = upper(Arrays.stream(v).mapToDouble(Enclosure::upper).toArray());
    double largest = largest(upper);
    double[] sums = product(low);
    double underflow = underflow(low);
    Enclosure[] result = new Enclosure[size];
    for (int i = 0; i < size; i++) {
      double lower = Math.nextDown(sums[i] * allowances.deflation(size) - underflow);
      lower = Math.nextDown(lower - Math.nextUp(residuals[i] * largest));
      result[i] = new Enclosure(Math.max(0, lower), upper[i]);
    }
    return result;
  }

  private double[] product(double[] v) {
    double[] sums = new double[size];
    for (int i = 0; i < size; i++) {
      double sum = 0;
      for (int j = 0; j < size; j++) {
        sum += magnitudes[i * size + j] * v[j];
      }
      sums[i] = sum;
    }
    return sums;
  }

  private double underflow(double[] v) {
    double sum = 0;
    for (double entry : v) {
      sum += entry;
    }
    return (sum * allowances.inflation(size) + 2.0 * size) * allowances.underflow();
  }

  private static double largest(double[] entries) {
    double largest = 0;
    for (double entry : entries) {
      largest = Math.max(largest, entry);
    }
    return largest;
  }
}
