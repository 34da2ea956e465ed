package steelyard.harness.benchmark;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.openjdk.jmh.runner.RunnerException;

/**
 * Measures every ratio and prints the table. Arguments: the folder for its files, the program's
 * jar, a pattern of the works wanted, and the number of forks.
 */
final class CostTable {
  private CostTable() {}

  public static void main(String[] arguments)
      throws RunnerException, IOException, InterruptedException {
    Path folder = Path.of(arguments[0]);
    Path jar = Path.of(arguments[1]);
    Pattern wanted = Pattern.compile(arguments[2]);
    KernelCosts costs = new KernelCosts(Integer.parseInt(arguments[3]));
    List<Row> rows = new ArrayList<>();
    for (Goal goal : Goals.all()) {
      if (wanted.matcher(goal.work()).find()) {
        rows.add(Row.of(goal, costs.of(goal.kernel()), costs.of(goal.yardstick())));
        report(rows);
      }
    }
    if (wanted.matcher(StopwatchOverhead.WORK).find()) {
      rows.addAll(StopwatchOverhead.rows(folder));
    }
    if (wanted.matcher(StartUp.WORK).find()) {
      rows.add(StartUp.row(jar));
    }
    String table = markdown(rows);
    Files.createDirectories(folder);
    Files.writeString(folder.resolve("costs.md"), table);
    new PrintStream(System.out, true, StandardCharsets.UTF_8).print(table);
  }

  private static void report(List<Row> rows) {
    Row last = rows.get(rows.size() - 1);
    System.err.println(last.work() + ": " + last.ratio() + ", " + last.goal());
  }

  static String markdown(List<Row> rows) {
    StringBuilder text =
        new StringBuilder("| work | ratio | goal | met | figures |\n|---|---|---|---|---|\n");
    for (Row row : rows) {
      text.append("| ")
          .append(
              String.join(
                  " | ",
                  row.work(),
                  row.ratio(),
                  row.goal(),
                  row.met() ? "yes" : "no",
                  row.figures()))
          .append(" |\n");
    }
    return text.toString();
  }
}
