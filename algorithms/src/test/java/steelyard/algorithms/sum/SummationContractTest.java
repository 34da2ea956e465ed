package steelyard.algorithms.sum;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;

/** What every summation candidate owes its caller, whatever its accuracy. */
class SummationContractTest {

  private static final double INF = Double.POSITIVE_INFINITY;
  private static final double NAN = Double.NaN;

  static Stream<Candidate<Summation>> candidates() {
    return Summations.all().stream();
  }

  @Test
  void idsAreTheKnownOnesTextbookFirst() {
    assertThat(candidates().map(Candidate::id))
        .containsExactly(
            "recursive",
            "sorted",
            "pairwise",
            "blocked",
            "unrolled-8",
            "kahan",
            "neumaier",
            "klein",
            "sum2",
            "sum3",
            "sum4",
            "double-double",
            "accsum",
            "exact",
            "jdk-stream",
            "jdk-parallel-stream",
            "big-decimal",
            "commons-numbers",
            "commons-math");
  }

  @Test
  void onlyTheParallelStreamDependsOnCoresAndOnlyAccSumIsLimitedInSize() {
    assertThat(candidates().filter(Candidate::dependsOnCores).map(Candidate::id))
        .containsExactly("jdk-parallel-stream");
    assertThat(candidates().filter(c -> !c.scope().equals(Scope.EVERYTHING)).map(Candidate::id))
        .containsExactly("accsum");
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void saysWhatItIsAndWhereItIsFrom(Candidate<Summation> candidate) {
    assertThat(candidate.description()).isNotBlank();
    assertThat(candidate.cost()).isNotBlank();
    assertThat(candidate.source()).isNotBlank();
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void fewSmallIntegersAreSummedExactly(Candidate<Summation> candidate) {
    assertThat(sum(candidate)).isZero();
    assertThat(sum(candidate, 3.5)).isEqualTo(3.5);
    assertThat(sum(candidate, -0.0)).isZero();
    assertThat(sum(candidate, 1, -4)).isEqualTo(-3);
    assertThat(sum(candidate, Double.MIN_VALUE, Double.MIN_VALUE)).isEqualTo(0x1p-1073);
    for (int n : new int[] {3, 7, 8, 9, 31, 32, 33, 127, 128, 129, 1000, 4099}) {
      double[] terms = new double[n];
      for (int i = 0; i < n; i++) {
        terms[i] = (i % 2 == 0 ? 1 : -1) * (i + 1);
      }
      double exact = n % 2 == 0 ? -n / 2 : (n + 1) / 2;
      assertThat(sum(candidate, terms)).as("n = %d", n).isEqualTo(exact);
    }
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void nanPropagates(Candidate<Summation> candidate) {
    for (double[] terms :
        List.of(
            new double[] {NAN},
            new double[] {1, NAN, 2},
            new double[] {INF, NAN},
            new double[] {NAN, -INF, 1},
            new double[] {INF, 1, -INF},
            new double[] {-INF, INF})) {
      assertThat(sum(candidate, terms)).isNaN();
    }
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void infinitiesOfOneSignPropagate(Candidate<Summation> candidate) {
    assertThat(sum(candidate, INF)).isEqualTo(INF);
    assertThat(sum(candidate, 1, INF, 2)).isEqualTo(INF);
    assertThat(sum(candidate, INF, -1e308, INF)).isEqualTo(INF);
    assertThat(sum(candidate, 1, -INF, 2)).isEqualTo(-INF);
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void sumsBeyondTheLargestDoubleAreInfinite(Candidate<Summation> candidate) {
    assertThat(sum(candidate, 1e308, 1e308, 1)).isEqualTo(INF);
    assertThat(sum(candidate, -1e308, -1e308)).isEqualTo(-INF);
  }

  @ParameterizedTest
  @MethodSource("candidates")
  void leavesItsInputAloneAndRepeatsItself(Candidate<Summation> candidate) {
    Random random = new Random(7);
    for (int n : new int[] {1, 2, 10, 300, 5000}) {
      double[] terms =
          random.doubles(n, -1, 1).map(x -> Math.scalb(x, random.nextInt(100))).toArray();
      double[] original = terms.clone();
      double first = sum(candidate, terms);
      assertThat(terms).isEqualTo(original);
      assertThat(Double.doubleToRawLongBits(sum(candidate, terms)))
          .isEqualTo(Double.doubleToRawLongBits(first));
    }
  }

  private static double sum(Candidate<Summation> candidate, double... terms) {
    return candidate.kernel().sum(terms);
  }
}
