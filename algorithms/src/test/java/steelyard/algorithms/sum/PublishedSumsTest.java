package steelyard.algorithms.sum;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.exact.ExactValue;

/** Small sums from the literature, each with who must get it right and who must not. */
class PublishedSumsTest {

  private static final Set<String> PLAIN =
      Set.of("recursive", "sorted", "pairwise", "blocked", "unrolled-8", "commons-math");
  private static final Set<String> ALWAYS_FAITHFUL = Set.of("accsum", "exact", "big-decimal");

  /** Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed., 2002, (4.5). */
  @Test
  void highamsOrderingExample() {
    double m = 0x1p55;
    double[] increasing = {1, m, 2 * m, -3 * m};
    double[] decreasing = {-3 * m, 2 * m, m, 1};
    assertThat(sum("recursive", increasing)).isZero();
    assertThat(sum("sorted", decreasing)).isZero();
    assertThat(sum("recursive", decreasing)).isEqualTo(1);
    assertThat(sum("kahan", increasing)).isZero();
    assertThat(correct(increasing)).contains("neumaier", "klein", "sum2", "sum3", "double-double");
    assertThat(correct(increasing)).containsAll(ALWAYS_FAITHFUL);
  }

  /**
   * Neumaier, ZAMM 54 (1974): what corrections that are summed apart are for. That Kahan's method
   * gives 0 here is a widely used example.
   */
  @Test
  void kahanLosesWhatNeumaierKeeps() {
    double[] terms = {1, 1e100, 1, -1e100};
    assertThat(sum("recursive", terms)).isZero();
    assertThat(sum("kahan", terms)).isZero();
    assertThat(correct(terms))
        .contains("neumaier", "klein", "sum2", "sum3", "sum4", "commons-numbers", "accsum", "exact")
        .doesNotContain("kahan")
        .doesNotContainAnyElementsOf(PLAIN);
  }

  /** Constructed: cancellation on three levels, 60 bits apart, with 2^-60 left. */
  @Test
  void threeLevelsOfCancellationDefeatTwoFoldPrecision() {
    double[] terms = {1, 0x1p60, 0x1p-60, 0x1p120, -0x1p120, -0x1p60, -1};
    assertThat(ExactValue.sum(terms)).isEqualByComparingTo(ExactValue.sum(0x1p-60));
    assertThat(sum("neumaier", terms)).isZero();
    assertThat(sum("sum2", terms)).isZero();
    assertThat(sum("klein", terms)).isZero();
    assertThat(correct(terms)).containsAll(ALWAYS_FAITHFUL).contains("sum4");
  }

  /** Constructed: every one of 1024 halves of an ulp is lost, one after the other. */
  @Test
  void halfUlpsAreLostOneByOne() {
    double[] terms = new double[1026];
    Arrays.fill(terms, 0x1p-53);
    terms[0] = 1;
    terms[1025] = -1;
    assertThat(sum("recursive", terms)).isZero();
    assertThat(sum("commons-math", terms)).isZero();
    assertThat(correct(terms))
        .contains("kahan", "neumaier", "klein", "sum2", "double-double", "commons-numbers")
        .contains("jdk-stream")
        .containsAll(ALWAYS_FAITHFUL);
  }

  /** Constructed: the first partial sum overflows, the sum does not. */
  @Test
  void exactAndScaledMethodsSurviveIntermediateOverflow() {
    double[] terms = {1e308, 1e308, -1e308};
    assertThat(correct(terms))
        .containsAll(ALWAYS_FAITHFUL)
        .doesNotContain("recursive", "kahan", "neumaier", "klein", "sum2", "sum3", "sum4")
        .doesNotContain("double-double", "jdk-stream", "commons-numbers", "commons-math");
    assertThat(sum("recursive", terms)).isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(sum("neumaier", terms)).isEqualTo(Double.POSITIVE_INFINITY);
  }

  /** Exact rational sum of a million copies of the double nearest to 0.1; recomputed. */
  @Test
  void aMillionTenths() {
    double[] terms = new double[1_000_000];
    Arrays.fill(terms, 0.1);
    BigDecimal exact = new BigDecimal("100000.0000000000055511151231257827021182");
    assertThat(ExactValue.sum(0.1).movePointRight(6).subtract(exact).abs())
        .isLessThan(new BigDecimal("1e-33"));
    assertThat(sum("recursive", terms)).isBetween(100000.000001332, 100000.000001333);
    assertThat(nearest(terms, exact))
        .contains("kahan", "neumaier", "klein", "sum2", "sum3", "double-double", "exact")
        .doesNotContainAnyElementsOf(Set.of("recursive", "commons-math"));
  }

  /**
   * The millionth harmonic number of rounded terms, by exact rational arithmetic; recomputed. The
   * number of the unrounded terms, psi(10^6 + 1) + gamma (Abramowitz, Stegun, 1964, 6.3.2), differs
   * in the 17th digit.
   */
  @Test
  void harmonicNumber() {
    double[] terms = IntStream.rangeClosed(1, 1_000_000).mapToDouble(k -> 1.0 / k).toArray();
    BigDecimal exact = new BigDecimal("14.39272672286572357721839938516153467596");
    BigDecimal ofUnrounded = new BigDecimal("14.39272672286572363138112749318858767664");
    assertThat(ExactValue.sum(terms).subtract(exact).abs()).isLessThan(new BigDecimal("1e-37"));
    assertThat(exact.subtract(ofUnrounded).abs()).isGreaterThan(new BigDecimal("5e-17"));
    assertThat(nearest(terms, exact))
        .contains("kahan", "neumaier", "klein", "sum2", "sum3", "double-double", "exact")
        .doesNotContain("recursive", "commons-math");
  }

  private static Set<String> correct(double... terms) {
    return nearest(terms, ExactValue.sum(terms));
  }

  private static Set<String> nearest(double[] terms, BigDecimal exact) {
    Set<String> ids = new TreeSet<>();
    for (Candidate<Summation> candidate : Summations.all()) {
      if (ExactValue.isNearest(candidate.kernel().sum(terms), exact)) {
        ids.add(candidate.id());
      }
    }
    return ids;
  }

  private static double sum(String id, double... terms) {
    return Summations.all().stream()
        .filter(candidate -> candidate.id().equals(id))
        .findFirst()
        .orElseThrow()
        .kernel()
        .sum(terms);
  }
}
