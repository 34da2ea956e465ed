package steelyard.results.run;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Files of one folder that appear complete or not at all. All are written aside in the same folder,
 * and forced to the disk; only then is each renamed to its place. If anything fails before, the
 * files that were there stay as they were and nothing is left over.
 */
final class FileSet {
  /** The ending of a file that is not whole yet; one is left only where the program was killed. */
  static final String ASIDE = ".aside";

  /** What a file holds. */
  @FunctionalInterface
  interface Content {
    /** Writes it all. */
    void writeTo(Writer writer) throws IOException;
  }

  private final Map<String, Content> contents = new LinkedHashMap<>();

  /** Adds a file; files are renamed to their places in the order in which they were added. */
  FileSet add(String name, Content content) {
    contents.put(name, content);
    return this;
  }

  /**
   * Writes the files.
   *
   * @param folder an existing folder
   * @throws IOException if one cannot be written
   */
  void write(Path folder) throws IOException {
    Map<Path, Path> places = new LinkedHashMap<>();
    try {
      for (Map.Entry<String, Content> entry : contents.entrySet()) {
        Path aside = folder.resolve(entry.getKey() + ASIDE);
        places.put(aside, folder.resolve(entry.getKey()));
        writeOne(aside, entry.getValue());
      }
      for (Map.Entry<Path, Path> place : places.entrySet()) {
        Files.move(
            place.getKey(),
            place.getValue(),
            StandardCopyOption.ATOMIC_MOVE,
            StandardCopyOption.REPLACE_EXISTING);
      }
    } finally {
      for (Path aside : places.keySet()) {
        Files.deleteIfExists(aside);
      }
    }
  }

  private static void writeOne(Path aside, Content content) throws IOException {
    try (FileChannel channel =
            FileChannel.open(
                aside,
                StandardOpenOption.CREATE,
                StandardOpenOption.TRUNCATE_EXISTING,
                StandardOpenOption.WRITE);
        Writer writer =
            new BufferedWriter(
                new OutputStreamWriter(
                    Channels.newOutputStream(channel), StandardCharsets.UTF_8))) {
      content.writeTo(writer);
      writer.flush();
      channel.force(true);
    }
  }
}
