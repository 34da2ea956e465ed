package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import steelyard.problems.exact.Binary64;
import steelyard.problems.exact.Dyadic;
import steelyard.problems.exact.ExactAccumulator;

/** The formats of IEEE 754 as exact numbers, and the rounding of an exact sum to binary64. */
final class FormatFigures implements Figure.Source {

  /** The parameters of a format. */
  private record Format(int precision, int largestExponent) {
    static Format of(String name) {
      return switch (name) {
        case "binary16" -> new Format(11, 15);
        case "binary32" -> new Format(24, 127);
        case "binary64" -> new Format(Binary64.PRECISION, Binary64.OVERFLOW_EXPONENT - 1);
        case "binary128" -> new Format(113, 16383);
        default -> throw new IllegalArgumentException(name);
      };
    }

    Dyadic number(String which) {
      return switch (which) {
        case "u" -> Dyadic.powerOfTwo(-precision);
        case "maxfinite" ->
            Dyadic.powerOfTwo(largestExponent + 1)
                .subtract(Dyadic.powerOfTwo(largestExponent + 1 - precision));
        case "minnormal" -> Dyadic.powerOfTwo(1 - largestExponent);
        case "minsubnormal" -> Dyadic.powerOfTwo(2 - largestExponent - precision);
        default -> throw new IllegalArgumentException(which);
      };
    }
  }

  @Override
  public Optional<Figure> figure(String id) {
    if (id.equals("ieee.doubleround.1")) {
      double sum = ExactAccumulator.sum(1, 0x1p-53 + 0x1p-64 + 0x1p-105).doubleValue();
      return Optional.of(Figure.of(Dyadic.of(sum)));
    }
    if (!id.startsWith("ieee.")) {
      return Optional.empty();
    }
    String[] parts = id.split("\\.", -1);
    Dyadic number = Format.of(parts[1]).number(parts[2]);
    if (parts[1].equals("binary64")) {
      requireDouble(parts[2], number);
    }
    return Optional.of(Figure.of(number));
  }

  private static void requireDouble(String which, Dyadic number) {
    double expected =
        switch (which) {
          case "u" -> Binary64.UNIT_ROUNDOFF;
          case "maxfinite" -> Double.MAX_VALUE;
          case "minnormal" -> Double.MIN_NORMAL;
          case "minsubnormal" -> Math.scalb(1.0, Binary64.LEAST_EXPONENT);
          default -> throw new IllegalArgumentException(which);
        };
    assertThat(number.doubleValue()).isEqualTo(expected);
    assertThat(number).isEqualTo(Dyadic.of(expected));
  }
}
