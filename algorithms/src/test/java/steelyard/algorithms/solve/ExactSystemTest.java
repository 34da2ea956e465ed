package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;

/**
 * The judge of the other tests, judged by a published system: Kahan, Numerical linear algebra,
 * Canadian Mathematical Bulletin 9 (1966) 757-801, the 2 by 2 example; multiplied by 10⁴, so that
 * the stored doubles are exact.
 */
class ExactSystemTest {

  private final ExactSystem kahan =
      new ExactSystem(new double[][] {{12969, 8648}, {2161, 1441}}, new double[] {8642, 1440});

  @Test
  void aSmallResidualAndALargeErrorAreToldApart() {
    double[] y = {0.9911, -0.4870};
    // Exact: 3.32594876255531938e-9 and 2.33452092747434881e-8; y is rounded to doubles here.
    assertThat(kahan.backwardError(y)).isCloseTo(3.32594876255532e-9, withinPercentage(1e-4));
    assertThat(kahan.componentwiseBackwardError(y))
        .isCloseTo(2.33452092747435e-8, withinPercentage(1e-4));
    assertThat(kahan.forwardError(y)).isCloseTo(0.7565, withinPercentage(1e-10));
  }

  @Test
  void theExactSolutionHasNoError() {
    double[] x = {2, -2};
    assertThat(kahan.backwardError(x)).isZero();
    assertThat(kahan.componentwiseBackwardError(x)).isZero();
    assertThat(kahan.forwardError(x)).isZero();
  }

  /** ‖A⁻¹‖‖A‖ = 327065210 is published; ‖A⁻¹‖‖b‖/‖x‖ = 15130 · 8642 / 2 comes on top. */
  @Test
  void theConditionNumberCountsTheRightHandSide() {
    assertThat(kahan.condition()).isEqualTo(327065210.0 + 15130.0 * 8642 / 2);
  }

  @Test
  void anEquationWithoutAnythingInItHasNoError() {
    ExactSystem system = new ExactSystem(new double[][] {{1, 0}, {0, 1}}, new double[] {0, 1});
    assertThat(system.componentwiseBackwardError(new double[] {0, 1})).isZero();
    assertThat(system.componentwiseBackwardError(new double[] {0, 0})).isEqualTo(1);
  }
}
