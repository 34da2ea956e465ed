package steelyard.algorithms.dot;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;

/** What every inner product candidate owes its caller, whatever its accuracy. */
class DotContractTest {

  private static final double INF = Double.POSITIVE_INFINITY;
  private static final double NAN = Double.NaN;

  static Stream<Candidate<DotProduct>> candidates() {
    return DotProducts.all().stream();
  }

  @Test
  void idsAreTheKnownOnesTextbookFirst() {
    assertThat(candidates().map(Candidate::id))
        .containsExactly(
            "recursive",
            "fma",
            "pairwise",
            "unrolled-8",
            "dot2",
            "dot3",
            "double-double",
            "exact",
            "commons-numbers",
            "commons-math");
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void saysWhatItIsAndWhereItIsFrom(Candidate<DotProduct> candidate) {
    assertThat(candidate.description()).isNotBlank();
    assertThat(candidate.cost()).isNotBlank();
    assertThat(candidate.source()).isNotBlank();
    assertThat(candidate.scope()).isEqualTo(Scope.EVERYTHING);
    assertThat(candidate.dependsOnCores()).isFalse();
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void smallIntegersAreMultipliedExactly(Candidate<DotProduct> candidate) {
    assertThat(dot(candidate, vector(), vector())).isZero();
    assertThat(dot(candidate, vector(3.5), vector(-2))).isEqualTo(-7);
    assertThat(dot(candidate, vector(-0.0), vector(1))).isZero();
    assertThat(dot(candidate, vector(1, -4), vector(5, 2))).isEqualTo(-3);
    for (int n : new int[] {3, 7, 8, 9, 31, 32, 33, 64, 65, 1000, 4099}) {
      double[] x = new double[n];
      double[] y = new double[n];
      for (int i = 0; i < n; i++) {
        x[i] = i + 1;
        y[i] = i % 2 == 0 ? i + 1 : -i - 1;
      }
      // 1 - 4 + 9 - ... is a triangular number with alternating sign.
      double exact = (n % 2 == 0 ? -0.5 : 0.5) * n * (n + 1);
      assertThat(dot(candidate, x, y)).as("n = %d", n).isEqualTo(exact);
    }
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void nanPropagates(Candidate<DotProduct> candidate) {
    assertThat(dot(candidate, vector(NAN), vector(1))).isNaN();
    assertThat(dot(candidate, vector(1, 2), vector(3, NAN))).isNaN();
    assertThat(dot(candidate, vector(1, INF), vector(3, 0))).isNaN();
    assertThat(dot(candidate, vector(INF, 1, 1), vector(1, 1, NAN))).isNaN();
    assertThat(dot(candidate, vector(INF, 1, INF), vector(1, 1, -1))).isNaN();
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void infinitiesOfOneSignPropagate(Candidate<DotProduct> candidate) {
    assertThat(dot(candidate, vector(INF), vector(2))).isEqualTo(INF);
    assertThat(dot(candidate, vector(1, -INF, 2), vector(3, 2, 1))).isEqualTo(-INF);
    assertThat(dot(candidate, vector(INF, -INF), vector(INF, -1))).isEqualTo(INF);
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void productsBeyondTheLargestDoubleAreInfinite(Candidate<DotProduct> candidate) {
    assertThat(dot(candidate, vector(1e200, 1), vector(1e200, 1))).isEqualTo(INF);
    assertThat(dot(candidate, vector(1e154, 1e154), vector(-1.5e154, -1.5e154))).isEqualTo(-INF);
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void leavesItsInputAloneAndRepeatsItself(Candidate<DotProduct> candidate) {
    Random random = new Random(7);
    for (int n : new int[] {1, 2, 10, 300, 5000}) {
      double[] x = random.doubles(n, -1, 1).map(v -> Math.scalb(v, random.nextInt(60))).toArray();
      double[] y = random.doubles(n, -1, 1).map(v -> Math.scalb(v, random.nextInt(60))).toArray();
      double[] originalX = x.clone();
      double[] originalY = y.clone();
      double first = dot(candidate, x, y);
      assertThat(x).isEqualTo(originalX);
      assertThat(y).isEqualTo(originalY);
      assertThat(Double.doubleToRawLongBits(dot(candidate, x, y)))
          .isEqualTo(Double.doubleToRawLongBits(first));
    }
  }

  private static double dot(Candidate<DotProduct> candidate, double[] x, double[] y) {
    return candidate.kernel().dot(x, y);
  }

  private static double[] vector(double... entries) {
    return entries;
  }
}
