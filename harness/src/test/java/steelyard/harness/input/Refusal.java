package steelyard.harness.input;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.assertj.core.api.ThrowableAssert.ThrowingCallable;

/** Asserts that something is refused in one sentence. */
final class Refusal {

  private Refusal() {}

  static void assertRefused(ThrowingCallable reading, String sentence) {
    assertThatThrownBy(reading)
        .isInstanceOf(InputException.class)
        .hasMessageContaining(sentence)
        .message()
        .hasLineCount(1);
  }
}
