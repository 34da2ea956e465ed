package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import steelyard.problems.dot.DotFamilies;
import steelyard.problems.solve.SystemFamilies;
import steelyard.problems.sum.SumFamilies;

/** Holds the tables of the module's README to the catalogues of the families. */
class ReadmeTest {

  private static Map<String, List<? extends Family<?>>> catalogues() {
    Map<String, List<? extends Family<?>>> catalogues = new LinkedHashMap<>();
    catalogues.put("sum", SumFamilies.all());
    catalogues.put("dot", DotFamilies.all());
    catalogues.put("solve", SystemFamilies.all());
    return catalogues;
  }

  @Test
  void tablesAreTheCatalogues() throws IOException {
    List<String> expected = new ArrayList<>();
    catalogues()
        .forEach(
            (task, families) -> {
              expected.add("## " + task);
              families.forEach(family -> expected.add(row(family)));
            });
    List<String> written =
        Files.readAllLines(Path.of("README.md")).stream()
            .filter(line -> line.startsWith("## ") || line.startsWith("| `"))
            .toList();
    assertThat(String.join("\n", written)).isEqualTo(String.join("\n", expected));
  }

  private static String row(Family<?> family) {
    Family.Profile profile = family.profile();
    return "| `%s` | %s | %s | %s |"
        .formatted(profile.id(), profile.purpose(), reach(family), profile.source());
  }

  private static String reach(Family<?> family) {
    Reach reach = family.reach();
    String sizes = "n from " + reach.minSize() + " to " + reach.maxSize();
    return reach.controlled()
        ? family.profile().knob()
            + "; κ up to "
            + ConditionText.of(reach.maxCondition())
            + "; "
            + sizes
        : sizes;
  }
}
