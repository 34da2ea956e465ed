package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.ByteBuffer;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.Family;
import steelyard.problems.UnreachableException;

class SystemFamiliesTest {
  private static final Map<String, Family<LinearSystem>> FAMILIES =
      SystemFamilies.all().stream()
          .collect(Collectors.toMap(family -> family.profile().id(), family -> family));

  static Stream<Family<LinearSystem>> controlled() {
    return FAMILIES.values().stream().filter(family -> family.reach().controlled());
  }

  static Stream<Family<LinearSystem>> all() {
    return FAMILIES.values().stream();
  }

  // An orthogonal matrix of size n has a condition number of about n in the maximum norm, which is
  // the least that most families can make.
  @ParameterizedTest
  @MethodSource("controlled")
  void targetsAreMetWithinAFactorOfTwo(Family<LinearSystem> family) {
    for (int size : new int[] {2, 10, 40}) {
      for (double target = 100; target <= family.reach().maxCondition(); target *= 100) {
        for (int seed = 1; seed <= 2; seed++) {
          double achieved = generate(family, target, size, seed).condition().kappa();
          assertThat(achieved / target)
              .as("%s n=%s target %s", family.profile().id(), size, target)
              .isBetween(0.5, 2.0);
        }
      }
    }
  }

  @Test
  void positiveDefiniteIsProvedThroughoutItsReachAndNotElsewhere() {
    Family<LinearSystem> family = FAMILIES.get("positive-definite");
    for (int size : new int[] {2, 20, 100}) {
      assertThat(generate(family, family.reach().maxCondition(), size, 1).traits())
          .contains("symmetric", "positive-definite");
    }
    assertThat(generate(FAMILIES.get("spectrum-geometric"), 100, 10, 1).traits()).isEmpty();
    assertThat(generate(FAMILIES.get("hilbert"), 1, 12, 1).traits())
        .contains("symmetric", "positive-definite");
    assertThat(generate(FAMILIES.get("diagonally-dominant"), 1, 12, 1).traits())
        .contains("diagonally-dominant");
    assertThat(generate(FAMILIES.get("triangular-exponential"), 1, 12, 1).traits())
        .contains("upper-triangular")
        .doesNotContain("lower-triangular", "diagonally-dominant");
  }

  @Test
  void badScalingRaisesTheNormwiseConditionNumberOnly() {
    SystemProblem problem = generate(FAMILIES.get("badly-scaled"), 1e20, 20, 4);
    assertThat(problem.condition().kappa()).isGreaterThan(1e19);
    assertThat(problem.condition().componentwise().orElseThrow()).isLessThan(1000);
  }

  @Test
  void unimodularSystemsHaveIntegerInversesAndExactSolutions() {
    SystemProblem problem = generate(FAMILIES.get("unimodular"), 1, 15, 2);
    RationalInverse inverse = new RationalInverse(problem.data().a());
    assertThat(inverse.determinant().abs()).isEqualTo(BigFraction.ONE);
    assertThat(problem.reference().relativeBound()).isZero();
  }

  @Test
  void depotReadingsAreIntegersWithAnExactIntegerSolution() {
    SystemProblem problem = generate(FAMILIES.get("depot-load-cell"), 1e4, 8, 2);
    for (double[] row : problem.data().a()) {
      for (double entry : row) {
        assertThat(entry).isEqualTo(Math.rint(entry));
      }
    }
    assertThat(problem.reference().relativeBound()).isZero();
    assertThat(problem.reference().solution().values())
        .allSatisfy(weight -> assertThat(weight.doubleValue()).isBetween(20.0, 500.0));
  }

  // Partial pivoting on Wilkinson's matrix loses everything, and loses nothing where n is small.
  @Test
  void wilkinsonsMatrixDefeatsPartialPivoting() {
    Family<LinearSystem> family = FAMILIES.get("wilkinson-growth");
    assertThat(errorOfPartialPivoting(generate(family, 1, 10, 3))).isLessThan(1e-13);
    assertThat(errorOfPartialPivoting(generate(family, 1, 70, 3))).isGreaterThan(1e-4);
    assertThat(generate(family, 1, 70, 3).condition().kappa()).isLessThan(1000);
  }

  @Test
  void conditionOneE16AtSizeTwoHundredIsCertified() {
    SystemProblem problem = generate(FAMILIES.get("spectrum-geometric"), 1e16, 200, 1);
    assertThat(problem.normwiseCondition().isWithin(0.01)).isTrue();
    assertThat(problem.condition().kappa()).isBetween(0.5e16, 2e16);
    assertThat(problem.reference().relativeBound()).isLessThan(1e-40);
  }

  @ParameterizedTest
  @MethodSource("all")
  void sameSeedGivesTheSameBits(Family<LinearSystem> family) {
    double target = family.reach().controlled() ? 1e5 : 1;
    assertThat(digest(generate(family, target, 9, 5).data()))
        .isEqualTo(digest(generate(family, target, 9, 5).data()));
    assertThat(digest(generate(family, target, 9, 5).data()))
        .isNotEqualTo(digest(generate(family, target, 9, 6).data()));
  }

  @Test
  void bitsAreTheSameOnEveryPlatform() {
    assertThat(
            Stream.of(
                    "spectrum-geometric",
                    "positive-definite",
                    "badly-scaled",
                    "vandermonde",
                    "depot-load-cell")
                .map(FAMILIES::get)
                .map(family -> generate(family, family.reach().controlled() ? 1e5 : 1, 12, 1))
                .map(problem -> digest(problem.data())))
        .containsExactly(
            "b73e5492b15f10a5",
            "31ceaff5f249fa1b",
            "e0e04674f9c79616",
            "0b46be53ab424140",
            "39f82153b6075b51");
  }

  @Test
  void requestsOutsideTheReachAreRefused() {
    assertThatThrownBy(() -> generate(FAMILIES.get("hilbert"), 1, 20, 1))
        .isInstanceOf(UnreachableException.class)
        .hasMessageContaining("sizes from 2 to 19");
    for (double target : new double[] {1e17, 0.5, Double.NaN}) {
      assertThatThrownBy(() -> generate(FAMILIES.get("spectrum-one-large"), target, 5, 1))
          .isInstanceOf(UnreachableException.class)
          .hasMessageContaining("condition numbers from 1 to 1e16");
    }
  }

  private static SystemProblem generate(
      Family<LinearSystem> family, double target, int size, long seed) {
    return (SystemProblem)
        family.generate(
            new Family.Request(target, size), RandomSource.XO_RO_SHI_RO_128_PP.create(seed));
  }

  private static double errorOfPartialPivoting(SystemProblem problem) {
    int n = problem.size();
    double[][] a = new double[n][];
    for (int i = 0; i < n; i++) {
      a[i] = problem.data().a()[i].clone();
    }
    double[] x = problem.data().b().clone();
    // On this matrix the first pivot is always among the largest, so that no rows are exchanged.
    for (int k = 0; k < n; k++) {
      for (int i = k + 1; i < n; i++) {
        double factor = a[i][k] / a[k][k];
        for (int j = k; j < n; j++) {
          a[i][j] -= factor * a[k][j];
        }
        x[i] -= factor * x[k];
      }
    }
    for (int i = n - 1; i >= 0; i--) {
      for (int j = i + 1; j < n; j++) {
        x[i] -= a[i][j] * x[j];
      }
      x[i] /= a[i][i];
    }
    return problem.judge(x).backwardError();
  }

  private static String digest(LinearSystem system) {
    int n = system.size();
    ByteBuffer bytes = ByteBuffer.allocate(8 * n * (n + 1));
    for (double[] row : system.a()) {
      for (double entry : row) {
        bytes.putDouble(entry);
      }
    }
    for (double entry : system.b()) {
      bytes.putDouble(entry);
    }
    try {
      byte[] hash = MessageDigest.getInstance("SHA-256").digest(bytes.array());
      return HexFormat.of().formatHex(hash, 0, 8);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException(e);
    }
  }
}
