package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.SplittableRandom;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;

/**
 * Holds a scalar problem's answer, condition number and errors against two independent paths that
 * must agree with each other: exact decimal fractions, multiplied out so that nothing is rounded,
 * and apfloat, whose sums and products are exact at infinite precision and whose quotients have 60
 * digits.
 */
public final class IndependentErrors {
  private static final int DIGITS = 60;

  private IndependentErrors() {}

  /**
   * Checks a problem whose exact answer is a dot product.
   *
   * @param x one vector
   * @param y the other; ones for a sum
   * @param factor what the sum of the absolute products is multiplied by to give what the backward
   *     error is relative to
   */
  public static void check(Problem<?> problem, double[] x, double[] y, int factor) {
    BigDecimal exact = BigDecimal.ZERO;
    BigDecimal scale = BigDecimal.ZERO;
    Apfloat sum = Apfloat.ZERO;
    Apfloat absolute = Apfloat.ZERO;
    for (int i = 0; i < x.length; i++) {
      BigDecimal product = new BigDecimal(x[i]).multiply(new BigDecimal(y[i]));
      exact = exact.add(product);
      scale = scale.add(product.abs().multiply(BigDecimal.valueOf(factor)));
      Apfloat term = apfloat(x[i]).multiply(apfloat(y[i]));
      sum = sum.add(term);
      absolute = absolute.add(ApfloatMath.abs(term).multiply(new Apfloat(factor)));
    }
    requireSame(sum, exact);
    requireSame(absolute, scale);
    check(problem, exact, scale);
  }

  private static Apfloat apfloat(double value) {
    return new Apfloat(new BigDecimal(value), Apfloat.INFINITE);
  }

  private static void requireSame(Apfloat sum, BigDecimal exact) {
    assertThat(sum.precision()).isEqualTo(Apfloat.INFINITE);
    assertThat(new BigDecimal(sum.toString())).isEqualByComparingTo(exact);
  }

  private static void check(Problem<?> problem, BigDecimal exact, BigDecimal scale) {
    assertThat(problem.reference().answer(MathContext.UNLIMITED).get(0))
        .isEqualByComparingTo(exact);
    if (exact.signum() == 0) {
      assertThat(problem.condition().kappa()).isInfinite();
    } else {
      assertRatio(problem.condition().kappa(), scale, exact.abs());
    }
    double nearest = Double.parseDouble(exact.toString());
    SplittableRandom random = new SplittableRandom(exact.hashCode());
    double[] answers = {
      nearest,
      Math.nextUp(nearest),
      Math.nextDown(nearest),
      -nearest,
      0,
      nearest * (1 + random.nextDouble()),
      Math.scalb(random.nextDouble(), random.nextInt(2000) - 1050),
      nearest + Math.ulp(scale.doubleValue()),
    };
    for (double answer : answers) {
      if (Double.isFinite(answer)) {
        checkAnswer(problem.judge(new double[] {answer}), answer, exact, scale);
      }
    }
  }

  private static void checkAnswer(
      Judgement judgement, double answer, BigDecimal exact, BigDecimal scale) {
    BigDecimal error = new BigDecimal(answer).subtract(exact).abs();
    assertThat(judgement.standing()).isEqualTo(Judgement.Standing.OK);
    assertRatio(judgement.backwardError(), error, scale);
    assertRatio(judgement.forwardError(), error, exact.abs());
    BigDecimal up = new BigDecimal(Math.ulp(answer));
    boolean isNearest = answer == Double.parseDouble(exact.toString());
    // Beyond the largest double there is no telling by distance.
    boolean isFar = error.compareTo(up) > 0 && Math.abs(answer) < Double.MAX_VALUE;
    if (isNearest || isFar) {
      assertThat(judgement.rounding())
          .isEqualTo(isNearest ? Judgement.Rounding.NEAREST : Judgement.Rounding.OTHER);
    }
  }

  // The ratio is the double nearest to numerator / denominator, or the least double instead of 0.
  private static void assertRatio(double ratio, BigDecimal numerator, BigDecimal denominator) {
    if (denominator.signum() == 0) {
      assertThat(ratio).isEqualTo(numerator.signum() == 0 ? 0 : Double.POSITIVE_INFINITY);
    } else if (Double.isInfinite(ratio)) {
      assertThat(numerator).isGreaterThan(denominator.multiply(new BigDecimal(Double.MAX_VALUE)));
    } else if (ratio == Double.MIN_VALUE) {
      assertThat(numerator).isLessThan(denominator.multiply(new BigDecimal(2 * ratio)));
      assertThat(numerator.signum()).isPositive();
    } else {
      BigDecimal halfUlp = new BigDecimal(Math.ulp(ratio)).divide(BigDecimal.valueOf(2));
      BigDecimal off = new BigDecimal(ratio).multiply(denominator).subtract(numerator).abs();
      assertThat(off).isLessThanOrEqualTo(halfUlp.multiply(denominator));
      assertWithApfloat(ratio, numerator, denominator);
    }
  }

  private static void assertWithApfloat(
      double ratio, BigDecimal numerator, BigDecimal denominator) {
    Apfloat quotient = new Apfloat(numerator, DIGITS).divide(new Apfloat(denominator, DIGITS));
    Apfloat off = ApfloatMath.abs(new Apfloat(new BigDecimal(ratio), DIGITS).subtract(quotient));
    // Half an ulp, and what is left of 60 digits.
    Apfloat allowed =
        new Apfloat(new BigDecimal(Math.ulp(ratio)), DIGITS)
            .multiply(new Apfloat("0.5000001", DIGITS));
    assertThat(off.compareTo(allowed)).as("%s", ratio).isLessThanOrEqualTo(0);
  }
}
