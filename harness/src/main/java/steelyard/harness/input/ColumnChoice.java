package steelyard.harness.input;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import steelyard.results.table.GuardedText;
import steelyard.results.text.NearestName;

/** Finds the columns that are wanted of a table, by name or by number. */
final class ColumnChoice {

  private static final int MOST_NAMED = 20;
  private static final int LONGEST_NAME = 40;

  private final String file;
  private final List<String> names;
  private final List<Field> firstRow;

  /**
   * Prepares a choice.
   *
   * @param file the file's name
   * @param names the names in the header; where there is none, the numbers from 1
   * @param firstRow the first row of values
   */
  ColumnChoice(String file, List<String> names, List<Field> firstRow) {
    this.file = file;
    this.names = names;
    this.firstRow = firstRow;
  }

  /** Returns the places of the named columns, counted from 0. */
  int[] named(List<String> wanted) {
    return wanted.stream().mapToInt(this::find).toArray();
  }

  /** Returns the places of the columns with numbers, if there are as many as are wanted. */
  int[] numeric(int count) {
    int[] numeric =
        IntStream.range(0, firstRow.size())
            .filter(i -> NumberText.looksNumeric(firstRow.get(i).text()))
            .toArray();
    if (numeric.length == count) {
      return numeric;
    }
    String found =
        IntStream.of(numeric)
            .limit(MOST_NAMED)
            .mapToObj(shortNames()::get)
            .collect(Collectors.joining(", "));
    if (numeric.length < count) {
      throw firstRow
          .get(0)
          .place()
          .fail(
              "this row has "
                  + (numeric.length == 0 ? "no number" : numeric.length + " number (" + found + ")")
                  + ", where "
                  + count
                  + (count == 1 ? " is wanted" : " are wanted"));
    }
    throw new InputException(
        file
            + " has "
            + numeric.length
            + " columns with numbers ("
            + found
            + (numeric.length > MOST_NAMED ? ", ..." : "")
            + "); say which "
            + (count == 1 ? "one is" : count + " are")
            + " meant, by name or by number from 1");
  }

  private int find(String wanted) {
    List<Integer> places = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      if (names.get(i).equals(wanted)) {
        places.add(i);
      }
    }
    if (places.size() > 1) {
      throw new InputException(
          file
              + " has "
              + places.size()
              + " columns named "
              + NumberText.quoted(wanted)
              + "; say which one is meant by its number from 1");
    }
    if (places.size() == 1) {
      return places.get(0);
    }
    if (wanted.matches("[1-9][0-9]{0,8}") && Integer.parseInt(wanted) <= names.size()) {
      return Integer.parseInt(wanted) - 1;
    }
    throw new InputException(
        file
            + " has no column "
            + NumberText.quoted(wanted)
            + " among its "
            + names.size()
            + "; "
            + NearestName.hint(wanted, shortNames().stream().limit(MOST_NAMED).toList()));
  }

  private List<String> shortNames() {
    return names.stream()
        .map(name -> name.length() <= LONGEST_NAME ? name : name.substring(0, LONGEST_NAME) + "...")
        .map(GuardedText::visible)
        .toList();
  }
}
