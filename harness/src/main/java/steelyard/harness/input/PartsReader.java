package steelyard.harness.input;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import steelyard.harness.task.PartShape;
import steelyard.harness.task.Task;
import steelyard.problems.Data;

/** Matches files with the arrays that a task takes, and reads them. */
final class PartsReader {

  private final String task;
  private final List<PartShape> shapes;
  private final DataFiles source;
  private final List<Data.Part> parts = new ArrayList<>();
  private Inexact inexact = Inexact.NONE;

  PartsReader(Task<?, ?> task, DataFiles source) {
    this.task = task.id();
    this.shapes = task.shapes();
    this.source = source;
  }

  /**
   * Reads every array.
   *
   * @throws InputException if files or columns are too many or too few, or something is wrong in a
   *     file
   */
  List<Data.Part> read() {
    List<Path> files = source.files();
    long tables = files.stream().filter(DataReader::isTable).count();
    boolean onlyVectors = shapes.stream().noneMatch(PartShape::matrix);
    if (tables == 0 && !source.columns().isEmpty()) {
      throw new InputException(
          "a column can be chosen of a .csv or .tsv file alone, and "
              + source.words().replaceFirst(",.*", "")
              + " is none");
    }
    if (files.size() == 1 && tables == 1 && onlyVectors) {
      readTable(files.get(0));
    } else if (files.size() == shapes.size()) {
      readEach(files, (int) tables);
    } else {
      throw new InputException(
          "task " + task + " takes " + wanted() + ", found " + count(files.size(), "file"));
    }
    return parts;
  }

  /** Returns how many values were rounded in what was read. */
  Inexact inexact() {
    return inexact;
  }

  private void readTable(Path file) {
    requireColumns(shapes.size());
    List<Column> columns = DataReader.columns(file, source.columns(), shapes.size());
    for (int i = 0; i < shapes.size(); i++) {
      add(shapes.get(i), columns.get(i), file);
    }
  }

  private void readEach(List<Path> files, int tables) {
    List<String> columns = source.columns();
    if (columns.size() > 1) {
      requireColumns(tables);
    }
    int used = 0;
    for (int i = 0; i < files.size(); i++) {
      Path file = files.get(i);
      PartShape shape = shapes.get(i);
      if (shape.matrix()) {
        add(shape, DataReader.matrix(file), file);
      } else if (DataReader.isTable(file)) {
        List<String> own =
            columns.isEmpty() ? columns : List.of(columns.get(columns.size() == 1 ? 0 : used));
        used++;
        add(shape, DataReader.columns(file, own, 1).get(0), file);
      } else {
        add(shape, DataReader.vector(file), file);
      }
    }
  }

  private void requireColumns(int count) {
    if (!source.columns().isEmpty() && source.columns().size() != count) {
      throw new InputException(
          "task "
              + task
              + " takes "
              + count(count, "column")
              + " of "
              + source.files().stream().map(Path::toString).collect(Collectors.joining(" and "))
              + ", found "
              + source.columns().size()
              + " ("
              + String.join(", ", source.columns())
              + ")");
    }
  }

  private void add(PartShape shape, Column column, Path file) {
    requireSize(shape, column.values().length, file);
    parts.add(new Data.Vector(shape.name(), column.values()));
    inexact = inexact.and(column.inexact());
  }

  private void add(PartShape shape, Grid grid, Path file) {
    requireSize(shape, grid.rows().length, file);
    parts.add(new Data.Matrix(shape.name(), grid.rows()));
    inexact = inexact.and(grid.inexact());
  }

  private void requireSize(PartShape shape, int size, Path file) {
    if (size > shape.largest()) {
      throw new InputException(
          "%s has size %s, of at most %s for '%s' of task %s"
              .formatted(file, size, shape.largest(), shape.name(), task));
    }
  }

  private String wanted() {
    String arrays =
        shapes.stream()
            .map(shape -> (shape.matrix() ? "a matrix '" : "a vector '") + shape.name() + "'")
            .collect(Collectors.joining(" and "));
    boolean oneTable = shapes.size() > 1 && shapes.stream().noneMatch(PartShape::matrix);
    return arrays
        + (shapes.size() == 1 ? ", in one file" : ", each in a file of its own, in this order")
        + (oneTable ? ", or all as columns of one .csv file" : "");
  }

  private static String count(int number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }
}
