package steelyard.harness.plan;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import steelyard.results.text.NearestName;

/** Reads one {@code [[weigh]]} entry and fills in what it leaves to a default. */
final class WeighingReader {

  /** Stands for "no family" in the key {@code time}. */
  static final String NOT_TIMED = "none";

  private static final int MAX_REPEATS = 10_000;
  private static final int DEFAULT_REPEATS = 3;
  private static final int MAX_TIMEOUT_MS = 24 * 60 * 60 * 1000;
  private static final int DEFAULT_TIMEOUT_MS = 10_000;

  private static final List<String> KEYS =
      List.of(
          "task",
          "families",
          "files",
          "columns",
          "candidates",
          "conditions",
          "sizes",
          "repeats",
          "time",
          "timeout_ms");

  private final Catalogue catalogue;
  private final FileShareReader fileReader;

  WeighingReader(Catalogue catalogue, FileShareReader fileReader) {
    this.catalogue = catalogue;
    this.fileReader = fileReader;
  }

  Weighing read(PlanTable table) {
    table.allowOnly(KEYS);
    Catalogue.TaskEntry task = task(table);
    List<FamilyShare> shares = shares(table, task);
    return new Weighing(
        task.id(),
        shares,
        chosen(table, "candidates", "candidate", task, task.candidates()),
        table.wholeNumber("repeats", DEFAULT_REPEATS, 1, MAX_REPEATS),
        time(table, shares),
        table.wholeNumber("timeout_ms", DEFAULT_TIMEOUT_MS, 1, MAX_TIMEOUT_MS));
  }

  private Catalogue.TaskEntry task(PlanTable table) {
    String id = table.text("task");
    List<String> known = catalogue.taskIds();
    if (!known.contains(id)) {
      throw table.failAtWord(
          "task", id, "unknown task '" + id + "'; " + NearestName.hint(id, known));
    }
    return catalogue.task(id);
  }

  private static List<String> chosen(
      PlanTable table, String key, String kind, Catalogue.TaskEntry task, List<String> known) {
    if (!table.has(key)) {
      return known;
    }
    List<String> wanted = table.texts(key);
    for (String id : wanted) {
      if (!known.contains(id)) {
        throw table.failAtWord(
            key,
            id,
            "unknown "
                + kind
                + " '"
                + id
                + "' of task '"
                + task.id()
                + "'; "
                + NearestName.hint(id, known));
      }
    }
    return wanted;
  }

  /** Files alone leave the families out, unless the entry names some. */
  private List<FamilyShare> shares(PlanTable table, Catalogue.TaskEntry task) {
    List<FamilyShare> files = fileReader.shares(table, task.id());
    return files.isEmpty() || table.has("families")
        ? Stream.concat(generated(table, task).stream(), files.stream()).toList()
        : files;
  }

  private static List<FamilyShare> generated(PlanTable table, Catalogue.TaskEntry task) {
    List<Catalogue.FamilyEntry> families =
        chosen(table, "families", "family", task, task.familyIds()).stream()
            .map(task::family)
            .toList();
    return new ShareReader(table, task.id(), families, table.has("families")).shares();
  }

  private static Optional<String> time(PlanTable table, List<FamilyShare> shares) {
    List<String> families = shares.stream().map(FamilyShare::family).toList();
    if (!table.has("time")) {
      return Optional.of(families.get(0));
    }
    String family = table.text("time");
    if (family.equals(NOT_TIMED)) {
      return Optional.empty();
    }
    if (!families.contains(family)) {
      throw table.failAtWord(
          "time",
          family,
          "family '"
              + family
              + "' does not take part in this entry, so it cannot be timed on; "
              + NearestName.hint(family, families));
    }
    return Optional.of(family);
  }
}
