package steelyard.problems.solve;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/**
 * The measures of a system and an answer in the arithmetic of apfloat. Stored numbers enter with
 * infinite precision, so that residuals are exact; an inverse and every quotient start from 300
 * digits.
 *
 * <p>A number's precision passes to everything made of it, and cancellation lowers it; {@link
 * #decimal} therefore refuses what has less left than the comparison needs.
 */
final class ApfloatMeasures {
  private static final long DIGITS = 300;
  private static final long NEEDED_DIGITS = 80;
  private static final Apfloat NOTHING = new Apfloat("1e-200", DIGITS);

  private final Apfloat[][] a;
  private final Apfloat[] b;
  private final Apfloat[] y;

  private ApfloatMeasures(LinearSystem system, double[] answer) {
    a = Arrays.stream(system.a()).map(ApfloatMeasures::exact).toArray(Apfloat[][]::new);
    b = exact(system.b());
    y = exact(answer);
  }

  static Measures of(LinearSystem system, double[] answer) {
    return new ApfloatMeasures(system, answer).measures();
  }

  private Measures measures() {
    Apfloat[][] inverse = inverse();
    Apfloat[] x = times(inverse, b);
    Apfloat[] residuals = new Apfloat[b.length];
    Apfloat worst = Apfloat.ZERO;
    Apfloat[] answerSizes = sizes(y);
    for (int i = 0; i < b.length; i++) {
      residuals[i] = ApfloatMath.abs(b[i].subtract(dot(a[i], y)));
      worst = larger(worst, quotient(residuals[i], answerSizes[i]));
    }
    Apfloat[] errors = new Apfloat[b.length];
    Arrays.setAll(errors, i -> x[i].subtract(y[i]));
    Apfloat matrixNorm = norm(rowSums(a));
    Apfloat inverseNorm = norm(rowSums(inverse));
    Apfloat answerScale = matrixNorm.multiply(norm(y)).add(norm(b));
    Apfloat solutionScale = matrixNorm.multiply(norm(x)).add(norm(b));
    return new Measures(
        Arrays.stream(x).map(ApfloatMeasures::decimal).toList(),
        decimal(inverseNorm),
        decimal(quotient(inverseNorm.multiply(solutionScale), norm(x))),
        decimal(quotient(norm(times(absolute(inverse), sizes(x))), norm(x))),
        List.of(residuals).stream().map(ApfloatMeasures::decimal).toList(),
        decimal(quotient(norm(residuals), answerScale)),
        decimal(worst),
        decimal(quotient(norm(errors), norm(x))));
  }

  // Gauss and Jordan, with the largest pivot of each column.
  private Apfloat[][] inverse() {
    int n = b.length;
    Apfloat[][] m = new Apfloat[n][2 * n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        m[i][j] = a[i][j].precision(DIGITS);
        m[i][n + j] = new Apfloat(i == j ? 1 : 0, DIGITS);
      }
    }
    for (int k = 0; k < n; k++) {
      int pivot = k;
      for (int i = k + 1; i < n; i++) {
        boolean isLarger = ApfloatMath.abs(m[i][k]).compareTo(ApfloatMath.abs(m[pivot][k])) > 0;
        pivot = isLarger ? i : pivot;
      }
      Apfloat[] kept = m[k];
      m[k] = m[pivot];
      m[pivot] = kept;
      eliminate(m, k);
    }
    return Arrays.stream(m).map(row -> Arrays.copyOfRange(row, n, 2 * n)).toArray(Apfloat[][]::new);
  }

  private static void eliminate(Apfloat[][] m, int k) {
    Apfloat pivot = m[k][k];
    for (int j = 0; j < m[k].length; j++) {
      m[k][j] = m[k][j].divide(pivot);
    }
    for (int i = 0; i < m.length; i++) {
      Apfloat factor = m[i][k];
      for (int j = 0; i != k && j < m[i].length; j++) {
        m[i][j] = m[i][j].subtract(factor.multiply(m[k][j]));
      }
    }
  }

  // |A||v| + |b|.
  private Apfloat[] sizes(Apfloat[] v) {
    Apfloat[] sizes = times(absolute(a), absolute(v));
    Arrays.setAll(sizes, i -> sizes[i].add(ApfloatMath.abs(b[i])));
    return sizes;
  }

  private static Apfloat[] exact(double[] x) {
    return Arrays.stream(x)
        .mapToObj(value -> new Apfloat(new BigDecimal(value), Apfloat.INFINITE))
        .toArray(Apfloat[]::new);
  }

  private static Apfloat dot(Apfloat[] v, Apfloat[] w) {
    Apfloat sum = Apfloat.ZERO;
    for (int i = 0; i < v.length; i++) {
      sum = sum.add(v[i].multiply(w[i]));
    }
    return sum;
  }

  private static Apfloat[] times(Apfloat[][] m, Apfloat[] v) {
    return Arrays.stream(m).map(row -> dot(row, v)).toArray(Apfloat[]::new);
  }

  private static Apfloat[] absolute(Apfloat[] v) {
    return Arrays.stream(v).map(ApfloatMath::abs).toArray(Apfloat[]::new);
  }

  private static Apfloat[][] absolute(Apfloat[][] m) {
    return Arrays.stream(m).map(ApfloatMeasures::absolute).toArray(Apfloat[][]::new);
  }

  private static Apfloat[] rowSums(Apfloat[][] m) {
    return Arrays.stream(absolute(m))
        .map(row -> Arrays.stream(row).reduce(Apfloat.ZERO, Apfloat::add))
        .toArray(Apfloat[]::new);
  }

  private static Apfloat norm(Apfloat[] v) {
    return Arrays.stream(absolute(v)).reduce(Apfloat.ZERO, ApfloatMeasures::larger);
  }

  private static Apfloat larger(Apfloat x, Apfloat y) {
    return x.compareTo(y) >= 0 ? x : y;
  }

  private static Apfloat quotient(Apfloat top, Apfloat bottom) {
    return top.precision(Math.min(top.precision(), DIGITS)).divide(bottom);
  }

  // Where everything cancelled, what is left is the rounding of the inverse.
  private static BigDecimal decimal(Apfloat value) {
    if (value.precision() >= NEEDED_DIGITS) {
      return new BigDecimal(value.toString());
    }
    if (ApfloatMath.abs(value).compareTo(NOTHING) < 0) {
      return BigDecimal.ZERO;
    }
    throw new ArithmeticException("only " + value.precision() + " digits are left of " + value);
  }
}
