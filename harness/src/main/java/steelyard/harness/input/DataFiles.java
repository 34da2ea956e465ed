package steelyard.harness.input;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * The files that one problem is read from.
 *
 * @param files in the order in which the task takes its arrays; or one table for all of them
 * @param columns the names of a table's columns, or their numbers from 1; empty where a table has
 *     no others
 */
public record DataFiles(List<Path> files, List<String> columns) {

  private static final String ID_START = "file";
  private static final int LONGEST_ID = 60;

  /** Copies the lists. */
  public DataFiles {
    files = List.copyOf(files);
    columns = List.copyOf(columns);
  }

  /** Returns the id of the family of this one problem, such as {@code file-ledger-net-kg}. */
  public String familyId() {
    String name =
        Stream.concat(files.stream().map(DataFiles::stem), columns.stream())
            .flatMap(text -> Stream.of(text.toLowerCase(Locale.ROOT).split("[^a-z0-9]+", -1)))
            .filter(word -> !word.isEmpty())
            .collect(Collectors.joining("-"));
    String id = name.isEmpty() ? ID_START : ID_START + "-" + name;
    return id.length() <= LONGEST_ID ? id : id.substring(0, LONGEST_ID).replaceFirst("-+$", "");
  }

  /** Returns what a reader calls it, such as {@code ledger.csv, column net_kg}. */
  public String words() {
    String names = files.stream().map(Path::toString).collect(Collectors.joining(" and "));
    if (columns.isEmpty()) {
      return names;
    }
    return names
        + (columns.size() == 1 ? ", column " : ", columns ")
        + String.join(" and ", columns);
  }

  private static String stem(Path file) {
    Path last = file.getFileName();
    String name = last == null ? "" : last.toString();
    return name.replaceFirst("(?i)\\.gz$", "").replaceFirst("\\.[A-Za-z]{1,4}$", "");
  }
}
