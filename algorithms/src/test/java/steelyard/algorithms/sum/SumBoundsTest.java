package steelyard.algorithms.sum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.exact.ExactValue;
import steelyard.algorithms.exact.IllConditioned;

class SumBoundsTest {

  private static final double U = 0x1p-53;
  private static final double INF = Double.POSITIVE_INFINITY;

  static Stream<Candidate<Summation>> claiming() {
    return Summations.all().stream().filter(candidate -> candidate.bound().isPresent());
  }

  @Test
  void onlyMethodsWithAPublishedConstantClaimABound() {
    assertThat(Summations.all().stream().filter(c -> c.bound().isEmpty()).map(Candidate::id))
        .containsExactly(
            "kahan",
            "klein",
            "jdk-stream",
            "jdk-parallel-stream",
            "big-decimal",
            "commons-numbers",
            "commons-math");
  }

  @Test
  void formulasAtHand() {
    assertThat(at("recursive", 5, 1)).isEqualTo(4 * U);
    assertThat(at("pairwise", 32, 1)).isEqualTo(Bound.gamma(31, U));
    assertThat(at("pairwise", 33, 1)).isEqualTo(Bound.gamma(17, U));
    assertThat(at("pairwise", 1024, 1)).isEqualTo(Bound.gamma(31 + 5, U));
    assertThat(at("blocked", 128, 1)).isEqualTo(Bound.gamma(127, U));
    assertThat(at("blocked", 129, 1)).isEqualTo(Bound.gamma(128, U));
    assertThat(at("blocked", 1280, 1)).isEqualTo(Bound.gamma(127 + 9, U));
    assertThat(at("unrolled-8", 7, 1)).isEqualTo(Bound.gamma(6, U));
    assertThat(at("unrolled-8", 8, 1)).isEqualTo(Bound.gamma(3, U));
    assertThat(at("unrolled-8", 9, 1)).isEqualTo(Bound.gamma(4, U));
    assertThat(at("unrolled-8", 15, 1)).isEqualTo(Bound.gamma(7, U));
    assertThat(at("unrolled-8", 80, 1)).isEqualTo(Bound.gamma(12, U));
    assertThat(at("neumaier", 10, 1)).isEqualTo(2 * U + 100 * U * U);
    assertThat(bound("neumaier").formula().at(1000, 1, 1e-3)).isEqualTo(INF);
    assertThat(at("sum2", 3, 1 / U)).isCloseTo(U + 4 * U, within(1e-10 * U));
    assertThat(at("sum3", 3, 1 / (U * U))).isCloseTo(U + 64 * U, within(1e-10 * U));
    assertThat(at("sum4", 3, 1 / (U * U * U))).isCloseTo(U + 256 * U, within(1e-10 * U));
    assertThat(bound("sum3").formula().at(1000, 1, 1e-3)).isEqualTo(INF);
    assertThat(at("double-double", 11, 1 / U)).isCloseTo(U + 20 * U, within(1e-10 * U));
    assertThat(at("accsum", 1000, 1e99)).isEqualTo(2 * U);
    assertThat(at("exact", 1000, 1e99)).isEqualTo(U);
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void isSmallForAtMostOneTermWhateverTheCondition(Candidate<Summation> candidate) {
    for (int n : new int[] {0, 1}) {
      for (double kappa : new double[] {0, 1, 1e300, INF}) {
        assertThat(at(candidate.id(), n, kappa)).isBetween(0.0, 2 * U + 2 * U * U);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void neverFallsAsTheConditionGrows(Candidate<Summation> candidate) {
    for (int n = 1; n < 3000; n = 2 * n + 1) {
      double previous = 0;
      for (double kappa = 1; kappa < 1e100; kappa *= 1e5) {
        double bound = at(candidate.id(), n, kappa);
        assertThat(bound).isGreaterThanOrEqualTo(previous);
        previous = bound;
      }
    }
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void holdsOnIllConditionedSums(Candidate<Summation> candidate) {
    Random random = new Random(41);
    for (int bits = 4; bits < 300; bits += 4) {
      assertHolds(candidate, IllConditioned.sum(6 + 2 * random.nextInt(60), bits, random));
    }
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void holdsOnSumsOfOneSign(Candidate<Summation> candidate) {
    Random random = new Random(42);
    for (int n = 1; n < 3000; n = n * 3 / 2 + 1) {
      assertHolds(candidate, random.doubles(n).toArray());
    }
  }

  /** One and 99 halves of an ulp: the error of recursive summation is within 2^-46 of its bound. */
  @Test
  void recursiveBoundIsAttained() {
    double[] terms = new double[100];
    Arrays.fill(terms, U);
    terms[0] = 1;
    double error =
        ExactValue.error(
            new RecursiveSum().sum(terms),
            ExactValue.sum(terms),
            ExactValue.sumOfMagnitudes(terms));
    assertThat(error / at("recursive", 100, 1)).isBetween(0.99999999999998, 1.0);
  }

  /** A bound that could not be broken would be worthless: Sum2's is, by the recursive sum. */
  @Test
  void recursiveSumBreaksTheBoundOfSum2() {
    double[] terms = IllConditioned.sum(40, 60, new Random(5));
    BigDecimal exact = ExactValue.sum(terms);
    double kappa = ExactValue.ratio(ExactValue.sumOfMagnitudes(terms), exact.abs());
    assertThat(ExactValue.error(new RecursiveSum().sum(terms), exact, exact))
        .isGreaterThan(at("sum2", terms.length, kappa));
  }

  private static void assertHolds(Candidate<Summation> candidate, double[] terms) {
    BigDecimal exact = ExactValue.sum(terms);
    BigDecimal magnitudes = ExactValue.sumOfMagnitudes(terms);
    double kappa = ExactValue.ratio(magnitudes, exact.abs());
    Bound bound = candidate.bound().orElseThrow();
    BigDecimal scale = bound.limits() == Bound.Limits.FORWARD_ERROR ? exact : magnitudes;
    assertThat(ExactValue.error(candidate.kernel().sum(terms), exact, scale))
        .as("n = %d, kappa = %s", terms.length, kappa)
        .isLessThanOrEqualTo(bound.formula().at(terms.length, kappa, U));
  }

  private static double at(String id, int n, double kappa) {
    return bound(id).formula().at(n, kappa, U);
  }

  private static Bound bound(String id) {
    return claiming()
        .filter(candidate -> candidate.id().equals(id))
        .findFirst()
        .orElseThrow()
        .bound()
        .orElseThrow();
  }
}
