package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.Family;
import steelyard.problems.Judgement;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.Enclosure;

/**
 * Exact fractions and another library's floating point agree with each other, and both with what is
 * said here of systems and answers: solutions, residuals, both condition numbers, both backward
 * errors and the forward error.
 */
class IndependentMeasuresTest {
  private static final BigDecimal SAME = new BigDecimal("1e-70");
  private static final BigDecimal REFERENCE = new BigDecimal("1e-40");
  // Half an ulp, and what the error of the reference may add to it.
  private static final BigDecimal HALF = new BigDecimal("0.5000001");

  static Stream<Family<LinearSystem>> families() {
    return SystemFamilies.all().stream();
  }

  @ParameterizedTest
  @MethodSource("families")
  void agreeForEveryFamily(Family<LinearSystem> family) {
    for (int size : new int[] {2, 5, 14}) {
      double most = family.reach().maxConditionAt(size);
      for (double target : new double[] {Math.min(most, 100), most}) {
        UniformRandomProvider random = random(size);
        SystemProblem problem =
            (SystemProblem) family.generate(new Family.Request(target, size), random);
        check(problem, random);
      }
    }
  }

  @ParameterizedTest
  @EnumSource(GradedSystems.class)
  void agreeWhileDifficultyRises(GradedSystems systems) {
    for (int size : new int[] {2, 5, 9}) {
      for (int difficulty = 0; difficulty <= GradedSystems.HARDEST; difficulty += 5) {
        UniformRandomProvider random = random(size + 100L * difficulty);
        check(SystemProblem.of(systems.make(size, difficulty, random)), random);
      }
    }
  }

  // An answer next to the solution, and one that is worse.
  private static void check(SystemProblem problem, UniformRandomProvider random) {
    List<BigDecimal> reference = problem.reference().answer(MathContext.DECIMAL128);
    double[] nearest = reference.stream().mapToDouble(BigDecimal::doubleValue).toArray();
    double size = Math.scalb(1.0, -random.nextInt(60));
    double[] perturbed = nearest.clone();
    Arrays.setAll(perturbed, i -> nearest[i] * (1 + size * (2 * random.nextDouble() - 1)));
    check(problem, nearest);
    check(problem, perturbed);
  }

  private static void check(SystemProblem problem, double[] answer) {
    Measures fractions = Measures.inFractions(problem.data(), answer);
    Measures floats = ApfloatMeasures.of(problem.data(), answer);
    requireSame(fractions, floats);
    CertifiedSolution solution = problem.reference().solution();
    Judgement judgement = problem.judge(answer);
    for (Measures measures : List.of(fractions, floats)) {
      requireReference(solution, measures.solution());
      requireInside(solution.inverseNorm(), measures.inverseNorm());
      requireInside(solution.kappa(), measures.normwise());
      requireInside(solution.componentwise(), measures.componentwise());
      requireNearest(judgement.backwardError(), measures.normwiseError());
      requireNearest(
          judgement.componentwiseBackwardError().orElseThrow(), measures.componentwiseError());
      requireNearest(judgement.forwardError(), measures.forwardError());
      requireResiduals(problem.data(), answer, measures.residuals());
    }
  }

  private static void requireSame(Measures fractions, Measures floats) {
    BigDecimal norm = norm(fractions.solution());
    for (int i = 0; i < fractions.solution().size(); i++) {
      BigDecimal distance = fractions.solution().get(i).subtract(floats.solution().get(i)).abs();
      assertThat(distance).isLessThanOrEqualTo(norm.multiply(SAME));
    }
    requireClose(fractions.inverseNorm(), floats.inverseNorm());
    requireClose(fractions.normwise(), floats.normwise());
    requireClose(fractions.componentwise(), floats.componentwise());
    requireClose(fractions.normwiseError(), floats.normwiseError());
    requireClose(fractions.componentwiseError(), floats.componentwiseError());
    requireClose(fractions.forwardError(), floats.forwardError());
  }

  private static void requireClose(BigDecimal expected, BigDecimal actual) {
    assertThat(actual.subtract(expected).abs()).isLessThanOrEqualTo(expected.multiply(SAME));
  }

  private static void requireReference(CertifiedSolution solution, List<BigDecimal> x) {
    BigDecimal allowed = norm(x).multiply(REFERENCE);
    for (int i = 0; i < x.size(); i++) {
      assertThat(solution.values().get(i).toBigDecimal().subtract(x.get(i)).abs())
          .isLessThanOrEqualTo(allowed);
    }
  }

  private static void requireInside(Enclosure enclosure, BigDecimal value) {
    assertThat(value)
        .isBetween(new BigDecimal(enclosure.lower()), new BigDecimal(enclosure.upper()));
  }

  private static void requireNearest(double actual, BigDecimal expected) {
    assertThat(new BigDecimal(actual).subtract(expected).abs())
        .isLessThanOrEqualTo(new BigDecimal(Math.ulp(actual)).multiply(HALF));
  }

  private static void requireResiduals(
      LinearSystem system, double[] answer, List<BigDecimal> residuals) {
    for (int i = 0; i < answer.length; i++) {
      ExactAccumulator residual = new ExactAccumulator();
      residual.add(system.b()[i]);
      for (int j = 0; j < answer.length; j++) {
        residual.addProduct(-system.a()[i][j], answer[j]);
      }
      assertThat(residual.value().toBigDecimal().abs()).isEqualByComparingTo(residuals.get(i));
    }
  }

  private static BigDecimal norm(List<BigDecimal> x) {
    return x.stream().map(BigDecimal::abs).reduce(BigDecimal.ZERO, BigDecimal::max);
  }

  private static UniformRandomProvider random(long seed) {
    return RandomSource.XO_RO_SHI_RO_128_PP.create(seed);
  }
}
