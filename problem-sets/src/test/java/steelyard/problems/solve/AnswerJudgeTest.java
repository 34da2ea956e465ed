package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import steelyard.problems.Judgement;
import steelyard.problems.Judgement.Rounding;
import steelyard.problems.Judgement.Standing;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.Enclosure;

class AnswerJudgeTest {
  private static final double ULPS = 4 * 0x1p-53;

  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(11L);

  @Test
  void errorsAgreeWithExactFractions() {
    for (int trial = 0; trial < 150; trial++) {
      int n = 1 + random.nextInt(7);
      LinearSystem system = randomSystem(n);
      double[] answer = new double[n];
      BigFraction[] x = new RationalInverse(system.a()).solve(system.b());
      double size = Math.scalb(1.0, -random.nextInt(60));
      for (int i = 0; i < n; i++) {
        answer[i] = x[i].doubleValue() * (1 + size * (2 * random.nextDouble() - 1));
      }
      Judgement judgement = SystemProblem.of(system).judge(answer);
      assertThat(judgement.standing()).isEqualTo(Standing.OK);
      ExactErrors expected = new ExactErrors(system, x, answer);
      requireClose(judgement.backwardError(), expected.normwise());
      requireClose(judgement.componentwiseBackwardError().orElseThrow(), expected.componentwise());
      requireClose(judgement.forwardError(), expected.forward());
      requireClose(judgement.componentwiseForwardError().orElseThrow(), expected.worstEntry());
    }
  }

  // Morris, Phil. Mag. 37 (1946) for the first right-hand side; the second, times ten, from memory.
  @Test
  void wilsonsSystemsAreSolvedExactly() {
    double[][] a = PublishedMatrices.named("wilson").entries();
    assertThat(
            SystemProblem.of(new LinearSystem(a, new double[] {23, 32, 33, 31}))
                .judge(new double[] {1, 1, 1, 1}))
        .isEqualTo(
            new Judgement(
                Standing.OK, 0, 0, OptionalDouble.of(0), OptionalDouble.of(0), Rounding.NEAREST));
    assertThat(
            SystemProblem.of(new LinearSystem(a, new double[] {231, 319, 329, 311}))
                .judge(new double[] {146, -72, -25, 31})
                .forwardError())
        .isZero();
  }

  @Test
  void zeroOverZeroIsZeroAndNonzeroOverZeroIsInfinite() {
    double[][] a = {{2, 0}, {0, 4}};
    SystemProblem problem = SystemProblem.of(new LinearSystem(a, new double[] {2, 0}));
    Judgement right = problem.judge(new double[] {1, 0});
    assertThat(right.componentwiseBackwardError()).hasValue(0);
    assertThat(right.componentwiseForwardError()).hasValue(0);
    Judgement wrong = problem.judge(new double[] {1, 1e-300});
    assertThat(wrong.componentwiseForwardError()).hasValue(Double.POSITIVE_INFINITY);
    assertThat(wrong.componentwiseBackwardError()).hasValue(1);
    assertThat(wrong.forwardError()).isEqualTo(1e-300);
  }

  @Test
  void solutionZeroHasInfiniteConditionAndAMeaningfulBackwardError() {
    SystemProblem problem =
        SystemProblem.of(new LinearSystem(new double[][] {{2, 1}, {1, 3}}, new double[2]));
    assertThat(problem.condition().kappa()).isInfinite();
    assertThat(problem.condition().componentwise()).hasValue(Double.POSITIVE_INFINITY);
    assertThat(problem.judge(new double[] {0, -0.0}).forwardError()).isZero();
    assertThat(problem.judge(new double[2]).backwardError()).isZero();
    Judgement wrong = problem.judge(new double[] {1, 0});
    assertThat(wrong.forwardError()).isInfinite();
    assertThat(wrong.backwardError()).isEqualTo(0.5);
  }

  @Test
  void roundingTellsNearestFromFaithfulFromNeither() {
    LinearSystem system = new LinearSystem(new double[][] {{3, 0}, {0, 7}}, new double[] {1, 7});
    SystemProblem problem = SystemProblem.of(system);
    double third = 1 / 3.0;
    assertThat(problem.judge(new double[] {third, 1}).rounding()).isEqualTo(Rounding.NEAREST);
    // 1/3 lies above its nearest double.
    assertThat(problem.judge(new double[] {Math.nextUp(third), 1}).rounding())
        .isEqualTo(Rounding.FAITHFUL);
    assertThat(problem.judge(new double[] {Math.nextDown(third), 1}).rounding())
        .isEqualTo(Rounding.OTHER);
    assertThat(problem.judge(new double[] {third, Math.nextUp(1.0)}).rounding())
        .isEqualTo(Rounding.OTHER);
  }

  @Test
  void answersThatCannotBeJudgedSaySo() {
    SystemProblem problem = SystemProblem.of(randomSystem(2));
    assertThat(problem.judge(null).standing()).isEqualTo(Standing.MALFORMED);
    assertThat(problem.judge(new double[3]).standing()).isEqualTo(Standing.MALFORMED);
    assertThat(problem.judge(new double[] {Double.POSITIVE_INFINITY, Double.NaN}).standing())
        .isEqualTo(Standing.NAN);
    assertThat(problem.judge(new double[] {0, Double.NEGATIVE_INFINITY}).standing())
        .isEqualTo(Standing.INFINITE);
  }

  @Test
  void aReferenceThatIsTooVagueGivesNoErrors() {
    LinearSystem system = new LinearSystem(new double[][] {{2}}, new double[] {2});
    Enclosure one = Enclosure.of(2);
    Dyadic radius = Dyadic.powerOfTwo(-40);
    CertifiedSolution vague =
        new CertifiedSolution("test", List.of(Dyadic.ONE), List.of(radius), 0x1p-40, one, one, one);
    SystemProblem problem = new SystemProblem(system, vague);
    assertThat(problem.judge(new double[] {1}).standing()).isEqualTo(Standing.UNCERTIFIED);
    assertThat(problem.judge(new double[] {1 + 99 * 0x1p-40}).standing())
        .isEqualTo(Standing.UNCERTIFIED);
    assertThat(problem.judge(new double[] {1 + 101 * 0x1p-40}).standing()).isEqualTo(Standing.OK);
  }

  @Test
  void relativeErrorOfAnEntryThatMayBeZeroIsLeftOut() {
    LinearSystem system = new LinearSystem(new double[][] {{1, 0}, {0, 1}}, new double[] {1, 0});
    Enclosure two = Enclosure.of(2);
    CertifiedSolution vague =
        new CertifiedSolution(
            "test",
            List.of(Dyadic.ONE, Dyadic.ZERO),
            List.of(Dyadic.ZERO, Dyadic.powerOfTwo(-200)),
            0x1p-200,
            two,
            two,
            two);
    Judgement judgement = new SystemProblem(system, vague).judge(new double[] {1, 0});
    assertThat(judgement.componentwiseForwardError()).isEmpty();
    // An entry between -2^-200 and 2^-200 is not proved to round to zero.
    assertThat(judgement.rounding()).isEqualTo(Rounding.OTHER);
  }

  private LinearSystem randomSystem(int n) {
    double[][] a = new double[n][n];
    double[] b = new double[n];
    for (int i = 0; i < n; i++) {
      b[i] = 2 * random.nextDouble() - 1;
      for (int j = 0; j < n; j++) {
        a[i][j] = 2 * random.nextDouble() - 1;
      }
    }
    return new LinearSystem(a, b);
  }

  private static void requireClose(double actual, BigFraction expected) {
    assertThat(actual).isCloseTo(expected.doubleValue(), within(ULPS * expected.doubleValue()));
  }
}
