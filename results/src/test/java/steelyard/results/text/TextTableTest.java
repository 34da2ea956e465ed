package steelyard.results.text;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.results.text.TextTable.Heading;

class TextTableTest {
  private final TextTable table =
      new TextTable(List.of(Heading.text("name"), Heading.number("ns"), Heading.text("why")));

  @Test
  void textStandsLeftAndNumbersRight() {
    table.add(List.of("a", "1.5", "x"));
    table.add(List.of("bcdefg", "100", ""));
    assertThat(table.render(80)).isEqualTo("name     ns  why\na       1.5  x\nbcdefg  100\n");
  }

  @Test
  void aCellThatIsTooWideTakesSeveralLines() {
    table.add(List.of("a", "1", "some words that do not fit in a line"));
    String text = table.render(30);
    assertThat(text.lines()).allMatch(line -> line.length() <= 30).hasSizeGreaterThan(2);
    assertThat(text.replaceAll("\\s+", " ")).endsWith("some words that do not fit in a line ");
  }

  @Test
  void wideAndCombiningCharactersAlign() {
    table.add(List.of("\u7A40\u7269", "1", "x"));
    table.add(List.of("e\u0301abc", "1", "x"));
    table.add(List.of("abcd", "1", "x"));
    assertThat(table.render(80))
        .isEqualTo("name  ns  why\n\u7A40\u7269   1  x\ne\u0301abc   1  x\nabcd   1  x\n");
  }

  @Test
  void controlCharactersAreVisible() {
    table.add(List.of("a\u001B[2J\n", "1", ""));
    assertThat(table.render(80)).contains("a\\u001b[2J\\n").hasLineCount(2);
  }

  @Test
  void aRowHasOneCellPerColumn() {
    assertThatThrownBy(() -> table.add(List.of("a"))).hasMessage("A row needs 3 cells, not 1.");
  }

  @Test
  void aLongTitleTakesTwoLinesAndNotThree() {
    TextTable titled =
        new TextTable(List.of(Heading.text("name"), Heading.number("fails from condition")));
    titled.add(List.of("a", "1"));
    assertThat(titled.render(80))
        .isEqualTo("name  fails from\n       condition\na              1\n");
  }

  @Test
  void wordsAreBrokenOnlyWhereTheyAreTooLong() {
    assertThat(Wrap.lines("ab cd efghijk", 5)).containsExactly("ab cd", "efghi", "jk");
    assertThat(Wrap.lines("", 5)).containsExactly("");
    assertThat(Wrap.lines("\uD83D\uDE00\uD83D\uDE00\uD83D\uDE00", 4))
        .containsExactly("\uD83D\uDE00\uD83D\uDE00", "\uD83D\uDE00");
  }
}
