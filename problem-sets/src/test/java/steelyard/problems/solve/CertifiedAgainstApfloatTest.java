package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import org.apache.commons.rng.simple.RandomSource;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import steelyard.problems.Family;

/** References agree with an elimination in 150 decimal digits of another library's arithmetic. */
class CertifiedAgainstApfloatTest {
  private static final long DIGITS = 150;

  @ParameterizedTest
  @ValueSource(
      strings = {"spectrum-one-small", "spectrum-log-uniform", "positive-definite", "vandermonde"})
  void answersAgreeToFortyDigits(String id) {
    Family<LinearSystem> family =
        SystemFamilies.all().stream()
            .filter(f -> f.profile().id().equals(id))
            .findFirst()
            .orElseThrow();
    double target = family.reach().controlled() ? 1e11 : 1;
    SystemProblem problem =
        (SystemProblem)
            family.generate(
                new Family.Request(target, 14), RandomSource.XO_RO_SHI_RO_128_PP.create(8L));
    Apfloat[] x = solve(problem.data());
    List<BigDecimal> reference = problem.reference().answer(new MathContext(60));
    Apfloat norm = Apfloat.ZERO;
    Apfloat error = Apfloat.ZERO;
    for (int i = 0; i < x.length; i++) {
      Apfloat difference = x[i].subtract(new Apfloat(reference.get(i), DIGITS));
      error = max(error, ApfloatMath.abs(difference));
      norm = max(norm, ApfloatMath.abs(x[i]));
    }
    assertThat(error.divide(norm).doubleValue()).isLessThan(1e-40);
  }

  private static Apfloat max(Apfloat x, Apfloat y) {
    return x.compareTo(y) >= 0 ? x : y;
  }

  private static Apfloat exact(double x) {
    return new Apfloat(new BigDecimal(x), DIGITS);
  }

  private static Apfloat[] solve(LinearSystem system) {
    int n = system.size();
    Apfloat[][] m = new Apfloat[n][n + 1];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        m[i][j] = exact(system.a()[i][j]);
      }
      m[i][n] = exact(system.b()[i]);
    }
    for (int k = 0; k < n; k++) {
      for (int i = 0; i < n; i++) {
        if (i != k) {
          Apfloat factor = m[i][k].divide(m[k][k]);
          for (int j = k; j <= n; j++) {
            m[i][j] = m[i][j].subtract(factor.multiply(m[k][j]));
          }
        }
      }
    }
    Apfloat[] x = new Apfloat[n];
    for (int i = 0; i < n; i++) {
      x[i] = m[i][n].divide(m[i][i]);
    }
    return x;
  }
}
