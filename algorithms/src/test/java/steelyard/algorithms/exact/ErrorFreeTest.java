package steelyard.algorithms.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;

class ErrorFreeTest {

  private final Random random = new Random(1);

  @Test
  void sumAndItsErrorAreTheExactSum() {
    for (int i = 0; i < 2000; i++) {
      double a = number(1000);
      double b = number(1000);
      double sum = a + b;
      assertThat(ExactValue.sum(sum, ErrorFree.ofSum(a, b, sum)))
          .isEqualByComparingTo(ExactValue.sum(a, b));
    }
  }

  @Test
  void orderedSumNeedsTheLargerSummandFirst() {
    double sum = 1 + 0x1p-60;
    assertThat(ErrorFree.ofOrderedSum(1, 0x1p-60, sum)).isEqualTo(0x1p-60);
    assertThat(ErrorFree.ofOrderedSum(0x1p-60, 1, sum)).isNotEqualTo(0x1p-60);
  }

  @Test
  void productAndItsErrorAreTheExactProductUnlessTheErrorUnderflows() {
    for (int i = 0; i < 2000; i++) {
      double a = number(400);
      double b = number(400);
      double product = a * b;
      assertThat(ExactValue.sum(product, ErrorFree.ofProduct(a, b, product)))
          .isEqualByComparingTo(new BigDecimal(a).multiply(new BigDecimal(b)));
    }
    double tiny = Math.nextUp(0x1p-500);
    double product = tiny * tiny;
    assertThat(ExactValue.sum(product, ErrorFree.ofProduct(tiny, tiny, product)))
        .isNotEqualByComparingTo(new BigDecimal(tiny).pow(2));
  }

  private double number(int exponentRange) {
    return Math.scalb(random.nextGaussian(), random.nextInt(2 * exponentRange) - exponentRange);
  }
}
