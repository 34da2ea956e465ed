package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import org.apache.commons.math3.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import steelyard.problems.UncertifiedException;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.solve.RationalInverse;

/** A certificate is given where it is deserved, and refused to a reference that is wrong. */
class CertificateTest {
  private static final double[][] MATRIX = {{0.7, 0.1, -0.3}, {0.2, -0.9, 0.4}, {0.5, 0.6, 0.8}};
  private static final double[] RIGHT_HAND_SIDE = {0.3, -0.7, 0.9};

  private final ScaledSystem system = new ScaledSystem(MATRIX, RIGHT_HAND_SIDE);
  private final ApproximateInverse honest =
      new DoubleInverse.DoubleRoute().invert(system).orElseThrow();

  /** An approximate inverse of which one part is replaced. */
  private record Tampered(
      ApproximateInverse original, double[] residualRowSums, double[] magnitudes, double factor)
      implements ApproximateInverse {
    @Override
    public int parts() {
      return original.parts();
    }

    @Override
    public double[][] times(double[][] v) {
      double[][] product = original.times(v);
      for (double[] part : product) {
        Arrays.setAll(part, i -> factor * part[i]);
      }
      return product;
    }
  }

  @Test
  void honestInverseIsAccepted() {
    assertThat(Certificate.attempt("test", system, honest)).isPresent();
  }

  @Test
  void inverseThatIsTooPoorForOnePercentIsRefused() {
    assertThat(Certificate.attempt("test", system, withResiduals(0.001))).isPresent();
    assertThat(Certificate.attempt("test", system, withResiduals(0.3))).isEmpty();
    assertThat(Certificate.attempt("test", system, withResiduals(1))).isEmpty();
  }

  @Test
  void residualBoundThatIsNotANumberProvesNothing() {
    double[] residuals = {Double.NaN, 1e-10, 1e-10};
    assertThat(
            new InverseBounds(new Tampered(honest, residuals, honest.magnitudes(), 1)).isProven())
        .isFalse();
  }

  @Test
  void correctionsThatLeadNowhereAreRefused() {
    assertThat(Certificate.attempt("test", system, withCorrections(0.9))).isPresent();
    assertThat(Certificate.attempt("test", system, withCorrections(0))).isEmpty();
    assertThat(Certificate.attempt("test", system, withCorrections(-1))).isEmpty();
    assertThat(Certificate.attempt("test", system, withCorrections(1e-3))).isEmpty();
    assertThat(Certificate.attempt("test", system, withCorrections(Double.NaN))).isEmpty();
  }

  @Test
  void perturbedSolutionGetsABoundThatCoversThePerturbation() {
    InverseBounds bounds = new InverseBounds(honest);
    BigFraction[] exact = new RationalInverse(MATRIX).solve(RIGHT_HAND_SIDE);
    BoundedSolution good = Refinement.run(system, honest, bounds);
    for (int bits = 1; bits < 300; bits += 13) {
      Dyadic[] wrong = good.values().clone();
      wrong[1] = wrong[1].add(Dyadic.powerOfTwo(-bits));
      Dyadic[] residual = new Dyadic[3];
      for (int i = 0; i < 3; i++) {
        residual[i] = Dyadic.of(system.rightHandSide[i]);
        for (int j = 0; j < 3; j++) {
          residual[i] =
              residual[i].subtract(Dyadic.of(system.matrix[i * 3 + j]).multiply(wrong[j]));
        }
      }
      BoundedSolution bounded = BoundedSolution.of(system, bounds, wrong, residual);
      int shift = system.columnShift[1] + system.matrixShift - system.vectorShift;
      BigFraction error = RationalInverse.exact(wrong[1].scalb(shift)).subtract(exact[1]).abs();
      BigFraction radius = RationalInverse.exact(Dyadic.of(bounded.radii()[1]).scalb(shift));
      assertThat(error.compareTo(radius)).isNotPositive();
      if (bits < 100) {
        assertThat(bounded.relativeBound()).isGreaterThan(Math.scalb(0.1, -bits));
      }
    }
  }

  // What the comparison with rational arithmetic would notice: alpha that is claimed too small.
  @Test
  void residualBoundThatIsTooSmallMakesAWrongEnclosure() {
    double[] wrong = honest.magnitudes();
    Arrays.setAll(wrong, i -> wrong[i] * 1.001);
    BigFraction exact = new RationalInverse(MATRIX).inverseNorm();
    assertThat(inverseNorm(new Tampered(honest, new double[] {0, 0, 0}, wrong, 1), exact))
        .isFalse();
    double honestResidual = 0.01;
    double[] residuals = {honestResidual, honestResidual, honestResidual};
    assertThat(inverseNorm(new Tampered(honest, residuals, wrong, 1), exact)).isTrue();
  }

  private boolean inverseNorm(ApproximateInverse inverse, BigFraction exact) {
    Enclosure norm =
        Certificate.attempt("test", system, inverse)
            .map(CertifiedSolution::inverseNorm)
            .orElse(new Enclosure(0, 1e300));
    return RationalInverse.exact(norm.lower()).compareTo(exact) <= 0
        && RationalInverse.exact(norm.upper()).compareTo(exact) >= 0;
  }

  @Test
  void singularMatricesAreNamedSo() {
    double[][] rankTwo = {{1, 2, 3}, {4, 5, 6}, {7, 8, 9}};
    assertThatThrownBy(() -> CertifiedSolver.solve(rankTwo, new double[3]))
        .isInstanceOf(UncertifiedException.class)
        .hasMessageContaining("determinant is exactly zero");
    assertThatThrownBy(() -> CertifiedSolver.solve(new double[][] {{0, 1}, {0, 2}}, new double[2]))
        .isInstanceOf(UncertifiedException.class)
        .hasMessageContaining("column 1 is zero");
    assertThatThrownBy(() -> CertifiedSolver.solve(new double[][] {{1, 1}, {0, 0}}, new double[2]))
        .isInstanceOf(UncertifiedException.class)
        .hasMessageContaining("row 2 is zero");
    rankTwo[2][2] = Math.nextUp(9.0);
    assertThat(CertifiedSolver.solve(rankTwo, new double[] {1, 0, 0}).isExact()).isFalse();
  }

  @Test
  void entriesTooFarApartAreRefused() {
    assertThatThrownBy(
            () ->
                CertifiedSolver.solve(
                    new double[][] {{1e300, 1}, {1, 1e-300 / 3}}, new double[] {1, 1e-320}))
        .isInstanceOf(UncertifiedException.class)
        .hasMessageContaining("powers of two");
  }

  // The unit upper triangular matrix with -c above the diagonal has an inverse of norm (c+1)^(n-1)
  // (Higham, Accuracy and Stability of Numerical Algorithms, 2nd ed. (2002), section 8.3).
  @Test
  void conditionNumbersUpTo1e234AreCertifiedAndBeyondTheRangeOfDoubleRefused() {
    for (int n : new int[] {4, 10, 20, 40}) {
      double[][] a = triangular(n, 0x1p20 - 1);
      CertifiedSolution solution = CertifiedSolver.solve(a, new double[n]);
      assertThat(solution.inverseNorm().contains(Math.scalb(1.0, 20 * (n - 1)))).isTrue();
      assertThat(solution.inverseNorm().isWithin(0.01)).isTrue();
    }
    assertThatThrownBy(() -> CertifiedSolver.solve(triangular(60, 0x1p20 - 1), new double[60]))
        .isInstanceOf(UncertifiedException.class)
        .hasMessageContaining("1024 fraction bits");
  }

  private static double[][] triangular(int n, double c) {
    double[][] a = new double[n][n];
    for (int i = 0; i < n; i++) {
      Arrays.fill(a[i], i + 1, n, -c);
      a[i][i] = 1;
    }
    return a;
  }

  private ApproximateInverse withResiduals(double residual) {
    double[] residuals = {residual, residual, residual};
    return new Tampered(honest, residuals, honest.magnitudes(), 1);
  }

  private ApproximateInverse withCorrections(double factor) {
    return new Tampered(honest, honest.residualRowSums(), honest.magnitudes(), factor);
  }
}
