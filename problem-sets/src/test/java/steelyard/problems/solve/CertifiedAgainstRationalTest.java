package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.Family;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.certificate.Enclosure;

/**
 * No certified bound is ever violated by the exact rational solution: hundreds of systems; {@link
 * CertifiedSweepTest} has thousands, and larger ones.
 */
class CertifiedAgainstRationalTest {

  static Stream<Family<LinearSystem>> families() {
    return SystemFamilies.all().stream();
  }

  @ParameterizedTest
  @MethodSource("families")
  void boundsHoldForEveryFamily(Family<LinearSystem> family) {
    double[] targets =
        family.reach().controlled() ? new double[] {10, 1e6, 1e12, 1e16} : new double[] {1, 1};
    long seed = 100;
    for (int size : new int[] {2, 3, 7, 12, 20}) {
      for (double target : targets) {
        seed++;
        if (size <= family.reach().maxSize() && target <= family.reach().maxCondition()) {
          SystemProblem problem =
              (SystemProblem) family.generate(new Family.Request(target, size), random(seed));
          ExactVerdict.require(problem.data(), problem.reference().solution());
        }
      }
    }
  }

  @ParameterizedTest
  @EnumSource(GradedSystems.class)
  void boundsHoldWhileDifficultyRises(GradedSystems systems) {
    for (int size = 2; size <= 14; size += 3) {
      for (int difficulty = 0; difficulty <= GradedSystems.HARDEST; difficulty++) {
        ExactVerdict.require(systems.make(size, difficulty, random(size + 31L * difficulty)));
      }
    }
  }

  @Test
  void conditionNumbersUpTo1e30AndBeyondAreReachedAndEveryArithmeticIsNeeded() {
    Set<String> routes = new TreeSet<>();
    double largest = 0;
    for (int difficulty = 0; difficulty <= GradedSystems.HARDEST; difficulty++) {
      LinearSystem system = GradedSystems.UNIMODULAR.make(20, difficulty, random(difficulty));
      CertifiedSolution solution = CertifiedSolver.solve(system.a(), system.b());
      routes.add(solution.route());
      largest = Math.max(largest, solution.kappa().lower());
    }
    assertThat(routes).contains("double", "double-double").hasSizeGreaterThanOrEqualTo(3);
    assertThat(largest).isGreaterThan(1e30);
  }

  @Test
  void aWrongCertificateIsNoticed() {
    LinearSystem system = new LinearSystem(new double[][] {{3, 1}, {1, 2}}, new double[] {1, 1});
    CertifiedSolution right = ExactVerdict.require(system);
    List<Dyadic> exactly = Collections.nCopies(2, Dyadic.ZERO);
    Enclosure off = right.inverseNorm().times(Enclosure.of(1.02));
    assertNoticed(system, with(right, exactly, right.relativeBound(), right.kappa()), "radius");
    assertNoticed(system, with(right, right.radii(), 1e-300, right.kappa()), "relative bound");
    assertNoticed(system, with(right, right.radii(), right.relativeBound(), off), "normwise");
    assertNoticed(
        system,
        with(right, right.radii(), right.relativeBound(), new Enclosure(1, 100)),
        "is wide");
  }

  private static CertifiedSolution with(
      CertifiedSolution original, List<Dyadic> radii, double relativeBound, Enclosure kappa) {
    return new CertifiedSolution(
        original.route(),
        original.values(),
        radii,
        relativeBound,
        original.inverseNorm(),
        kappa,
        original.componentwise());
  }

  // The message names what is wrong and holds the system.
  private static void assertNoticed(
      LinearSystem system, CertifiedSolution wrong, String complaint) {
    assertThatThrownBy(() -> ExactVerdict.require(system, wrong))
        .isInstanceOf(AssertionError.class)
        .hasMessageContaining(complaint)
        .hasMessageContaining("0x1.8p1");
  }

  private static UniformRandomProvider random(long seed) {
    return RandomSource.XO_RO_SHI_RO_128_PP.create(seed);
  }
}
