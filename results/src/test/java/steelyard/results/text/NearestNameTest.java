package steelyard.results.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestNameTest {

  @ParameterizedTest
  @CsvSource({
    "kahan, kahan, 0",
    "kahn, kahan, 1",
    "kahaan, kahan, 1",
    "kahen, kahan, 1",
    "khaan, kahan, 1",
    "kitten, sitting, 3",
    "ca, abc, 3",
    "'', abc, 3"
  })
  void countsEditsFromEitherSide(String left, String right, int edits) {
    assertThat(NearestName.distance(left, right)).isEqualTo(edits);
    assertThat(NearestName.distance(right, left)).isEqualTo(edits);
  }

  @Test
  void suggestsOnlyWhatIsNear() {
    List<String> known = List.of("sum", "dot", "solve");

    assertThat(NearestName.of("smu", known)).contains("sum");
    assertThat(NearestName.of("slove", known)).contains("solve");
    assertThat(NearestName.of("fit", known)).isEmpty();
    assertThat(NearestName.hint("fit", known)).isEqualTo("known are: sum, dot, solve");
  }

  @Test
  void prefersTheEarlierOfEquallyNearNames() {
    assertThat(NearestName.of("cat", List.of("bat", "rat"))).contains("bat");
  }
}
