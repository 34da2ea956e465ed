package steelyard.results.run;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import steelyard.results.table.ErrorsTable;
import steelyard.results.table.TableReader;
import steelyard.results.table.TableSchema;
import steelyard.results.table.TableSchemas;
import steelyard.results.table.TableWriter;
import steelyard.results.table.TimingsTable;
import steelyard.results.table.TradeoffsTable;
import steelyard.results.table.VerdictsTable;

/** The folder of a run: writes its files and reads them back. */
public final class RunFolder {
  private static final String PLAN = "plan.toml";
  private static final String TABLES = "tables.json";
  private static final String RUN = "run.json";

  /** What to do with a run that is already there. */
  public enum Existing {
    /** Refuse. */
    KEEP,
    /** Replace its files, and no other file. */
    REPLACE
  }

  private RunFolder() {}

  /**
   * Writes a run. A folder that is made for it is removed again on failure.
   *
   * @throws RunException if the folder holds a run that is to be kept, or anything that is not a
   *     run, or cannot be written
   */
  public static void write(Path folder, Run run, Existing existing) {
    checkTarget(folder, existing);
    boolean made = !Files.exists(folder);
    try {
      Files.createDirectories(folder);
      files(run).write(folder);
    } catch (IOException e) {
      if (made) {
        removeIfEmpty(folder);
      }
      throw unwritable(folder, e);
    }
  }

  /**
   * Makes sure, before hours are spent, that a run can be written to a folder, and makes the
   * folder.
   *
   * @throws RunException as {@link #write} would throw it
   */
  public static void prepare(Path folder, Existing existing) {
    checkTarget(folder, existing);
    try {
      Files.createDirectories(folder);
      Files.delete(Files.createTempFile(folder, "probe", FileSet.ASIDE));
    } catch (IOException e) {
      throw unwritable(folder, e);
    }
  }

  private static RunException unwritable(Path folder, IOException e) {
    return new RunException(
        folder + ": the run cannot be written (" + reason(e) + "); name another folder.", e);
  }

  private static FileSet files(Run run) {
    // The record of the run comes last: where it is, everything else is.
    return new FileSet()
        .add(PLAN, writer -> writer.write(run.plan()))
        .add(TABLES, writer -> writer.write(TableSchemas.json()))
        .add(ErrorsTable.SCHEMA.fileName(), table(ErrorsTable.SCHEMA, run.observations()))
        .add(TimingsTable.SCHEMA.fileName(), table(TimingsTable.SCHEMA, run.timings()))
        .add(TradeoffsTable.SCHEMA.fileName(), table(TradeoffsTable.SCHEMA, run.tradeoffs()))
        .add(VerdictsTable.SCHEMA.fileName(), table(VerdictsTable.SCHEMA, run.verdicts()))
        .add(RUN, writer -> writer.write(ProvenanceJson.text(run.provenance())));
  }

  private static <R> FileSet.Content table(TableSchema<R> schema, Collection<R> rows) {
    return writer -> TableWriter.write(schema, rows, writer);
  }

  /**
   * Reads a run, complete or not.
   *
   * @throws RunException if the folder is no run
   * @throws steelyard.results.table.TableException if a table is missing or damaged
   */
  public static Run read(Path folder) {
    if (!isRun(folder)) {
      throw new RunException(
          folder + ": this is not a run, it has no " + RUN + " of ours; name the folder of a run.");
    }
    Provenance provenance =
        ProvenanceJson.parse(folder.resolve(RUN).toString(), text(folder.resolve(RUN)));
    return new Run(
        table(folder, ErrorsTable.SCHEMA),
        table(folder, TimingsTable.SCHEMA),
        table(folder, TradeoffsTable.SCHEMA),
        table(folder, VerdictsTable.SCHEMA),
        text(folder.resolve(PLAN)),
        provenance);
  }

  private static <R> List<R> table(Path folder, TableSchema<R> schema) {
    return TableReader.read(schema, folder.resolve(schema.fileName()));
  }

  private static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      throw new RunException(
          file + ": the file cannot be read (" + reason(e) + "); take a whole copy.", e);
    }
  }

  /** Says whether a folder holds a run, complete or not. */
  public static boolean isRun(Path folder) {
    return Files.isRegularFile(folder.resolve(RUN))
        && ProvenanceJson.isOurs(text(folder.resolve(RUN)));
  }

  private static void checkTarget(Path folder, Existing existing) {
    if (!Files.exists(folder)) {
      return;
    }
    if (!Files.isDirectory(folder)) {
      throw new RunException(folder + ": this is a file; name a folder for the run.");
    }
    if (isRun(folder)) {
      if (existing == Existing.KEEP) {
        throw new RunException(
            folder + ": a run is already there; name another folder, or ask to replace it.");
      }
    } else if (!isEmpty(folder)) {
      throw new RunException(
          folder + ": files that are not a run are there; name an empty or a new folder.");
    }
  }

  private static boolean isEmpty(Path folder) {
    try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
      for (Path entry : entries) {
        if (!entry.getFileName().toString().endsWith(FileSet.ASIDE)) {
          return false;
        }
      }
      return true;
    } catch (IOException e) {
      throw new RunException(
          folder + ": the folder cannot be read (" + reason(e) + "); name another.", e);
    }
  }

  private static void removeIfEmpty(Path folder) {
    try {
      Files.deleteIfExists(folder);
    } catch (IOException e) {
      // It is not empty, or not ours to remove: what is there stays.
      return;
    }
  }

  private static String reason(IOException e) {
    if (e instanceof AccessDeniedException) {
      return "access denied";
    }
    if (e instanceof FileSystemException f && f.getReason() != null) {
      return f.getReason();
    }
    return e instanceof FileSystemException
        ? e.getClass().getSimpleName()
        : String.valueOf(e.getMessage());
  }
}
