package steelyard.harness.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import steelyard.results.text.NearestName;

/**
 * One table of a plan's TOML, read by key. What has the wrong type or lies out of range is refused
 * in one sentence with its place in the file.
 */
final class PlanTable {

  private static final int MAX_QUOTED = 40;

  private final PlanSource source;
  private final JsonNode node;

  /** Its header and number, and the keys on the way from there, each followed by a dot. */
  private final String header;

  private final int index;
  private final String prefix;

  PlanTable(PlanSource source, JsonNode node, String header, int index) {
    this(source, node, header, index, "");
  }

  private PlanTable(PlanSource source, JsonNode node, String header, int index, String prefix) {
    this.source = source;
    this.node = node;
    this.header = header;
    this.index = index;
    this.prefix = prefix;
  }

  boolean has(String key) {
    return node.has(key);
  }

  boolean hasTable(String key) {
    return node.path(key).isObject();
  }

  PlanTable table(String key) {
    return new PlanTable(source, node.get(key), header, index, prefix + key + ".");
  }

  /** Returns the tables of an array at the top of a plan. */
  List<PlanTable> entries(String key) {
    JsonNode array = node.path(key);
    List<PlanTable> entries = new ArrayList<>();
    if (!array.isMissingNode() && !array.isArray()) {
      throw wrong(key, "must stand as [[" + key + "]], once for each entry", array);
    }
    for (JsonNode entry : array) {
      if (!entry.isObject()) {
        throw wrong(key, "must stand as [[" + key + "]], once for each entry", entry);
      }
      entries.add(new PlanTable(source, entry, key, entries.size()));
    }
    return entries;
  }

  /** Returns a table at the top of a plan. */
  Optional<PlanTable> section(String key) {
    JsonNode section = node.path(key);
    if (section.isMissingNode()) {
      return Optional.empty();
    }
    if (!section.isObject()) {
      throw wrong(key, "must be a table, [" + key + "]", section);
    }
    return Optional.of(new PlanTable(source, section, key, 0));
  }

  List<String> keys() {
    return node.propertyStream().map(Map.Entry::getKey).toList();
  }

  void allowOnly(List<String> known) {
    for (String key : keys()) {
      if (!known.contains(key)) {
        throw fail(key, "unknown key '" + key + "'; " + NearestName.hint(key, known));
      }
    }
  }

  String text(String key) {
    if (!has(key)) {
      throw fail("", title() + " lacks the key '" + key + "'");
    }
    return text(key, node.get(key));
  }

  int wholeNumber(String key, int min, int max) {
    return (int) wholeNumber(key, node.path(key), "a whole number", min, max);
  }

  int wholeNumber(String key, int otherwise, int min, int max) {
    return has(key) ? wholeNumber(key, min, max) : otherwise;
  }

  long anyLong(String key, long otherwise) {
    return has(key)
        ? wholeNumber(key, node.get(key), "a whole number", Long.MIN_VALUE, Long.MAX_VALUE)
        : otherwise;
  }

  double number(String key) {
    return number(key, node.path(key), "a number");
  }

  List<String> texts(String key) {
    return list(key, "texts", item -> text(key, item));
  }

  /** Returns a list whose items are lists of texts, or single texts for lists of one. */
  List<List<String>> textLists(String key) {
    return list(key, "texts, or of lists of texts", item -> textList(key, item));
  }

  List<Integer> wholeNumbers(String key, int min, int max) {
    String kind = "a list of whole numbers";
    return list(key, "whole numbers", item -> (int) wholeNumber(key, item, kind, min, max));
  }

  List<Double> numbers(String key) {
    return list(key, "numbers", item -> number(key, item, "a list of numbers"));
  }

  /** Returns the exception for something wrong with a key; an empty key stands for the table. */
  PlanException fail(String key, String sentence) {
    return source.fail(source.locator().find(header, index, path(key)), sentence);
  }

  /** Returns the exception for something wrong with a word in the value of a key. */
  PlanException failAtWord(String key, String word, String sentence) {
    return source.fail(source.locator().findWord(header, index, path(key), word), sentence);
  }

  private String path(String key) {
    return key.isEmpty() && !prefix.isEmpty()
        ? prefix.substring(0, prefix.length() - 1)
        : prefix + key;
  }

  private String title() {
    return header.isEmpty() ? "the plan" : "this '" + header + "' entry";
  }

  private String text(String key, JsonNode value) {
    boolean plain =
        value.isTextual()
            && !value.textValue().isBlank()
            && value.textValue().chars().noneMatch(Character::isISOControl);
    if (!plain) {
      throw wrong(key, "must be a text in quotes, on one line and not blank", value);
    }
    return value.textValue();
  }

  private List<String> textList(String key, JsonNode item) {
    if (!item.isArray()) {
      return List.of(text(key, item));
    }
    List<String> texts = new ArrayList<>();
    item.forEach(each -> texts.add(text(key, each)));
    if (texts.isEmpty()) {
      throw fail(key, "'" + key + "' has an empty list in it: name at least one, or leave it out");
    }
    return texts;
  }

  private long wholeNumber(String key, JsonNode value, String kind, long min, long max) {
    if (!value.isIntegralNumber()) {
      throw wrong(key, "must be " + kind, value);
    }
    if (!value.canConvertToLong() || value.longValue() < min || value.longValue() > max) {
      throw wrong(key, "must be " + kind + " from " + min + " to " + max, value);
    }
    return value.longValue();
  }

  private double number(String key, JsonNode value, String kind) {
    if (!value.isNumber()) {
      throw wrong(key, "must be " + kind, value);
    }
    if (!Double.isFinite(value.doubleValue())) {
      throw wrong(key, "must be " + kind + " that fit a double", value);
    }
    return value.doubleValue();
  }

  private <T> List<T> list(String key, String kind, Function<JsonNode, T> item) {
    JsonNode array = node.path(key);
    if (!array.isArray()) {
      throw wrong(key, "must be a list of " + kind, array);
    }
    if (array.isEmpty()) {
      throw fail(key, "'" + key + "' is an empty list: name at least one, or leave the key out");
    }
    List<T> items = new ArrayList<>();
    Set<T> seen = new HashSet<>();
    for (JsonNode element : array) {
      items.add(item.apply(element));
      if (!seen.add(items.get(items.size() - 1))) {
        throw fail(key, "'" + key + "' has " + quoted(element) + " twice: once is enough");
      }
    }
    return items;
  }

  private PlanException wrong(String key, String mustBe, JsonNode found) {
    if (found.isMissingNode()) {
      return fail(key, title() + " lacks the key '" + key + "', which " + mustBe);
    }
    return fail(key, "'" + key + "' " + mustBe + ", found " + quoted(found));
  }

  private static String quoted(JsonNode value) {
    String text = value.toString();
    return text.length() > MAX_QUOTED ? text.substring(0, MAX_QUOTED) + "…" : text;
  }
}
