package steelyard.algorithms.dot;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.exact.ExactValue;
import steelyard.algorithms.exact.IllConditioned;

/** Inner products from the literature, each with who must get it right and who must not. */
class PublishedDotsTest {

  private static final String[] PLAIN = {"recursive", "fma", "pairwise", "unrolled-8"};

  /**
   * The five-term example of the Kulisch and Miranker school (from memory; also in Kulisch,
   * Miranker, Computer Arithmetic in Theory and Practice, 1981). Its decimal data give
   * -1.00657107e-11, a correct value that no method can reach, because the data are rounded to
   * binary64 first; the exact inner product of the rounded data was recomputed by exact rational
   * arithmetic.
   */
  @Test
  void fiveTermExample() {
    double[] x = {2.718281828, -3.141592654, 1.414213562, 0.5772156649, 0.3010299957};
    double[] y = {1486.2497, 878366.9879, -22.37492, 4773714.647, 0.000185049};
    assertThat(ofDecimals()).isEqualByComparingTo(new BigDecimal("-1.00657107e-11"));
    BigDecimal exact = ExactValue.dot(x, y);
    assertThat(
            exact.subtract(new BigDecimal("-9.554689334633010925230064801795642117719e-11")).abs())
        .isLessThan(new BigDecimal("1e-49"));
    assertThat(within(x, y, 1e-12))
        .contains("dot2", "dot3", "double-double", "exact", "commons-numbers", "commons-math")
        .doesNotContain(PLAIN);
    assertThat(within(x, y, 0x1p-53)).contains("dot3", "exact");
  }

  private static BigDecimal ofDecimals() {
    String[] x = {"2.718281828", "-3.141592654", "1.414213562", "0.5772156649", "0.3010299957"};
    String[] y = {"1486.2497", "878366.9879", "-22.37492", "4773714.647", "0.000185049"};
    BigDecimal sum = BigDecimal.ZERO;
    for (int i = 0; i < x.length; i++) {
      sum = sum.add(new BigDecimal(x[i]).multiply(new BigDecimal(y[i])));
    }
    return sum;
  }

  /**
   * Ogita, Rump, Oishi, SIAM J. Sci. Comput. 26 (2005), section 6: K-fold precision is lost once
   * the condition number is far beyond u^-K, and not before.
   */
  @Test
  void everyFoldOfPrecisionHasItsConditionNumber() {
    Random random = new Random(26);
    for (int trial = 0; trial < 20; trial++) {
      IllConditioned.Pair oneFold = IllConditioned.dot(40, 70, random);
      assertThat(within(oneFold.x(), oneFold.y(), 1e-4))
          .doesNotContain(PLAIN)
          .contains("dot2", "double-double", "dot3", "exact", "commons-numbers", "commons-math");
      IllConditioned.Pair twoFold = IllConditioned.dot(40, 130, random);
      assertThat(within(twoFold.x(), twoFold.y(), 1e-4))
          .doesNotContain("dot2", "double-double", "commons-numbers", "commons-math")
          .contains("dot3", "exact");
      IllConditioned.Pair threeFold = IllConditioned.dot(40, 190, random);
      assertThat(within(threeFold.x(), threeFold.y(), 1e-4)).containsExactly("exact");
    }
  }

  /** Constructed: products that overflow and cancel, or that underflow and add up. */
  @Test
  void onlyTheExactMethodIsExactAtAnyExponent() {
    assertThat(
            within(new double[] {0x1p1000, 3, -0x1p1000}, new double[] {0x1p1000, 5, 0x1p1000}, 0))
        .containsExactly("exact");
    double[] x = {0x1p-600, 0x1p-600, 0x1p-600, 0x1p-600};
    double[] y = {0x1p-475, 0x1p-475, 0x1p-475, 0x1p-475};
    assertThat(within(x, y, 0)).containsExactly("exact");
  }

  /** Returns the candidates whose relative error is at most a tolerance. */
  private static Set<String> within(double[] x, double[] y, double tolerance) {
    BigDecimal exact = ExactValue.dot(x, y);
    Set<String> ids = new TreeSet<>();
    for (Candidate<DotProduct> candidate : DotProducts.all()) {
      double dot = candidate.kernel().dot(x, y);
      if (Double.isFinite(dot) && ExactValue.error(dot, exact, exact) <= tolerance) {
        ids.add(candidate.id());
      }
    }
    return ids;
  }
}
