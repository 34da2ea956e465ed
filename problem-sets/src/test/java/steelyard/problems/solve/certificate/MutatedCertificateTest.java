package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import steelyard.problems.exact.Dyadic;

/**
 * Numbers made so that rounding does its worst, on which every allowance of a certificate is
 * needed: the bounds hold with all of them, and are wrong where one is left out or too small by one
 * factor.
 */
class MutatedCertificateTest {
  private static final Allowances PROVEN = Allowances.PROVEN;
  private static final Allowances NO_GAMMA = new Allowances(0, 16, Double.MIN_NORMAL);
  private static final Allowances NO_INFLATION = new Allowances(1.0000001, 0, Double.MIN_NORMAL);
  private static final Allowances NO_UNDERFLOW = new Allowances(1.0000001, 16, 0);

  private static final int SIZE = 402;
  // The factor n of gamma_n, and the n² of its square, forgotten.
  private static final Allowances SHORT_GAMMA =
      new Allowances(1.0000001 / SIZE, 16, Double.MIN_NORMAL);
  private static final Allowances SHORT_INFLATION =
      new Allowances(1.0000001, 16.0 / SIZE, Double.MIN_NORMAL);

  static Stream<Arguments> mutants() {
    return Stream.of(
        mutant("gamma left out in double", NO_GAMMA, MutatedCertificateTest::holdsInDouble),
        mutant("gamma without n in double", SHORT_GAMMA, MutatedCertificateTest::holdsInDouble),
        mutant("gamma left out in double-double", NO_GAMMA, MutatedCertificateTest::holdsTwofold),
        mutant(
            "gamma without n in double-double", SHORT_GAMMA, MutatedCertificateTest::holdsTwofold),
        mutant(
            "upper bounds not inflated",
            NO_INFLATION,
            allowed -> holdsAbove(1, 0x1p-54, 1, allowed)),
        mutant(
            "upper bounds inflated without n",
            SHORT_INFLATION,
            allowed -> holdsAbove(1, 0x1p-54, 1, allowed)),
        mutant(
            "lower bounds not deflated",
            NO_INFLATION,
            allowed -> holdsBelow(1, 0x1.4p-53, 1, allowed)),
        mutant(
            "lower bounds deflated without n",
            SHORT_INFLATION,
            allowed -> holdsBelow(1, 0x1.4p-53, 1, allowed)),
        mutant(
            "underflow to zero ignored",
            NO_UNDERFLOW,
            allowed -> holdsAbove(0.4, 0.4, Double.MIN_VALUE, allowed)),
        mutant(
            "underflow to the least double ignored",
            NO_UNDERFLOW,
            allowed -> holdsBelow(0.6, 0.6, Double.MIN_VALUE, allowed)));
  }

  private static Arguments mutant(
      String name, Allowances mutated, Predicate<Allowances> holdsWith) {
    return Arguments.of(name, mutated, holdsWith);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("mutants")
  void boundHoldsAsProvedAndFailsAsMutated(
      String name, Allowances mutated, Predicate<Allowances> holdsWith) {
    assertThat(holdsWith.test(PROVEN)).as("as proved").isTrue();
    assertThat(holdsWith.test(mutated)).as(name).isFalse();
  }

  // In entry (0, 0) of R A the products are 1 and 401 times 2^-55; of the latter four are added up
  // at a time and then lost.
  private static boolean holdsInDouble(Allowances allowances) {
    double[][] a = halfIdentity();
    double[][] r = twiceIdentity();
    for (int k = 1; k < SIZE; k++) {
      a[k][0] = 0.5;
      r[0][k] = 0x1p-54;
    }
    ScaledSystem system = new ScaledSystem(a, new double[SIZE]);
    double bound = new DoubleInverse(system, r, allowances).residualRowSums()[0];
    return Dyadic.of(bound).compareTo(exactRowSum(system, r[0], 0)) >= 0;
  }

  // In the last entry of R A - I the products are 2^-54, many times 2^-112, -2^-54 and 1: the first
  // is kept as the error of a sum, in which the small ones are lost, a block at a time, before it
  // cancels. The other entries of the last row are zero.
  private static boolean holdsTwofold(Allowances allowances) {
    int last = SIZE - 1;
    double[][] a = halfIdentity();
    double[][] r = twiceIdentity();
    for (int k = 0; k < last; k++) {
      a[k][last] = 0.25;
      r[last][k] = k == 0 ? 0x1p-52 : k == last - 1 ? -0x1p-52 : 0x1p-110;
      a[last][k] = -r[last][k] / 4;
    }
    ScaledSystem system = new ScaledSystem(a, new double[SIZE]);
    double bound =
        new DoubleDoubleInverse(system, r, new double[SIZE][SIZE], allowances)
            .residualRowSums()[last];
    return Dyadic.of(bound).compareTo(exactRowSum(system, r[last], last)) >= 0;
  }

  private static boolean holdsAbove(
      double first, double others, double entry, Allowances allowances) {
    double[] v = new double[SIZE];
    Arrays.fill(v, entry);
    double upper = bounds(first, others, allowances).upper(v)[0];
    return Dyadic.of(upper).compareTo(exactProduct(first, others, entry)) >= 0;
  }

  private static boolean holdsBelow(
      double first, double others, double entry, Allowances allowances) {
    Enclosure[] v = new Enclosure[SIZE];
    Arrays.fill(v, Enclosure.of(entry));
    double lower = bounds(first, others, allowances).enclose(v)[0].lower();
    return Dyadic.of(lower).compareTo(exactProduct(first, others, entry)) <= 0;
  }

  private static InverseBounds bounds(double first, double others, Allowances allowances) {
    double[] magnitudes = new double[SIZE * SIZE];
    Arrays.fill(magnitudes, others);
    for (int i = 0; i < SIZE; i++) {
      magnitudes[i * SIZE] = first;
    }
    return new InverseBounds(magnitudes, new double[SIZE], allowances);
  }

  private static Dyadic exactProduct(double first, double others, double entry) {
    return Dyadic.of(first)
        .add(Dyadic.of(others).multiply(Dyadic.of(SIZE - 1L)))
        .multiply(Dyadic.of(entry));
  }

  private static Dyadic exactRowSum(ScaledSystem system, double[] row, int i) {
    Dyadic sum = Dyadic.ZERO;
    for (int j = 0; j < SIZE; j++) {
      Dyadic entry = i == j ? Dyadic.ONE : Dyadic.ZERO;
      for (int k = 0; k < SIZE; k++) {
        entry = entry.subtract(Dyadic.of(row[k]).multiply(Dyadic.of(system.matrix[k * SIZE + j])));
      }
      sum = sum.add(entry.abs());
    }
    return sum;
  }

  private static double[][] halfIdentity() {
    double[][] a = new double[SIZE][SIZE];
    for (int i = 0; i < SIZE; i++) {
      a[i][i] = 0.5;
    }
    return a;
  }

  private static double[][] twiceIdentity() {
    double[][] r = new double[SIZE][SIZE];
    for (int i = 0; i < SIZE; i++) {
      r[i][i] = 2;
    }
    return r;
  }
}
