package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;

/** The accumulator against BigDecimal, which adds and multiplies doubles exactly. */
class ExactAccumulatorTest {

  @Test
  void sumsAreExact() {
    RandomDoubles doubles = new RandomDoubles(1);
    for (int i = 0; i < 300; i++) {
      double[] terms = doubles.array(1 + doubles.below(40));
      BigDecimal sum = BigDecimal.ZERO;
      BigDecimal absolute = BigDecimal.ZERO;
      for (double term : terms) {
        sum = sum.add(new BigDecimal(term));
        absolute = absolute.add(new BigDecimal(term).abs());
      }
      assertThat(ExactAccumulator.sum(terms).toBigDecimal()).isEqualByComparingTo(sum);
      assertThat(ExactSums.of(terms).absoluteSum().toBigDecimal()).isEqualByComparingTo(absolute);
    }
  }

  @Test
  void dotProductsAreExact() {
    RandomDoubles doubles = new RandomDoubles(2);
    for (int i = 0; i < 300; i++) {
      double[] x = doubles.array(1 + doubles.below(20));
      double[] y = doubles.array(x.length);
      BigDecimal sum = BigDecimal.ZERO;
      BigDecimal absolute = BigDecimal.ZERO;
      for (int j = 0; j < x.length; j++) {
        BigDecimal product = new BigDecimal(x[j]).multiply(new BigDecimal(y[j]));
        sum = sum.add(product);
        absolute = absolute.add(product.abs());
      }
      assertThat(ExactAccumulator.dot(x, y).toBigDecimal()).isEqualByComparingTo(sum);
      assertThat(ExactSums.ofProducts(x, y).absoluteSum().toBigDecimal())
          .isEqualByComparingTo(absolute);
    }
  }

  @Test
  void holdsTheSmallestAndTheLargestProducts() {
    ExactAccumulator accumulator = new ExactAccumulator();
    accumulator.addProduct(Double.MAX_VALUE, Double.MAX_VALUE);
    accumulator.addProduct(Double.MIN_VALUE, -Double.MIN_VALUE);
    BigDecimal large = new BigDecimal(Double.MAX_VALUE).pow(2);
    BigDecimal small = new BigDecimal(Double.MIN_VALUE).pow(2);
    assertThat(accumulator.value().toBigDecimal()).isEqualByComparingTo(large.subtract(small));
    accumulator.addProduct(-Double.MAX_VALUE, Double.MAX_VALUE);
    assertThat(accumulator.value()).isEqualTo(Dyadic.powerOfTwo(-2148).negate());
    assertThat(accumulator.round()).isEqualTo(-0.0);
    accumulator.reset();
    assertThat(accumulator.value()).isEqualTo(Dyadic.ZERO);
  }

  /**
   * Far more terms of one sign and size than chunks could gather without passing carries, at every
   * place that a significand can take within a chunk.
   */
  @Test
  void passesCarriesInTime() {
    Dyadic count = Dyadic.of(10_007);
    for (int place = 0; place < 32; place++) {
      double term = Math.scalb(place % 2 == 0 ? -0x1.fffffffffffffp0 : 0x1.fffffffffffffp0, place);
      double unsafe = Math.scalb(term, -500);
      ExactAccumulator sums = new ExactAccumulator();
      ExactAccumulator products = new ExactAccumulator();
      ExactAccumulator unsafeProducts = new ExactAccumulator();
      for (int i = 0; i < 10_007; i++) {
        sums.add(term);
        products.addProduct(term, 0x1.fffffffffffffp0);
        unsafeProducts.addProduct(unsafe, 0x1.fffffffffffffp-520);
      }
      Dyadic value = Dyadic.of(term);
      Dyadic product = value.multiply(Dyadic.of(0x1.fffffffffffffp0));
      assertThat(sums.value()).isEqualTo(value.multiply(count));
      assertThat(products.value()).isEqualTo(product.multiply(count));
      assertThat(unsafeProducts.value()).isEqualTo(product.multiply(count).scalb(-1020));
    }
  }

  /** Doubling 2^30 ones into themselves reaches 2^62 terms without adding them one by one. */
  @Test
  void takesAccumulatorsAsTerms() {
    ExactAccumulator accumulator = new ExactAccumulator();
    accumulator.add(Double.MAX_VALUE);
    accumulator.addProduct(Double.MAX_VALUE, Double.MAX_VALUE);
    accumulator.add(-Double.MIN_VALUE);
    Dyadic once = accumulator.value();
    for (int i = 0; i < 62; i++) {
      ExactAccumulator copy = new ExactAccumulator();
      copy.add(accumulator);
      accumulator.add(copy);
    }
    assertThat(accumulator.value()).isEqualTo(once.scalb(62));
  }

  /** Rounding goes by the chunks, and must agree with that of the exact value everywhere. */
  @Test
  void roundsAsItsExactValueDoes() {
    RandomDoubles doubles = new RandomDoubles(3);
    for (int i = 0; i < 20_000; i++) {
      ExactAccumulator accumulator = new ExactAccumulator();
      for (double term : doubles.array(1 + doubles.below(3))) {
        accumulator.add(term);
        accumulator.add(Math.scalb(term, -53 - doubles.below(60)));
        accumulator.addProduct(term, Math.scalb(1.0, -53 - doubles.below(3)));
      }
      requireRounded(accumulator);
    }
  }

  /** Ties, broken or not by something below, at every place within a chunk and of either sign. */
  @Test
  void roundsTiesAsItsExactValueDoes() {
    for (int exponent = -1000; exponent < 1020; exponent += 7) {
      for (int below : new int[] {0, 1, 2, 11, 12, 40, 44, 45, 64, 65, 90, 600, 1000}) {
        for (int sign = -1; sign <= 1; sign += 2) {
          ExactAccumulator accumulator = new ExactAccumulator();
          accumulator.addInteger((1L << 54) - 1, exponent - 53, sign < 0);
          if (below > 0) {
            accumulator.addInteger(1, exponent - 53 - below, false);
          }
          requireRounded(accumulator);
          accumulator.addInteger(2, exponent - 53, sign > 0);
          requireRounded(accumulator);
        }
      }
    }
  }

  /** Around the least double and half of it, and around the largest and 2^1024. */
  @Test
  void roundsAtTheEndsOfTheRangeAsItsExactValueDoes() {
    for (int eighths = 0; eighths <= 40; eighths++) {
      ExactAccumulator tiny = new ExactAccumulator();
      tiny.addInteger(eighths, -1077, false);
      requireRounded(tiny);
      tiny.addInteger(1, -2140, false);
      requireRounded(tiny);
      ExactAccumulator huge = new ExactAccumulator();
      huge.add(-Double.MAX_VALUE);
      huge.addInteger(eighths, 968, true);
      requireRounded(huge);
      huge.addProduct(-0x1p1000, 0x1p1000);
      requireRounded(huge);
      for (int i = 0; i < 70; i++) {
        huge.addProduct(-Double.MAX_VALUE, Double.MAX_VALUE);
        ExactAccumulator copy = new ExactAccumulator();
        copy.add(huge);
        huge.add(copy);
      }
      assertThat(huge.round()).isEqualTo(Double.NEGATIVE_INFINITY);
    }
  }

  private static void requireRounded(ExactAccumulator accumulator) {
    assertThat(accumulator.round()).isEqualTo(accumulator.value().doubleValue());
  }

  @Test
  void refusesWhatIsNotFinite() {
    ExactAccumulator accumulator = new ExactAccumulator();
    String sentence = "a finite double is wanted, but it is infinite or NaN";
    assertThatThrownBy(() -> accumulator.add(Double.NaN)).hasMessage(sentence);
    assertThatThrownBy(() -> accumulator.add(Double.NEGATIVE_INFINITY)).hasMessage(sentence);
    assertThatThrownBy(() -> accumulator.addProduct(Double.POSITIVE_INFINITY, 0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage(sentence);
    assertThatThrownBy(() -> ExactAccumulator.dot(new double[2], new double[3]))
        .hasMessage("two vectors of the same length are wanted, but they have 2 and 3 entries");
  }
}
