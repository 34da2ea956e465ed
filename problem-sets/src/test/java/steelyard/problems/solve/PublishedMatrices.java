package steelyard.problems.solve;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import java.util.stream.LongStream;

/** Matrices of the literature, under the names that the table of published values gives them. */
public final class PublishedMatrices {
  private static final Pattern SIZED = Pattern.compile("([a-z]+)(\\d+)");

  /**
   * A matrix times an integer that makes every entry one that is stored exactly; condition numbers
   * do not change by it.
   *
   * @param entries the stored entries
   * @param factor what the matrix was multiplied by
   */
  public record Multiple(double[][] entries, BigInteger factor) {}

  /** An integer entry, for indices from 1. */
  @FunctionalInterface
  private interface Entry {
    BigInteger at(int i, int j);
  }

  private PublishedMatrices() {}

  /**
   * Returns a matrix.
   *
   * @param name its name, with its size where it has one: {@code wilson}, {@code hilbert12}
   */
  public static Multiple named(String name) {
    return switch (name) {
      case "wilson" ->
          integers(new double[][] {{5, 7, 6, 5}, {7, 10, 8, 7}, {6, 8, 10, 9}, {5, 7, 9, 10}});
      case "rutishauserA0" ->
          integers(new double[][] {{10, 1, 4, 0}, {1, 10, 5, -1}, {4, 5, 10, 7}, {0, -1, 7, 9}});
      case "molerA1" ->
          integers(new double[][] {{1, 3, 10, 10}, {3, 4, 8, 9}, {10, 8, 3, 9}, {10, 9, 9, 3}});
      case "optA2" ->
          integers(new double[][] {{2, 7, 10, 10}, {7, 10, 10, 9}, {10, 10, 10, 1}, {10, 9, 1, 9}});
      case "optA3" ->
          integers(new double[][] {{9, 1, 1, 5}, {1, 10, 1, 9}, {1, 1, 10, 1}, {5, 9, 1, 10}});
      case "rump2x2" -> integers(new double[][] {{64919121, -159018721}, {41869520.5, -102558961}});
      case "kahan1966" ->
          new Multiple(new double[][] {{12969, 8648}, {2161, 1441}}, BigInteger.valueOf(10_000));
      default -> sized(name);
    };
  }

  private static Multiple sized(String name) {
    Matcher match = SIZED.matcher(name);
    if (!match.matches()) {
      throw new IllegalArgumentException("no matrix is named " + name);
    }
    int n = Integer.parseInt(match.group(2));
    BigInteger common = lcm(2 * n - 1);
    BigInteger powers = lcm(n).pow(n - 1);
    return switch (match.group(1)) {
      case "hilbert" -> multiple(n, common, (i, j) -> common.divide(integer(i + j - 1)));
      case "lotkin" ->
          multiple(n, common, (i, j) -> i == 1 ? common : common.divide(integer(i + j - 1)));
      case "frank" -> integers(n, (i, j) -> integer(j >= i - 1 ? n + 1 - Math.max(i, j) : 0));
      case "pascal" -> integers(n, (i, j) -> choose(i + j - 2, j - 1));
      case "lehmer" ->
          multiple(
              n,
              lcm(n),
              (i, j) -> lcm(n).multiply(integer(Math.min(i, j))).divide(integer(Math.max(i, j))));
      case "tridiag" -> integers(n, (i, j) -> integer(i == j ? 2 : Math.abs(i - j) == 1 ? -1 : 0));
      case "vand" -> integers(n, (i, j) -> integer(j).pow(2 * (i - 1)));
      case "vandrecip" -> multiple(n, powers, (i, j) -> powers.divide(integer(j).pow(i - 1)));
      default -> throw new IllegalArgumentException("no matrix is named " + name);
    };
  }

  /** Returns the number of ways to choose k of n. */
  static BigInteger choose(int n, int k) {
    return k < 0 || k > n
        ? BigInteger.ZERO
        : IntStream.rangeClosed(1, k)
            .boxed()
            .reduce(
                BigInteger.ONE,
                (product, i) -> product.multiply(integer(n - k + i)).divide(integer(i)),
                BigInteger::multiply);
  }

  private static BigInteger lcm(int n) {
    return LongStream.rangeClosed(1, n)
        .mapToObj(BigInteger::valueOf)
        .reduce(BigInteger.ONE, (p, q) -> p.multiply(q).divide(p.gcd(q)));
  }

  private static Multiple integers(double[][] entries) {
    return new Multiple(entries, BigInteger.ONE);
  }

  private static Multiple integers(int n, Entry entry) {
    return multiple(n, BigInteger.ONE, entry);
  }

  private static Multiple multiple(int n, BigInteger factor, Entry entry) {
    double[][] a = new double[n][n];
    for (int i = 1; i <= n; i++) {
      for (int j = 1; j <= n; j++) {
        a[i - 1][j - 1] = exact(entry.at(i, j));
      }
    }
    return new Multiple(a, factor);
  }

  private static BigInteger integer(int value) {
    return BigInteger.valueOf(value);
  }

  private static double exact(BigInteger value) {
    double rounded = value.doubleValue();
    if (!new BigDecimal(rounded).toBigIntegerExact().equals(value)) {
      throw new ArithmeticException(value + " is no double");
    }
    return rounded;
  }
}
