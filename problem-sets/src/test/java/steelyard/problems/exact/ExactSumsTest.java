package steelyard.problems.exact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

/**
 * Short and long input, which are added up by different means, against an accumulator that takes
 * term by term; that one is checked against BigDecimal.
 */
class ExactSumsTest {
  private static final int[] SIZES = {0, 1, 2, 7, 1000, 8191, 8192, 40_000};

  @Test
  void sumsAreThoseOfTheTermsOneByOne() {
    for (int size : SIZES) {
      requireSum(new RandomDoubles(size).array(size));
    }
  }

  @Test
  void productsAreThoseOfTheFactorsOneByOne() {
    for (int size : SIZES) {
      requireProducts(
          new RandomDoubles(size).array(size), new RandomDoubles(size + 1L).array(size));
    }
  }

  // More terms than a chunk takes, all of them in few chunks and with every bit set.
  @Test
  void chunksAreEmptiedInTime() {
    for (double magnitude : new double[] {Double.MAX_VALUE, 1.9999999, 0x1p-1022, 0x1p-1023}) {
      double term = Math.nextDown(magnitude);
      double[] terms = new double[40_000];
      Arrays.fill(terms, term);
      for (int i = 0; i < terms.length; i += 3) {
        terms[i] = -terms[i];
      }
      requireSum(terms);
      double[] partners = new double[terms.length];
      Arrays.fill(partners, Math.nextDown(2.0));
      requireProducts(terms, partners);
      requireProducts(partners, terms);
      requireProducts(Arrays.copyOf(terms, 8191), Arrays.copyOf(partners, 8191));
    }
  }

  // At every place within a chunk, and with either factor subnormal, zero or huge.
  @Test
  void productsOfEveryExponentAreExact() {
    double[] x = new double[2 * 2100];
    double[] y = new double[x.length];
    for (int i = 0; i < x.length; i++) {
      x[i] = Math.scalb(i % 3 == 0 ? -0x1.fffffffffffffp0 : 0x1.000000000001p0, i / 2 - 1075);
      y[i] = Math.scalb(0x1.fffffffffffffp0, (i * 7919) % 2098 - 1075);
      x[i] = Double.isFinite(x[i]) ? x[i] : 0;
    }
    requireProducts(x, y);
    requireProducts(repeated(x), repeated(y));
  }

  @Test
  void whatIsNotFiniteIsRefusedWhereverItStands() {
    for (double wrong : new double[] {Double.NaN, Double.NEGATIVE_INFINITY, 1.0 / 0}) {
      for (int size : new int[] {10, 10_000, 50_000}) {
        double[] terms = new double[size];
        terms[size - 2] = wrong;
        double[] zeros = new double[size];
        requireRefused(() -> ExactSums.of(terms));
        requireRefused(() -> ExactSums.ofProducts(terms, zeros));
        requireRefused(() -> ExactSums.ofProducts(zeros, terms));
      }
    }
  }

  private static void requireRefused(Runnable sum) {
    assertThatThrownBy(sum::run)
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessage("a finite double is wanted, but it is infinite or NaN");
  }

  private static double[] repeated(double[] x) {
    double[] twice = Arrays.copyOf(x, 1 << 16);
    System.arraycopy(x, 0, twice, twice.length - x.length, x.length);
    return twice;
  }

  private static void requireSum(double[] terms) {
    ExactAccumulator sum = new ExactAccumulator();
    ExactAccumulator absolute = new ExactAccumulator();
    for (double term : terms) {
      sum.add(term);
      absolute.addAbs(term);
    }
    require(ExactSums.of(terms), sum, absolute);
  }

  private static void requireProducts(double[] x, double[] y) {
    ExactAccumulator sum = new ExactAccumulator();
    ExactAccumulator absolute = new ExactAccumulator();
    for (int i = 0; i < x.length; i++) {
      sum.addProduct(x[i], y[i]);
      absolute.addAbsProduct(x[i], y[i]);
    }
    require(ExactSums.ofProducts(x, y), sum, absolute);
  }

  private static void require(ExactSums sums, ExactAccumulator sum, ExactAccumulator absolute) {
    assertThat(sums.sum()).isEqualTo(sum.value());
    assertThat(sums.absoluteSum()).isEqualTo(absolute.value());
  }
}
