package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;

/** The error-free transformations, and where the one for products ends. */
class ErrorFreeTest {

  @Test
  void sumAndErrorMakeTheExactSum() {
    RandomDoubles doubles = new RandomDoubles(1);
    for (int i = 0; i < 2000; i++) {
      double a = doubles.any() / 4;
      double b = doubles.near(Math.getExponent(a), 70) / 4;
      BigDecimal exact = new BigDecimal(a).add(new BigDecimal(b));
      BigDecimal both = new BigDecimal(a + b).add(new BigDecimal(ErrorFree.sumError(a, b)));
      assertThat(both).isEqualByComparingTo(exact);
    }
  }

  @Test
  void safeProductAndErrorMakeTheExactProduct() {
    RandomDoubles doubles = new RandomDoubles(2);
    int safe = 0;
    for (int i = 0; i < 4000; i++) {
      double a = doubles.any();
      double b = i % 2 == 0 ? doubles.any() : doubles.near(-968 - Math.getExponent(a), 5);
      if (ErrorFree.isProductSafe(a * b)) {
        safe++;
        BigDecimal exact = new BigDecimal(a).multiply(new BigDecimal(b));
        BigDecimal both = new BigDecimal(a * b).add(new BigDecimal(ErrorFree.productError(a, b)));
        assertThat(both).isEqualByComparingTo(exact);
      }
    }
    assertThat(safe).isGreaterThan(1000);
  }

  @Test
  void tellsUnsafeProducts() {
    double a = Math.nextUp(0x1p-490);
    assertThat(ErrorFree.isProductSafe(a * a)).isFalse();
    assertThat(new BigDecimal(a * a).add(new BigDecimal(ErrorFree.productError(a, a))))
        .isNotEqualByComparingTo(new BigDecimal(a).pow(2));
    assertThat(ErrorFree.isProductSafe(Double.POSITIVE_INFINITY)).isFalse();
    assertThat(ErrorFree.isProductSafe(Double.NaN)).isFalse();
    assertThat(ErrorFree.isProductSafe(0)).isFalse();
  }
}
