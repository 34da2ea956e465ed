package steelyard.algorithms.dot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.exact.ExactValue;
import steelyard.algorithms.exact.IllConditioned;

class DotBoundsTest {

  private static final double U = 0x1p-53;
  private static final double INF = Double.POSITIVE_INFINITY;

  static Stream<Candidate<DotProduct>> claiming() {
    return DotProducts.all().stream().filter(candidate -> candidate.bound().isPresent());
  }

  @Test
  void onlyTheLibrariesClaimNothing() {
    assertThat(DotProducts.all().stream().filter(c -> c.bound().isEmpty()).map(Candidate::id))
        .containsExactly("commons-numbers", "commons-math");
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void claimsNothingWhereProductsUnderflow(Candidate<DotProduct> candidate) {
    assertThat(candidate.bound().orElseThrow().traits()).containsExactly("no-underflow");
  }

  @Test
  void formulasAtHand() {
    assertThat(at("recursive", 6, 1)).isEqualTo(3 * U);
    assertThat(at("fma", 6, 1)).isEqualTo(Bound.gamma(6, U) / 2);
    assertThat(at("pairwise", 32, 1)).isEqualTo(Bound.gamma(32, U) / 2);
    assertThat(at("pairwise", 33, 1)).isEqualTo(Bound.gamma(18, U) / 2);
    assertThat(at("unrolled-8", 7, 1)).isEqualTo(Bound.gamma(7, U) / 2);
    assertThat(at("unrolled-8", 8, 1)).isEqualTo(Bound.gamma(4, U) / 2);
    assertThat(at("unrolled-8", 15, 1)).isEqualTo(Bound.gamma(8, U) / 2);
    assertThat(at("unrolled-8", 80, 1)).isEqualTo(Bound.gamma(13, U) / 2);
    assertThat(at("dot2", 4, 1 / U)).isCloseTo(U + 8 * U, within(1e-10 * U));
    assertThat(at("dot3", 3, 1 / (U * U))).isCloseTo(U + 500 * U, within(1e-10 * U));
    assertThat(bound("dot3").formula().at(1000, 1, 1e-3)).isEqualTo(INF);
    assertThat(at("double-double", 11, 1 / U)).isCloseTo(U + 15 * U, within(1e-10 * U));
    assertThat(at("exact", 1000, 1e99)).isEqualTo(U);
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void isSmallForNoTermsAndFiniteForOne(Candidate<DotProduct> candidate) {
    for (double kappa : new double[] {0, 1, 1e300, INF}) {
      assertThat(at(candidate.id(), 0, kappa)).isBetween(0.0, 2 * U);
    }
    // The condition number of a single product is 2.
    assertThat(at(candidate.id(), 1, 2)).isBetween(U / 2, U + 100 * U * U);
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void holdsOnIllConditionedProducts(Candidate<DotProduct> candidate) {
    Random random = new Random(41);
    for (int bits = 4; bits < 300; bits += 3) {
      IllConditioned.Pair pair = IllConditioned.dot(6 + 2 * random.nextInt(60), bits, random);
      assertHolds(candidate, pair.x(), pair.y());
    }
  }

  @ParameterizedTest
  @MethodSource("claiming")
  void holdsOnProductsOfOneSign(Candidate<DotProduct> candidate) {
    Random random = new Random(42);
    for (int n = 1; n < 3000; n = n * 3 / 2 + 1) {
      assertHolds(candidate, random.doubles(n).toArray(), random.doubles(n).toArray());
    }
  }

  /** A bound that could not be broken would be worthless: Dot2's is, by the recursive product. */
  @Test
  void recursiveProductBreaksTheBoundOfDot2() {
    IllConditioned.Pair pair = IllConditioned.dot(40, 60, new Random(5));
    BigDecimal exact = ExactValue.dot(pair.x(), pair.y());
    double kappa =
        2 * ExactValue.ratio(ExactValue.dotOfMagnitudes(pair.x(), pair.y()), exact.abs());
    assertThat(ExactValue.error(new RecursiveDot().dot(pair.x(), pair.y()), exact, exact))
        .isGreaterThan(at("dot2", 40, kappa));
  }

  private static void assertHolds(Candidate<DotProduct> candidate, double[] x, double[] y) {
    BigDecimal exact = ExactValue.dot(x, y);
    BigDecimal twice = ExactValue.dotOfMagnitudes(x, y).multiply(BigDecimal.valueOf(2));
    double kappa = ExactValue.ratio(twice, exact.abs());
    Bound bound = candidate.bound().orElseThrow();
    BigDecimal scale = bound.limits() == Bound.Limits.FORWARD_ERROR ? exact : twice;
    assertThat(ExactValue.error(candidate.kernel().dot(x, y), exact, scale))
        .as("n = %d, kappa = %s", x.length, kappa)
        .isLessThanOrEqualTo(bound.formula().at(x.length, kappa, U));
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
