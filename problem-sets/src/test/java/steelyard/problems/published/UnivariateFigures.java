package steelyard.problems.published;

import java.util.Optional;

/** The univariate reference data sets, in decimal and as stored. */
final class UnivariateFigures implements Figure.Source {

  @Override
  public Optional<Figure> figure(String id) {
    String[] parts = id.split("\\.", -1);
    if (!parts[0].equals("strd")) {
      return Optional.empty();
    }
    Univariate set = Univariate.named(parts[1]);
    boolean decimal = !parts[parts.length - 1].equals("bin64");
    Moments moments = decimal ? set.ofDecimal() : set.ofStored();
    return Optional.of(
        switch (parts[2]) {
          case "mean" -> Figure.of(moments.mean());
          case "sd" -> Figure.of(moments.deviation());
          case "variance" -> Figure.of(moments.variance());
          case "lag1autocorr" -> Figure.of(moments.autocorrelation());
          case "kappaCL" -> Figure.of(moments.condition());
          default -> throw new IllegalArgumentException(id);
        });
  }
}
