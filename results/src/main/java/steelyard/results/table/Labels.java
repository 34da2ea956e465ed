package steelyard.results.table;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/**
 * The texts that stand for some values in a table.
 *
 * @param <E> the value
 */
final class Labels<E> {
  private final Map<String, E> byText = new LinkedHashMap<>();

  Labels(E[] values, Function<E, String> text) {
    for (E value : values) {
      byText.put(text.apply(value), value);
    }
  }

  /** Returns the texts in the order of the values. */
  List<String> texts() {
    return List.copyOf(byText.keySet());
  }

  /**
   * Returns the value for which a text stands.
   *
   * @throws IllegalArgumentException if there is none
   */
  E value(String text) {
    E value = byText.get(text);
    if (value == null) {
      throw new IllegalArgumentException("No value has the text " + text + ".");
    }
    return value;
  }
}
