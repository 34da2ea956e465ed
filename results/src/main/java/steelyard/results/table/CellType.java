package steelyard.results.table;

import java.util.regex.Pattern;

/** The form of a cell that is not empty. */
public enum CellType {
  /** Any text, guarded by {@link GuardedText}. */
  TEXT("string", "(?s).*", "text"),
  /** A whole number. */
  INTEGER("integer", "-?[0-9]+", "a whole number such as 1000"),
  /** A number as {@link Scientific} prints it, or in any other usual decimal form. */
  NUMBER(
      "number",
      "[+-]?[0-9]+([.][0-9]*)?([eE][+-]?[0-9]+)?|-?INF|NaN",
      "a number such as 1.23457e-16, or INF"),
  /** One of true and false. */
  BOOLEAN("boolean", "true|false", "true or false"),
  /** A C99 hexadecimal floating-point number. */
  HEX(
      "string",
      "-?0x[01][.][0-9a-f]+p-?[0-9]+|-?Infinity|NaN",
      "a hexadecimal number such as 0x1.8p-3");

  private final String schemaType;
  private final Pattern pattern;
  private final String example;

  CellType(String schemaType, String pattern, String example) {
    this.schemaType = schemaType;
    this.pattern = Pattern.compile(pattern);
    this.example = example;
  }

  /** Returns the name of this type in a Table Schema. */
  public String schemaType() {
    return schemaType;
  }

  /** Says whether a text has this form. */
  boolean accepts(String text) {
    return pattern.matcher(text).matches();
  }

  /** Returns what would be right, for a sentence about a cell that is not. */
  String example() {
    return example;
  }
}
