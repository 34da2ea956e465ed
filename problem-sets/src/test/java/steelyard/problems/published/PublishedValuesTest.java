package steelyard.problems.published;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every published value is the one that this module computes, to all digits that are printed. */
class PublishedValuesTest {
  private static final List<Figure.Source> SOURCES =
      List.of(
          new ScalarFigures(),
          new SeriesFigures(),
          new FormatFigures(),
          new UnivariateFigures(),
          new MatrixFigures(),
          new SpectrumFigures(),
          new SystemFigures());

  static List<PublishedTable.Row> rows() {
    return PublishedTable.rows();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rows")
  void isTheComputedValue(PublishedTable.Row row) {
    Figure figure = figures(row.id()).get(0);
    BigDecimal distance = figure.value().subtract(row.value()).abs();
    BigDecimal allowed = row.value().abs().multiply(row.rounding().add(figure.accuracy()));
    assertThat(distance)
        .as("%s; computed %s; %s", row.input(), figure.value(), row.source())
        .isLessThanOrEqualTo(allowed);
    // A computation that is too vague to tell anything proves nothing.
    assertThat(figure.accuracy()).isLessThan(new BigDecimal("0.05"));
  }

  @Test
  void everyRowIsComputedByExactlyOneSource() {
    assertThat(rows()).allSatisfy(row -> assertThat(figures(row.id())).as(row.id()).hasSize(1));
  }

  @Test
  void noRowIsMissing() {
    Map<String, Integer> counts =
        rows().stream()
            .collect(
                Collectors.toMap(
                    row -> row.id().split("\\.", 2)[0], row -> 1, Integer::sum, TreeMap::new));
    assertThat(counts)
        .isEqualTo(Map.of("const", 11, "dot", 3, "ieee", 17, "lin", 139, "strd", 76, "sum", 22));
    assertThat(rows().stream().map(PublishedTable.Row::id)).doesNotHaveDuplicates();
  }

  @Test
  void everyRowNamesItsSource() {
    assertThat(rows())
        .allSatisfy(
            row -> {
              assertThat(row.source()).isNotBlank();
              assertThat(row.provenance()).matches("seen(\\(\\w+\\))?|memory|computed");
            });
  }

  private static List<Figure> figures(String id) {
    return SOURCES.stream().flatMap(source -> source.figure(id).stream()).toList();
  }
}
