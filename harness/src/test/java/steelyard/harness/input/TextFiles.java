package steelyard.harness.input;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPOutputStream;

/** Writes files for tests. */
final class TextFiles {

  private TextFiles() {}

  static Path write(Path folder, String name, String text) {
    return write(folder, name, text.getBytes(StandardCharsets.UTF_8));
  }

  static Path write(Path folder, String name, byte[] bytes) {
    try {
      return Files.write(folder.resolve(name), bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Path writePacked(Path folder, String name, String text) {
    Path file = folder.resolve(name);
    try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(file))) {
      out.write(text.getBytes(StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return file;
  }
}
