package steelyard.results.table;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToIntFunction;
import java.util.function.ToLongFunction;

/**
 * One column of a table.
 *
 * @param <R> the row
 * @param name snake case, with the unit where there is one
 * @param type the form of its cells
 * @param unit the unit, {@code 1} for a pure number, {@code none} for what is no number
 * @param meaning one sentence for the reader of the table
 * @param required whether a cell may not be empty
 * @param values the texts that a cell may have; none where any will do
 * @param getter the text of a row's cell, empty where the figure does not apply
 */
public record Column<R>(
    String name,
    CellType type,
    String unit,
    String meaning,
    boolean required,
    List<String> values,
    Function<R, String> getter) {

  private static final String NO_UNIT = "none";

  /** A text that every row has, never an empty one. */
  static <R> Column<R> text(String name, String meaning, Function<R, String> getter) {
    return new Column<>(name, CellType.TEXT, NO_UNIT, meaning, true, List.of(), getter);
  }

  /** A text that may be missing. */
  static <R> Column<R> note(String name, String meaning, Function<R, Optional<String>> getter) {
    return new Column<>(
        name, CellType.TEXT, NO_UNIT, meaning, false, List.of(), r -> getter.apply(r).orElse(""));
  }

  /** One of a few texts. */
  static <R> Column<R> choice(
      String name,
      String meaning,
      boolean required,
      List<String> values,
      Function<R, Optional<String>> getter) {
    return new Column<>(
        name, CellType.TEXT, NO_UNIT, meaning, required, values, r -> getter.apply(r).orElse(""));
  }

  /** A whole number that every row has. */
  static <R> Column<R> integer(String name, String unit, String meaning, ToIntFunction<R> getter) {
    return whole(name, unit, meaning, getter::applyAsInt);
  }

  /** A whole number of up to 64 bits that every row has. */
  static <R> Column<R> whole(String name, String unit, String meaning, ToLongFunction<R> getter) {
    return new Column<>(
        name,
        CellType.INTEGER,
        unit,
        meaning,
        true,
        List.of(),
        r -> Long.toString(getter.applyAsLong(r)));
  }

  /** A number, printed by {@link Scientific}. */
  static <R> Column<R> number(
      String name, String unit, String meaning, Function<R, OptionalDouble> getter) {
    return new Column<>(
        name,
        CellType.NUMBER,
        unit,
        meaning,
        false,
        List.of(),
        r -> Scientific.textOrEmpty(getter.apply(r)));
  }

  /** A number to the last bit. */
  static <R> Column<R> hex(
      String name, String unit, String meaning, Function<R, OptionalDouble> getter) {
    return new Column<>(
        name,
        CellType.HEX,
        unit,
        meaning,
        false,
        List.of(),
        r -> {
          OptionalDouble value = getter.apply(r);
          return value.isPresent() ? Double.toHexString(value.getAsDouble()) : "";
        });
  }

  /** A yes or no that may be missing. */
  static <R> Column<R> flag(String name, String meaning, Function<R, Optional<Boolean>> getter) {
    return new Column<>(
        name,
        CellType.BOOLEAN,
        NO_UNIT,
        meaning,
        false,
        List.of(),
        r -> getter.apply(r).map(b -> Boolean.toString(b)).orElse(""));
  }

  /** Returns the text of a row's cell as it stands in the file, before CSV quoting. */
  String cell(R row) {
    String text = getter.apply(row);
    return type == CellType.TEXT ? GuardedText.guard(text) : text;
  }

  /** Says what is wrong with a cell, after the text of a file has been unguarded. */
  Optional<String> complaint(String text) {
    if (text.isEmpty()) {
      return required
          ? Optional.of("the cell is empty; write " + type.example())
          : Optional.empty();
    }
    if (!type.accepts(text)) {
      return Optional.of(
          "\"" + GuardedText.excerpt(text) + "\" is not " + type.example() + "; correct the cell");
    }
    if (!values.isEmpty() && !values.contains(text)) {
      return Optional.of(
          "\""
              + GuardedText.excerpt(text)
              + "\" is not known here; write one of "
              + String.join(", ", values));
    }
    return Optional.empty();
  }
}
