package steelyard.harness.benchmark;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.function.Supplier;
import org.apache.commons.rng.simple.RandomSource;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.solve.LinearSolvers;
import steelyard.problems.Family;
import steelyard.problems.solve.LinearSystem;
import steelyard.problems.solve.SystemFamilies;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.rational.PadicLifting;

/** Solves: arguments are the family, the condition number and n. */
final class Solves {
  private static final MathContext DIGITS = new MathContext(60);

  private Solves() {}

  static LinearSystem system(String[] words) {
    Family<LinearSystem> family = Families.named(words[1], SystemFamilies.all());
    Family.Request request =
        new Family.Request(Double.parseDouble(words[2]), Integer.parseInt(words[3]));
    return family.generate(request, RandomSource.XO_RO_SHI_RO_128_PP.create(5L)).data();
  }

  static Supplier<?> factorized(String[] words) {
    LinearSystem system = system(words);
    LinearSolver textbook = LinearSolvers.all().get(0).kernel();
    return () -> textbook.solve(system.a(), system.b());
  }

  static Supplier<?> certified(String[] words) {
    LinearSystem system = system(words);
    return () -> CertifiedSolver.solve(system.a(), system.b());
  }

  static Supplier<?> rational(String[] words) {
    LinearSystem system = system(words);
    double[] matrix = Arrays.stream(system.a()).flatMapToDouble(Arrays::stream).toArray();
    return () -> PadicLifting.of(system.size(), matrix).orElseThrow().solve(system.b());
  }

  /** Gaussian elimination with partial pivoting in 60 digits. */
  static Supplier<?> bigDecimal(String[] words) {
    LinearSystem system = system(words);
    return () -> {
      int n = system.size();
      BigDecimal[][] a = new BigDecimal[n][n + 1];
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          a[i][j] = new BigDecimal(system.a()[i][j]);
        }
        a[i][n] = new BigDecimal(system.b()[i]);
      }
      eliminate(a);
      return substitute(a);
    };
  }

  private static void eliminate(BigDecimal[][] a) {
    int n = a.length;
    for (int k = 0; k < n; k++) {
      int best = k;
      for (int i = k + 1; i < n; i++) {
        best = a[i][k].abs().compareTo(a[best][k].abs()) > 0 ? i : best;
      }
      BigDecimal[] pivotRow = a[best];
      a[best] = a[k];
      a[k] = pivotRow;
      for (int i = k + 1; i < n; i++) {
        BigDecimal factor = a[i][k].divide(pivotRow[k], DIGITS);
        for (int j = k + 1; j <= n; j++) {
          a[i][j] = a[i][j].subtract(factor.multiply(pivotRow[j], DIGITS), DIGITS);
        }
      }
    }
  }

  private static BigDecimal[] substitute(BigDecimal[][] a) {
    int n = a.length;
    BigDecimal[] x = new BigDecimal[n];
    for (int i = n - 1; i >= 0; i--) {
      BigDecimal sum = a[i][n];
      for (int j = i + 1; j < n; j++) {
        sum = sum.subtract(a[i][j].multiply(x[j], DIGITS), DIGITS);
      }
      x[i] = sum.divide(a[i][i], DIGITS);
    }
    return x;
  }
}
