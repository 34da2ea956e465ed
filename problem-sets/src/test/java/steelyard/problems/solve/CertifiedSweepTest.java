package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.Family;
import steelyard.problems.solve.certificate.CertifiedSolution;

/**
 * Thousands of systems up to size 60 and condition number 1e30 and beyond, each held against its
 * exact rational solution. It takes minutes and is no part of the gate.
 */
@Tag("sweep")
class CertifiedSweepTest {
  private static final int[] SIZES = {2, 3, 4, 5, 6, 8, 10, 13, 16, 20, 26, 33, 45, 60};

  private static final Map<String, Integer> ROUTES = new TreeMap<>();
  private static double largest = 0;

  static Stream<Family<LinearSystem>> families() {
    return SystemFamilies.all().stream();
  }

  @ParameterizedTest
  @MethodSource("families")
  void boundsHoldForEveryFamily(Family<LinearSystem> family) {
    for (int size : SIZES) {
      if (size >= family.reach().minSize() && size <= family.reach().maxSize()) {
        double most = StrictMath.log10(family.reach().maxConditionAt(size));
        int steps = steps(size);
        for (int step = 0; step < steps; step++) {
          double target =
              family.reach().controlled()
                  ? StrictMath.pow(10, 0.999 * most * (step + 1) / steps)
                  : 1;
          SystemProblem problem =
              (SystemProblem) family.generate(new Family.Request(target, size), random(size, step));
          CertifiedSolution solution = problem.reference().solution();
          ExactVerdict.require(problem.data(), solution);
          count(solution);
        }
      }
    }
  }

  @ParameterizedTest
  @EnumSource(GradedSystems.class)
  void boundsHoldWhileDifficultyRises(GradedSystems systems) {
    for (int size : SIZES) {
      int steps = 2 * steps(size);
      for (int step = 0; step < steps; step++) {
        int difficulty = GradedSystems.HARDEST * step / (steps - 1);
        count(ExactVerdict.require(systems.make(size, difficulty, random(size, step))));
      }
    }
  }

  @AfterAll
  static void thousandsWereTried() {
    int systems = ROUTES.values().stream().mapToInt(Integer::intValue).sum();
    System.out.println(
        "%s systems %s, condition numbers up to %s".formatted(systems, ROUTES, largest));
    assertThat(systems).isGreaterThan(3000);
    assertThat(largest).isGreaterThan(1e30);
  }

  // Exact solutions of large systems take long, so that there are few of them.
  private static int steps(int size) {
    if (size <= 16) {
      return 24;
    }
    return size <= 26 ? 8 : 3;
  }

  private static void count(CertifiedSolution solution) {
    ROUTES.merge(solution.route(), 1, Integer::sum);
    largest = Math.max(largest, solution.kappa().lower());
  }

  private static UniformRandomProvider random(int size, int step) {
    return RandomSource.XO_RO_SHI_RO_128_PP.create(1000L * size + step);
  }
}
