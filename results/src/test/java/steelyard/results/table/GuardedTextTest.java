package steelyard.results.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class GuardedTextTest {
  @ParameterizedTest
  @ValueSource(
      strings = {"=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1", "\n=1", "'=1", "\uFF1D1", "''"})
  void aFormulaIsMadeHarmlessAndComesBack(String text) {
    String guarded = GuardedText.guard(text);
    assertThat(guarded).doesNotMatch("(?s)[=+\\-@\\t\\r\\n\uFF1D].*");
    assertThat(GuardedText.unguard(guarded)).isEqualTo(text);
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "plain", "a=b", "it's", "\u05E9\u05DC\u05D5\u05DD", "\uD83D\uDE00"})
  void anythingElseStaysAsItIs(String text) {
    assertThat(GuardedText.guard(text)).isEqualTo(text);
  }

  @Test
  void whatATerminalWouldActUponIsVisible() {
    assertThat(GuardedText.guard("a\u001B[31m\n\u202E\\\uD800"))
        .isEqualTo("a\\u001b[31m\\n\\u202e\\\\\\ud800");
  }

  @Test
  void everyTextComesBack() {
    SplittableRandom random = new SplittableRandom(7);
    String alphabet = "=+-@'\\\"nrtu0041, \t\r\n\u0000\u0007\u001B\u0085\u202E\u05D0\uD83D\uDE00x";
    for (int i = 0; i < 5000; i++) {
      StringBuilder text = new StringBuilder();
      for (int j = random.nextInt(8); j > 0; j--) {
        text.append(alphabet.charAt(random.nextInt(alphabet.length())));
      }
      assertThat(GuardedText.unguard(GuardedText.guard(text.toString())))
          .isEqualTo(text.toString());
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"\\", "a\\b", "\\u12", "\\u00G0"})
  void aLoneBackslashIsRefused(String text) {
    assertThatThrownBy(() -> GuardedText.unguard(text))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
