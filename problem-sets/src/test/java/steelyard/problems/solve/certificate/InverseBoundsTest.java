package steelyard.problems.solve.certificate;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import steelyard.problems.exact.Dyadic;

/**
 * The evaluation of |R| v, on numbers chosen so that plain double arithmetic errs in one direction
 * by more than the last bit.
 */
class InverseBoundsTest {
  private static final int SIZE = 300;

  @Test
  void boundsCoverRoundingDown() {
    // Each term but the first is lost.
    requireBounds(1, 0.4 * 0x1p-53, 1);
  }

  @Test
  void boundsCoverRoundingUp() {
    // Each term but the first counts as a whole unit in the last place.
    requireBounds(1, 0.6 * 0x1p-52, 1);
  }

  @Test
  void boundsCoverUnderflowToZero() {
    requireBounds(0.4, 0.4, Double.MIN_VALUE);
  }

  @Test
  void boundsCoverUnderflowToTheLeastDouble() {
    requireBounds(0.6, 0.6, Double.MIN_VALUE);
  }

  // With A = 1 and R = 1/2 the row sum of |I - R A| is 1/2, and |A⁻¹| v = v is attained: neither
  // the geometric series nor the row sum may be smaller by any factor.
  @Test
  void boundIsAttainedByAHalvedInverse() {
    double[] half = {0.5};
    assertThat(bounds(half, 0.5).upper(new double[] {3})[0]).isBetween(3.0, 3.0 + 1e-13);
    assertThat(bounds(half, 0.25).upper(new double[] {3})[0]).isLessThan(2.01);
  }

  @Test
  void lowerBoundTakesOffWhatTheUpperAdds() {
    double[] larger = {1.5};
    Enclosure[] exact = {Enclosure.of(3)};
    assertThat(bounds(larger, 0.5).enclose(exact)[0].lower()).isBetween(0.0, 1e-12);
    assertThat(bounds(larger, 0.25).enclose(exact)[0].lower()).isBetween(2.99, 3.0);
  }

  private static InverseBounds bounds(double[] magnitudes, double residual) {
    return new InverseBounds(magnitudes, new double[] {residual}, Allowances.PROVEN);
  }

  private static void requireBounds(double first, double others, double entry) {
    double[] magnitudes = new double[SIZE * SIZE];
    Arrays.fill(magnitudes, others);
    for (int i = 0; i < SIZE; i++) {
      magnitudes[i * SIZE] = first;
    }
    Dyadic exact =
        Dyadic.of(first)
            .add(Dyadic.of(others).multiply(Dyadic.of(SIZE - 1L)))
            .multiply(Dyadic.of(entry));
    InverseBounds bounds = new InverseBounds(magnitudes, new double[SIZE], Allowances.PROVEN);
    double[] v = new double[SIZE];
    Arrays.fill(v, entry);
    Enclosure[] enclosed = new Enclosure[SIZE];
    Arrays.fill(enclosed, Enclosure.of(entry));
    for (double upper : bounds.upper(v)) {
      assertThat(Dyadic.of(upper)).isGreaterThanOrEqualTo(exact);
    }
    for (Enclosure row : bounds.enclose(enclosed)) {
      assertThat(Dyadic.of(row.lower())).isLessThanOrEqualTo(exact);
      assertThat(Dyadic.of(row.upper())).isGreaterThanOrEqualTo(exact);
    }
  }
}
