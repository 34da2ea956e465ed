package steelyard.harness.plan;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import steelyard.problems.ProblemId;
import steelyard.results.text.NearestName;

/** Reads the {@code [[add]]} entries of a plan. */
final class AdditionReader {
  private final Catalogue catalogue;
  private final String file;
  private final UnaryOperator<List<Addition>> expansion;

  /**
   * Makes a reader.
   *
   * @param file the plan's file, next to which its jars are looked for
   */
  AdditionReader(Catalogue catalogue, String file, UnaryOperator<List<Addition>> expansion) {
    this.catalogue = catalogue;
    this.file = file;
    this.expansion = expansion;
  }

  List<Addition> read(List<PlanTable> tables) {
    List<Addition> additions = new ArrayList<>();
    for (PlanTable table : tables) {
      List<Addition> read = expansion.apply(List.of(read(table)));
      try {
        catalogue.with(additions).with(read);
      } catch (PlanException twice) {
        throw table.failAtWord("id", read.get(0).id(), twice.getMessage());
      }
      additions.addAll(read);
    }
    return additions;
  }

  private Addition read(PlanTable table) {
    table.allowOnly(List.of("task", "id", "use", "jars"));
    String task = table.text("task");
    if (!catalogue.taskIds().contains(task)) {
      throw table.failAtWord(
          "task",
          task,
          "unknown task '" + task + "'; " + NearestName.hint(task, catalogue.taskIds()));
    }
    String id = table.text("id");
    if (!ProblemId.isName(id)) {
      throw table.failAtWord(
          "id", id, "the id '" + id + "' must be lower case letters, digits and hyphens");
    }
    List<String> jars = table.has("jars") ? table.texts("jars") : List.of();
    return new Addition(
        task, id, table.text("use"), jars.stream().map(this::besideThePlan).toList());
  }

  private String besideThePlan(String jar) {
    try {
      Path folder = Path.of(file).getParent();
      Path path = folder == null ? Path.of(jar) : folder.resolve(jar);
      return path.toAbsolutePath().normalize().toString();
    } catch (InvalidPathException none) {
      return jar;
    }
  }
}
