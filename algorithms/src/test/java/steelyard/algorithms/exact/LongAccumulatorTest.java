package steelyard.algorithms.exact;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;

/** Against decimal arithmetic, which shares nothing with the fixed-point register. */
class LongAccumulatorTest {

  private final Random random = new Random(20150505);

  @Test
  void sumsOfAnyExponentsAreNearest() {
    for (int i = 0; i < 3000; i++) {
      assertSumNearest(random.doubles(1 + i % 12, -1, 1).map(x -> anyDouble()).toArray());
    }
  }

  @Test
  void sumsOfNearbyExponentsAreNearest() {
    for (int i = 0; i < 5000; i++) {
      int base = random.nextInt(1900) - 1000;
      assertSumNearest(
          DoubleStream.generate(() -> Math.scalb(random.nextGaussian(), base + random.nextInt(120)))
              .limit(1 + i % 30)
              .toArray());
    }
  }

  @Test
  void subnormalSumsAreExact() {
    for (int i = 0; i < 2000; i++) {
      double[] terms =
          DoubleStream.generate(() -> random.nextInt(100) * random.nextGaussian() * 0x1p-1070)
              .limit(2 + i % 9)
              .toArray();
      assertThat(ExactValue.sum(LongAccumulator.sum(terms)))
          .isEqualByComparingTo(ExactValue.sum(terms));
    }
  }

  @Test
  void cancellingSumsAreNearest() {
    for (int i = 0; i < 500; i++) {
      assertSumNearest(IllConditioned.sum(6 + 2 * (i % 20), 20 + i, random));
    }
  }

  @Test
  void tiesGoToEvenAndAnythingMoreBreaksThem() {
    assertThat(LongAccumulator.sum(new double[] {1, 0x1p-53})).isEqualTo(1);
    assertThat(LongAccumulator.sum(new double[] {1 + 0x1p-52, 0x1p-53})).isEqualTo(1 + 0x1p-51);
    assertThat(LongAccumulator.sum(new double[] {1, 0x1p-53, Double.MIN_VALUE}))
        .isEqualTo(1 + 0x1p-52);
    assertThat(LongAccumulator.sum(new double[] {1 + 0x1p-52, 0x1p-53, -Double.MIN_VALUE}))
        .isEqualTo(1 + 0x1p-52);
    for (int i = 0; i < 2000; i++) {
      double x = anyDouble();
      assertSumNearest(x, Math.ulp(x) / 2);
      assertSumNearest(x, -Math.ulp(x) / 2, random.nextInt(3) - 1, Double.MIN_VALUE);
    }
  }

  @Test
  void sumsOverflowExactlyWhereNearestSaysSo() {
    double max = Double.MAX_VALUE;
    double half = 0x1p970;
    assertThat(LongAccumulator.sum(new double[] {max, half})).isEqualTo(Double.POSITIVE_INFINITY);
    assertThat(LongAccumulator.sum(new double[] {-max, -half})).isEqualTo(Double.NEGATIVE_INFINITY);
    assertThat(LongAccumulator.sum(new double[] {max, half, -Double.MIN_VALUE})).isEqualTo(max);
    assertThat(LongAccumulator.sum(new double[] {max, max, max, -max, -max})).isEqualTo(max);
    double[] many = new double[10_000];
    Arrays.fill(many, max);
    many[9_999] = -max;
    assertThat(LongAccumulator.sum(many)).isEqualTo(Double.POSITIVE_INFINITY);
  }

  @Test
  void manyLargestSignificandsDoNotOverflowAChunk() {
    // 2^53 - 1 shifted by 31 moves a chunk the furthest.
    double furthest = Math.scalb(0x1p53 - 1, 31 - 1074 + 32 * 30);
    for (double term : new double[] {furthest, -furthest, Math.nextDown(2.0)}) {
      double[] terms = new double[20_001];
      Arrays.fill(terms, term);
      assertThat(LongAccumulator.sum(terms)).isEqualTo(20_001 * term);
    }
  }

  @Test
  void orderDoesNotMatter() {
    List<Double> terms =
        DoubleStream.generate(this::anyDouble)
            .map(x -> x * 0x1p-20)
            .limit(5_000)
            .boxed()
            .collect(Collectors.toList());
    double sum = LongAccumulator.sum(unboxed(terms));
    Collections.shuffle(terms, random);
    assertThat(LongAccumulator.sum(unboxed(terms))).isEqualTo(sum);
    assertThat(ExactValue.isNearest(sum, ExactValue.sum(unboxed(terms)))).isTrue();
  }

  @Test
  void productsOfAnyExponentsAreNearest() {
    for (int i = 0; i < 3000; i++) {
      int n = 1 + i % 12;
      assertDotNearest(
          DoubleStream.generate(this::anyDouble).limit(n).toArray(),
          DoubleStream.generate(this::anyDouble).limit(n).toArray());
    }
  }

  @Test
  void productsThatOverflowCancel() {
    double big = 0x1.8p1000;
    assertThat(LongAccumulator.dot(new double[] {big, 3, -big}, new double[] {big, 5, big}))
        .isEqualTo(15);
    assertThat(LongAccumulator.dot(new double[] {big, big}, new double[] {big, -1}))
        .isEqualTo(Double.POSITIVE_INFINITY);
  }

  @Test
  void productsThatUnderflowAddUp() {
    double tiny = 0x1p-600;
    double[] x = new double[1024];
    double[] y = new double[1024];
    Arrays.fill(x, tiny);
    Arrays.fill(y, 0x1p-484);
    // 2^10 products of 2^-1084, each of which rounds to 0.
    assertThat(LongAccumulator.dot(x, y)).isEqualTo(Double.MIN_VALUE);
    assertThat(
            LongAccumulator.dot(new double[] {Double.MIN_VALUE}, new double[] {Double.MIN_VALUE}))
        .isZero();
  }

  @Test
  void productsNearTheUnderflowThresholdAreNearest() {
    for (int i = 0; i < 4000; i++) {
      int n = 1 + i % 6;
      int split = random.nextInt(1000);
      double[] x = random.doubles(n, -4, 4).map(v -> Math.scalb(v, -split)).toArray();
      double[] y = random.doubles(n, -4, 4).map(v -> Math.scalb(v, split - 1060)).toArray();
      assertDotNearest(x, y);
    }
    // Half of the least subnormal is a tie that goes to zero, and three halves one that goes to 2.
    assertThat(LongAccumulator.dot(new double[] {0x1p-600}, new double[] {0x1p-475})).isZero();
    assertThat(LongAccumulator.dot(new double[] {0x3p-600}, new double[] {0x1p-475}))
        .isEqualTo(2 * Double.MIN_VALUE);
  }

  @Test
  void cancellingProductsAreNearest() {
    for (int i = 0; i < 500; i++) {
      IllConditioned.Pair pair = IllConditioned.dot(6 + 2 * (i % 20), 20 + i, random);
      assertDotNearest(pair.x(), pair.y());
    }
  }

  @Test
  void manyLargestProductsDoNotOverflowAChunk() {
    double[] x = new double[5_000];
    double[] y = new double[5_000];
    Arrays.fill(x, Math.nextDown(0x1p200));
    Arrays.fill(y, -Math.nextDown(0x1p231));
    assertDotNearest(x, y);
  }

  private void assertSumNearest(double... terms) {
    double sum = LongAccumulator.sum(terms);
    assertThat(ExactValue.isNearest(sum, ExactValue.sum(terms)))
        .as(() -> Double.toHexString(sum) + " of " + hex(terms))
        .isTrue();
  }

  private void assertDotNearest(double[] x, double[] y) {
    double dot = LongAccumulator.dot(x, y);
    BigDecimal exact = ExactValue.dot(x, y);
    assertThat(ExactValue.isNearest(dot, exact))
        .as(() -> Double.toHexString(dot) + " of " + hex(x) + " and " + hex(y))
        .isTrue();
  }

  private static String hex(double[] terms) {
    return DoubleStream.of(terms)
        .mapToObj(Double::toHexString)
        .collect(Collectors.joining(", ", "[", "]"));
  }

  private static double[] unboxed(List<Double> terms) {
    return terms.stream().mapToDouble(Double::doubleValue).toArray();
  }

  private double anyDouble() {
    double x = Double.longBitsToDouble(random.nextLong());
    return Double.isFinite(x) ? x : Double.MAX_VALUE;
  }
}
