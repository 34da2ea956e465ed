package steelyard.harness.plan;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Finds the line and column of a key in the text of a plan, for error messages: the TOML parser
 * gives values without their places. It knows as much TOML as a plan uses, and where it does not
 * find a key it gives the place of the table instead.
 */
final class KeyLocator {

  /** A place in a text, both numbers counted from 1. */
  record Place(int line, int column) {}

  private static final Pattern HEADER = Pattern.compile("\\s*\\[{1,2}\\s*([\\w.-]+)\\s*]{1,2}.*");
  private static final Pattern ASSIGNMENT =
      Pattern.compile("\\s*([\\w-][\\w.\\t -]*+|\"[^\"]*\"\\s*|'[^']*'\\s*)=.*");

  private final String text;
  private final Map<Key, Integer> offsets = new LinkedHashMap<>();
  private final Map<String, Integer> counts = new HashMap<>();

  KeyLocator(String text) {
    this.text = text;
    scan();
  }

  /**
   * Returns the place of a key.
   *
   * @param table the name in the header of its table; empty for the keys above all tables
   * @param index the number of its table among those of that name, counted from 0
   * @param key the key; empty for the header itself
   */
  Optional<Place> find(String table, int index, String key) {
    OptionalInt offset = offset(table, index, key);
    return offset.isPresent() ? Optional.of(place(offset.getAsInt())) : Optional.empty();
  }

  /** Returns the place of a quoted word in the value of a key. */
  Optional<Place> findWord(String table, int index, String key, String word) {
    OptionalInt start = offset(table, index, key);
    if (start.isEmpty()) {
      return Optional.empty();
    }
    int end =
        offsets.values().stream()
            .mapToInt(Integer::intValue)
            .filter(offset -> offset > start.getAsInt())
            .min()
            .orElse(text.length());
    Matcher quoted = Pattern.compile("[\"']" + Pattern.quote(word) + "[\"']").matcher(text);
    boolean found = quoted.region(start.getAsInt(), end).find();
    return Optional.of(place(found ? quoted.start() : start.getAsInt()));
  }

  private OptionalInt offset(String table, int index, String key) {
    OptionalInt exact = first(table, index, key);
    if (exact.isPresent()) {
      return exact;
    }
    OptionalInt header = table.isEmpty() ? first(key, 0, "") : first(table, index, "");
    return header.isPresent() ? header : first("", 0, table);
  }

  private OptionalInt first(String table, int index, String key) {
    return offsets.entrySet().stream()
        .filter(entry -> entry.getKey().isAt(table, index, key))
        .mapToInt(Map.Entry::getValue)
        .findFirst();
  }

  private void scan() {
    Key current = new Key("", 0, "");
    int offset = 0;
    for (String line : text.split("\n", -1)) {
      int indent = line.length() - line.stripLeading().length();
      Matcher header = HEADER.matcher(line.stripTrailing());
      Matcher assignment = ASSIGNMENT.matcher(line.stripTrailing());
      if (header.matches()) {
        current = opened(header.group(1), line.stripLeading().startsWith("[["));
        offsets.putIfAbsent(current, offset + indent);
      } else if (assignment.matches()) {
        String key = assignment.group(1).replaceAll("[\\s\"']", "");
        offsets.putIfAbsent(current.with(key), offset + indent);
      }
      offset += line.length() + 1;
    }
  }

  private Key opened(String header, boolean repeated) {
    int dot = header.indexOf('.');
    String table = dot < 0 ? header : header.substring(0, dot);
    if (dot < 0 && repeated) {
      counts.merge(table, 1, Integer::sum);
    }
    int index = Math.max(0, counts.getOrDefault(table, 1) - 1);
    return new Key(table, index, dot < 0 ? "" : header.substring(dot + 1));
  }

  private Place place(int offset) {
    String before = text.substring(0, offset);
    int lineStart = before.lastIndexOf('\n') + 1;
    return new Place(
        (int) before.chars().filter(c -> c == '\n').count() + 1, offset - lineStart + 1);
  }

  private record Key(String table, int index, String path) {

    Key with(String key) {
      return new Key(table, index, path.isEmpty() ? key : path + "." + key);
    }

    boolean isAt(String wantedTable, int wantedIndex, String wanted) {
      return table.equals(wantedTable)
          && index == wantedIndex
          && (path.equals(wanted) || (!wanted.isEmpty() && path.startsWith(wanted + ".")));
    }
  }
}
