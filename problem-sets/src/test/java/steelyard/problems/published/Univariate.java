package steelyard.problems.published;

import java.math.BigDecimal;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.math3.fraction.BigFraction;

/**
 * A univariate data set of NIST's Statistical Reference Datasets, as Commons Math carries it in its
 * tests.
 *
 * @param mean the certified mean, with 15 digits, as all that is certified
 * @param deviation the certified standard deviation, with n - 1
 * @param autocorrelation the certified autocorrelation at lag 1
 * @param data the data in decimal
 */
record Univariate(
    BigDecimal mean, BigDecimal deviation, BigDecimal autocorrelation, List<BigDecimal> data) {

  static final List<String> NAMES =
      List.of(
          "NumAcc1",
          "NumAcc2",
          "NumAcc3",
          "NumAcc4",
          "Lottery",
          "Lew",
          "Mavro",
          "Michelso",
          "PiDigits");

  private static final int CERTIFIED_DIGITS = 15;
  private static final String FOLDER = "/org/apache/commons/math3/stat/data/";
  private static final String NUMBER = "\\s*[:=]\\s*(-?[0-9.]+)\\s*";

  static Univariate named(String name) {
    List<String> lines = PublishedTable.lines(FOLDER + name + ".txt");
    return new Univariate(
        certified(lines, "mean|Sample Mean +ybar"),
        certified(lines, "standardDeviation|Sample Standard Deviation \\(denom\\. = n-1\\) +s"),
        certified(
            lines,
            "autocorrelationCoefficient|Sample Autocorrelation Coefficient \\(lag 1\\) r\\(1\\)"),
        lines.stream()
            .map(String::strip)
            .filter(line -> line.matches("-?[0-9.]+"))
            .map(BigDecimal::new)
            .toList());
  }

  private static BigDecimal certified(List<String> lines, String label) {
    Pattern pattern = Pattern.compile("(?:" + label + ")" + NUMBER);
    return lines.stream()
        .map(pattern::matcher)
        .filter(Matcher::matches)
        .map(match -> toCertifiedDigits(new BigDecimal(match.group(1))))
        .findFirst()
        .orElseThrow(() -> new IllegalStateException("no certified " + label));
  }

  // Where fewer are printed, the value is exact.
  private static BigDecimal toCertifiedDigits(BigDecimal value) {
    int missing = Math.max(0, CERTIFIED_DIGITS - value.precision());
    return value.setScale(value.scale() + missing);
  }

  /** Returns the data as doubles. */
  double[] stored() {
    return data.stream().mapToDouble(BigDecimal::doubleValue).toArray();
  }

  /** Returns the moments of the stored data. */
  Moments ofStored() {
    return Moments.of(stored(), BigFraction.ONE);
  }

  /** Returns the moments of the decimal data: integers, after multiplication by a power of ten. */
  Moments ofDecimal() {
    int decimals = data.stream().mapToInt(BigDecimal::scale).max().orElse(0);
    double[] integers =
        data.stream()
            .map(value -> value.movePointRight(decimals).toBigIntegerExact())
            .mapToDouble(integer -> integer.longValueExact())
            .toArray();
    return Moments.of(integers, new BigFraction(10).pow(-decimals));
  }

  /** Returns the most that storing changed any datum. */
  BigDecimal storageError() {
    double[] stored = stored();
    BigDecimal most = BigDecimal.ZERO;
    for (int i = 0; i < stored.length; i++) {
      most = most.max(new BigDecimal(stored[i]).subtract(data.get(i)).abs());
    }
    return most;
  }
}
