package steelyard.harness.export;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Map;
import java.util.regex.Pattern;

/**
 * Writes problems below a folder, each into a folder of its own whose path is the problem's id. A
 * problem's folder appears complete or not at all: it is written aside, then renamed.
 */
public final class ProblemExport {

  private static final Pattern ID =
      Pattern.compile("[A-Za-z0-9][A-Za-z0-9.+-]*(/[A-Za-z0-9][A-Za-z0-9.+-]*)*");

  private final Path root;
  private final boolean overwrite;

  /**
   * Makes an export.
   *
   * @param root the folder below which problems are written; made if it is not there
   * @param overwrite whether a problem that is already there is written anew
   */
  public ProblemExport(Path root, boolean overwrite) {
    this.root = root;
    this.overwrite = overwrite;
  }

  /**
   * Writes a problem: each vector as CSV, each matrix in Matrix Market form, the answer, and {@code
   * problem.json}.
   *
   * @return its folder
   * @throws ExportException if it is there already and is not to be overwritten, if a folder of
   *     another kind is in the way, or if it cannot be written
   */
  public Path write(ExportedProblem problem) {
    if (!ID.matcher(problem.id()).matches()) {
      throw new ExportException(
          "'" + problem.id() + "' is no problem id, so no folder can be named after it");
    }
    Path folder = root.resolve(problem.id());
    checkFree(folder);
    Map<String, byte[]> files = ProblemFiles.of(problem);
    try {
      Files.createDirectories(folder.getParent());
      Path aside = fresh(folder, ".writing-");
      try {
        Files.createDirectory(aside);
        for (Map.Entry<String, byte[]> file : files.entrySet()) {
          Files.write(aside.resolve(file.getKey()), file.getValue());
        }
        replace(folder, aside);
      } finally {
        deleteIfThere(aside);
      }
      return folder;
    } catch (IOException e) {
      throw new ExportException(
          "problem "
              + problem.id()
              + " cannot be written to "
              + folder
              + ", which must be in a folder that can be written, on a disk with room",
          e);
    }
  }

  private void checkFree(Path folder) {
    if (!Files.exists(folder, LinkOption.NOFOLLOW_LINKS)) {
      return;
    }
    if (!Files.isRegularFile(folder.resolve(ProblemFiles.DESCRIPTION))) {
      throw new ExportException(
          folder + " is in the way and holds no problem: choose another folder");
    }
    if (!overwrite) {
      throw new ExportException(folder + " holds a problem already, which is not overwritten");
    }
  }

  /** An old folder is renamed out of the way first, since no folder is renamed over a full one. */
  private static void replace(Path folder, Path aside) throws IOException {
    if (!Files.exists(folder)) {
      Files.move(aside, folder, StandardCopyOption.ATOMIC_MOVE);
      return;
    }
    Path old = fresh(folder, ".replaced-");
    Files.move(folder, old, StandardCopyOption.ATOMIC_MOVE);
    try {
      Files.move(aside, folder, StandardCopyOption.ATOMIC_MOVE);
    } catch (IOException e) {
      Files.move(old, folder, StandardCopyOption.ATOMIC_MOVE);
      throw e;
    }
    deleteIfThere(old);
  }

  /** Returns a hidden neighbour that no id can name, free of what a killed export may have left. */
  private static Path fresh(Path folder, String prefix) throws IOException {
    Path neighbour = folder.resolveSibling(prefix + folder.getFileName());
    deleteIfThere(neighbour);
    return neighbour;
  }

  private static void deleteIfThere(Path path) throws IOException {
    if (Files.isDirectory(path, LinkOption.NOFOLLOW_LINKS)) {
      try (var children = Files.list(path)) {
        for (Path child : (Iterable<Path>) children::iterator) {
          deleteIfThere(child);
        }
      } catch (UncheckedIOException e) {
        throw e.getCause();
      }
    }
    Files.deleteIfExists(path);
  }
}
