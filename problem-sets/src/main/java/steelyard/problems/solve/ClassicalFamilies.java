package steelyard.problems.solve;

import java.math.BigInteger;
import java.util.List;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family.Profile;
import steelyard.problems.Reach;
import steelyard.problems.generate.Draw;

/**
 * Matrices of a fixed form, whose condition number follows from their size. The right-hand side is
 * a x for an x of order 1, or of small integers where the matrix has integer entries.
 */
final class ClassicalFamilies {
  private static final String HIGHAM =
      "N. J. Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., SIAM 2002, ";

  // lcm(1, ..., 2n - 1) stays below 2^53 up to here.
  private static final int LARGEST_HILBERT = 19;

  private ClassicalFamilies() {}

  /** Makes the matrix of a size. */
  @FunctionalInterface
  private interface Form {
    double[][] matrix(int n, UniformRandomProvider random);
  }

  static List<SystemFamily> all() {
    return List.of(
        ofOrderOne(
            "wilkinson-growth",
            "well-conditioned, but partial pivoting lets the entries grow to 2^(n-1)",
            HIGHAM + "section 9.4, after J. H. Wilkinson, J. ACM 8 (1961), 281-330",
            100,
            (n, random) -> wilkinson(n)),
        ofIntegers(
            "hilbert",
            "the Hilbert matrix times lcm(1, ..., 2n-1), so that its entries are exact integers",
            HIGHAM + "section 28.1",
            LARGEST_HILBERT,
            (n, random) -> hilbert(n)),
        ofOrderOne(
            "vandermonde",
            "powers of nodes in (0, 1): condition grows exponentially, as in interpolation",
            HIGHAM + "chapter 22; nodes jittered around (i - 1/2)/n",
            30,
            ClassicalFamilies::vandermonde),
        ofOrderOne(
            "triangular-exponential",
            "unit upper triangular with -1 above: its inverse grows like 2^n, substitution is stable",
            HIGHAM + "equation (8.9)",
            100,
            (n, random) -> triangular(n)),
        ofOrderOne(
            "diagonally-dominant",
            "random with a dominant diagonal: safe without pivoting",
            HIGHAM + "section 9.5; own construction of the instances",
            400,
            ClassicalFamilies::dominant),
        ofIntegers(
            "unimodular",
            "integer with determinant 1: inverse and solution are exact integers",
            "own construction: product of unit triangular matrices with entries -1, 0 and 1",
            60,
            ClassicalFamilies::unimodular));
  }

  private static SystemFamily ofOrderOne(
      String id, String purpose, String source, int largest, Form form) {
    return new SystemFamily(
        new Profile(id, purpose, "none", source),
        Reach.uncontrolled(2, largest),
        (request, random) ->
            RandomMatrices.withSolution(
                form.matrix(request.size(), random),
                RandomMatrices.ofOrderOne(request.size(), random)));
  }

  private static SystemFamily ofIntegers(
      String id, String purpose, String source, int largest, Form form) {
    return new SystemFamily(
        new Profile(id, purpose, "none", source),
        Reach.uncontrolled(2, largest),
        (request, random) -> {
          double[][] a = form.matrix(request.size(), random);
          double[] x = new double[request.size()];
          for (int i = 0; i < x.length; i++) {
            x[i] = (1 + random.nextInt(9)) * (random.nextBoolean() ? 1 : -1);
          }
          return RandomMatrices.withSolution(a, x);
        });
  }

  static double[][] wilkinson(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < i; j++) {
        a[i][j] = -1;
      }
      a[i][i] = 1;
      a[i][n - 1] = 1;
    }
    return a;
  }

  static double[][] hilbert(int n) {
    BigInteger multiple = BigInteger.ONE;
    for (int k = 2; k < 2 * n; k++) {
      BigInteger factor = BigInteger.valueOf(k);
      multiple = multiple.multiply(factor).divide(multiple.gcd(factor));
    }
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        a[i][j] = multiple.divide(BigInteger.valueOf(i + j + 1L)).doubleValue();
      }
    }
    return a;
  }

  private static double[][] vandermonde(int n, UniformRandomProvider random) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      double node = (i + 0.25 + 0.5 * random.nextDouble()) / n;
      a[i][0] = 1;
      for (int j = 1; j < n; j++) {
        a[i][j] = a[i][j - 1] * node;
      }
    }
    return a;
  }

  static double[][] triangular(int n) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      a[i][i] = 1;
      for (int j = i + 1; j < n; j++) {
        a[i][j] = -1;
      }
    }
    return a;
  }

  private static double[][] dominant(int n, UniformRandomProvider random) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      double sum = 0;
      for (int j = 0; j < n; j++) {
        a[i][j] = 2 * random.nextDouble() - 1;
        sum += j == i ? 0 : Math.abs(a[i][j]);
      }
      a[i][i] = (1 + random.nextDouble() / n) * Math.nextUp(sum * (1 + n * 0x1p-52));
    }
    return a;
  }

  private static double[][] unimodular(int n, UniformRandomProvider random) {
    double[][] lower = new double[n][n];
    double[][] upper = new double[n][n];
    for (int i = 0; i < n; i++) {
      lower[i][i] = 1;
      upper[i][i] = 1;
      for (int j = 0; j < i; j++) {
        lower[i][j] = Draw.between(random, -1, 1);
        upper[j][i] = Draw.between(random, -1, 1);
      }
    }
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int k = 0; k <= i; k++) {
        for (int j = k; j < n; j++) {
          a[i][j] += lower[i][k] * upper[k][j];
        }
      }
    }
    return a;
  }
}
