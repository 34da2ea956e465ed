package steelyard.problems.published;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;
import steelyard.problems.sum.SumProblem;
import steelyard.problems.sum.Terms;

/**
 * Constants as sums: every rational term of a classical series is split into doubles that add up to
 * it far beyond the printed digits, and the exact sum of all of them is the constant.
 */
final class SeriesFigures implements Figure.Source {
  // What is left of a term below this does not reach the printed digits of any row.
  private static final Dyadic NEGLIGIBLE = Dyadic.powerOfTwo(-320);
  private static final int MOST_TERMS = 400;

  /** A rational term. */
  private record Term(BigInteger top, BigInteger bottom) {
    static Term over(BigInteger bottom) {
      return new Term(BigInteger.ONE, bottom);
    }

    Term times(int factor) {
      return new Term(top.multiply(BigInteger.valueOf(factor)), bottom);
    }
  }

  // The series are those of Abramowitz and Stegun (4.1.24, 4.2.1, 7.1.5, 9.1.10), Machin's for pi,
  // and Apéry's accelerated ones for zeta(2) and zeta(3); all from memory.
  @Override
  public Optional<Figure> figure(String id) {
    BigDecimal value =
        switch (id) {
          case "const.e" -> sum(k -> Term.over(factorial(k)));
          case "const.ln2" -> sum(k -> Term.over(power(2, k + 1).multiply(integer(k + 1))));
          case "const.pi" -> pi();
          case "const.gamma1half" -> pi().sqrt(Figure.DIGITS);
          case "const.erf1" ->
              sum(k -> Term.over(factorial(k).multiply(integer(2 * k + 1))).times(sign(k) * 2))
                  .divide(pi().sqrt(Figure.DIGITS), Figure.DIGITS);
          case "const.zeta3" ->
              sum(k -> Term.over(apery(k + 1, 3).shiftLeft(1)).times(sign(k) * 5));
          case "sum.zeta2" -> sum(k -> Term.over(apery(k + 1, 2)).times(3));
          case "const.j0_1", "const.besselJ0.1" -> bessel(0);
          case "const.besselJ1.1" -> bessel(1);
          case "const.besselJ10.1" -> bessel(10);
          case "const.besselJ20.1" -> bessel(20);
          case "sum.harmonic.1e6.real" -> harmonic(1_000_000);
          default -> null;
        };
    return Optional.ofNullable(value).map(Figure::of);
  }

  private static BigDecimal pi() {
    return arctangents(16, 5).add(arctangents(-4, 239));
  }

  private static BigDecimal arctangents(int factor, int reciprocal) {
    return sum(
        k ->
            Term.over(power(reciprocal, 2 * k + 1).multiply(integer(2 * k + 1)))
                .times(sign(k) * factor));
  }

  private static BigDecimal bessel(int order) {
    return sum(
        k ->
            Term.over(factorial(k).multiply(factorial(k + order)).multiply(power(2, 2 * k + order)))
                .times(sign(k)));
  }

  private static BigDecimal sum(IntFunction<Term> series) {
    List<Double> parts = new ArrayList<>();
    for (int k = 0; k < MOST_TERMS; k++) {
      Term term = series.apply(k);
      Dyadic rest = new Dyadic(term.top, 0);
      Dyadic bottom = new Dyadic(term.bottom, 0);
      while (rest.abs().compareTo(bottom.multiply(NEGLIGIBLE)) > 0) {
        double part = Dyadic.quotient(rest, bottom);
        parts.add(part);
        rest = rest.subtract(bottom.multiply(Dyadic.of(part)));
      }
    }
    double[] terms = parts.stream().mapToDouble(part -> part).toArray();
    return new SumProblem(new Terms(terms)).reference().answer(Figure.DIGITS).get(0);
  }

  // 1/k in three doubles: the remainder of a division is a double, and an FMA gives it.
  private static BigDecimal harmonic(int n) {
    double[] terms =
        IntStream.rangeClosed(1, n)
            .boxed()
            .flatMapToDouble(
                k -> {
                  double first = 1.0 / k;
                  double rest = Math.fma(-first, k, 1);
                  double second = rest / k;
                  return DoubleStream.of(first, second, Math.fma(-second, k, rest) / k);
                })
            .toArray();
    return ExactAccumulator.sum(terms).toBigDecimal(Figure.DIGITS);
  }

  private static BigInteger apery(int k, int exponent) {
    BigInteger middle = factorial(2 * k).divide(factorial(k).pow(2));
    return middle.multiply(power(k, exponent));
  }

  private static BigInteger factorial(int n) {
    return IntStream.rangeClosed(1, n)
        .mapToObj(BigInteger::valueOf)
        .reduce(BigInteger.ONE, BigInteger::multiply);
  }

  private static BigInteger power(int base, int exponent) {
    return integer(base).pow(exponent);
  }

  private static BigInteger integer(int value) {
    return BigInteger.valueOf(value);
  }

  private static int sign(int k) {
    return k % 2 == 0 ? 1 : -1;
  }
}
