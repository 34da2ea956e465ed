package steelyard.harness.plan;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import steelyard.harness.input.DataFiles;
import steelyard.harness.input.InputException;
import steelyard.harness.input.OwnFamily;
import steelyard.harness.task.Task;
import steelyard.problems.Data;

/**
 * Reads which files stand beside families in the {@code [[weigh]]} entries of a plan, and the files
 * themselves, so that what is wrong with them is known before any work.
 */
final class FileShareReader {

  private static final String FILES = "files";
  private static final String COLUMNS = "columns";

  private final List<? extends Task<?, ?>> tasks;
  private final Path folder;
  private final Map<String, DataFiles> named = new HashMap<>();

  /**
   * Makes a reader for one plan.
   *
   * @param tasks the tasks that take files
   * @param folder where relative paths start
   */
  FileShareReader(List<? extends Task<?, ?>> tasks, Path folder) {
    this.tasks = tasks;
    this.folder = folder;
  }

  List<FamilyShare> shares(PlanTable table, String task) {
    if (!table.has(FILES)) {
      if (table.has(COLUMNS)) {
        throw table.fail(
            COLUMNS, "'columns' says which columns of 'files', which are missing here");
      }
      return List.of();
    }
    for (String key : List.of("conditions", "sizes")) {
      if (table.has(key) && !table.has("families")) {
        throw table.fail(
            key, "'" + key + "' is for families, and this entry has files alone; leave it out");
      }
    }
    List<String> columns = table.has(COLUMNS) ? table.texts(COLUMNS) : List.of();
    List<FamilyShare> shares = new ArrayList<>();
    for (List<String> names : table.textLists(FILES)) {
      shares.add(share(table, task, names, columns));
    }
    return shares;
  }

  private FamilyShare share(
      PlanTable table, String task, List<String> names, List<String> columns) {
    String first = names.get(0);
    DataFiles source;
    try {
      source =
          new DataFiles(
              names.stream().map(name -> folder.resolve(name).normalize()).toList(), columns);
    } catch (InvalidPathException impossible) {
      throw table.failAtWord(FILES, first, "'" + first + "' is no file name");
    }
    String id = source.familyId();
    DataFiles before = named.putIfAbsent(task + " " + id, source);
    if (before != null && !before.equals(source)) {
      throw table.failAtWord(
          FILES,
          first,
          "both "
              + before.words()
              + " and "
              + source.words()
              + " would be called '"
              + id
              + "'; rename a file");
    }
    try {
      return FamilyShare.of(read(task(task), source));
    } catch (InputException wrong) {
      throw table.failAtWord(FILES, first, wrong.getMessage());
    }
  }

  private Task<?, ?> task(String id) {
    return tasks.stream().filter(task -> task.id().equals(id)).findFirst().orElseThrow();
  }

  private static <D extends Data> OwnFiles read(Task<?, D> task, DataFiles source) {
    OwnFamily<D> family = OwnFamily.read(task, source);
    return new OwnFiles(source, family.size(), family.inexact());
  }
}
