package steelyard.problems.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.apache.commons.math3.fraction.BigFraction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.Family;
import steelyard.problems.solve.certificate.CertifiedSolution;
import steelyard.problems.solve.certificate.CertifiedSolver;
import steelyard.problems.solve.certificate.Enclosure;

/** No certified bound is ever violated by the exact rational solution. */
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
          requireBounds(problem.data(), problem.reference().solution());
        }
      }
    }
  }

  @Test
  void boundsHoldForConditionNumbersUpTo1e30AndBeyondOnEveryRoute() {
    Set<String> routes = new TreeSet<>();
    double largest = 0;
    for (int size = 2; size <= 20; size += 3) {
      for (int step = 0; step <= 10; step++) {
        int entry = size <= 5 ? 1 << step : 1 + 2 * step;
        LinearSystem system = triangularProduct(size, entry, random(size + 31L * step));
        CertifiedSolution solution = CertifiedSolver.solve(system.a(), system.b());
        requireBounds(system, solution);
        routes.add(solution.route());
        largest = Math.max(largest, solution.kappa().lower());
      }
    }
    assertThat(routes).contains("double", "double-double", "multiprecision-128");
    assertThat(largest).isGreaterThan(1e30);
  }

  @Test
  void boundsHoldForSmallRandomSystemsOfAllMagnitudes() {
    UniformRandomProvider random = random(5);
    for (int trial = 0; trial < 300; trial++) {
      int size = 1 + random.nextInt(6);
      int range = 1 + random.nextInt(300);
      double[][] a = new double[size][size];
      double[] b = new double[size];
      for (int i = 0; i < size; i++) {
        b[i] = number(random, range);
        for (int j = 0; j < size; j++) {
          a[i][j] = number(random, range);
        }
      }
      LinearSystem system = new LinearSystem(a, b);
      requireBounds(system, CertifiedSolver.solve(a, b));
    }
  }

  private static double number(UniformRandomProvider random, int range) {
    return Math.scalb(2 * random.nextDouble() - 1, random.nextInt(range) - range / 2);
  }

  // The product of unit triangular matrices with entries up to a given size: the inverse grows with
  // its powers.
  private static LinearSystem triangularProduct(
      int size, int largest, UniformRandomProvider random) {
    double[][] lower = new double[size][size];
    double[][] upper = new double[size][size];
    double[][] a = new double[size][size];
    double[] b = new double[size];
    for (int i = 0; i < size; i++) {
      b[i] = random.nextInt(2001) - 1000;
      lower[i][i] = 1;
      upper[i][i] = 1;
      for (int j = 0; j < i; j++) {
        lower[i][j] = random.nextInt(2 * largest + 1) - largest;
        upper[j][i] = random.nextInt(2 * largest + 1) - largest;
      }
    }
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        for (int k = 0; k <= Math.min(i, j); k++) {
          a[i][j] += lower[i][k] * upper[k][j];
        }
      }
    }
    return new LinearSystem(a, b);
  }

  private static void requireBounds(LinearSystem system, CertifiedSolution solution) {
    RationalInverse exact = new RationalInverse(system.a());
    BigFraction[] x = exact.solve(system.b());
    List<BigFraction> errors = new ArrayList<>();
    for (int i = 0; i < x.length; i++) {
      BigFraction error = RationalInverse.exact(solution.values().get(i)).subtract(x[i]).abs();
      BigFraction radius = RationalInverse.exact(solution.radii().get(i));
      assertThat(error.compareTo(radius)).as("entry %s on %s", i, solution.route()).isNotPositive();
      errors.add(error);
    }
    BigFraction relative =
        RationalInverse.norm(errors.toArray(BigFraction[]::new)).divide(RationalInverse.norm(x));
    assertThat(relative.compareTo(RationalInverse.exact(solution.relativeBound()))).isNotPositive();
    assertThat(solution.relativeBound()).isLessThan(1e-40);
    requireNarrow(solution.inverseNorm(), exact.inverseNorm());
    requireNarrow(solution.kappa(), exact.normwise(system.b()));
    requireNarrow(solution.componentwise(), exact.componentwise(system.b()));
  }

  private static void requireNarrow(Enclosure enclosure, BigFraction exact) {
    assertThat(RationalInverse.exact(enclosure.lower()).compareTo(exact)).isNotPositive();
    assertThat(RationalInverse.exact(enclosure.upper()).compareTo(exact)).isNotNegative();
    assertThat(enclosure.isWithin(0.01)).isTrue();
  }

  private static UniformRandomProvider random(long seed) {
    return RandomSource.XO_RO_SHI_RO_128_PP.create(seed);
  }
}
