package steelyard.harness.plan;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Gets the text of a plan from a file, and refuses what cannot be a plan. */
final class PlanText {

  private static final int MAX_BYTES = 1 << 20;
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private PlanText() {}

  static String of(Path file) {
    if (Files.isDirectory(file)) {
      throw new PlanException(file + " is a directory, where a plan is a TOML file");
    }
    try (InputStream in = Files.newInputStream(file)) {
      byte[] bytes = in.readNBytes(MAX_BYTES + 1);
      if (bytes.length > MAX_BYTES) {
        throw new PlanException(file + " is larger than 1 MiB, the most that a plan may have");
      }
      return decoded(file, bytes);
    } catch (NoSuchFileException e) {
      throw new PlanException("there is no file " + file, e);
    } catch (IOException e) {
      throw new PlanException(file + " cannot be read: it must be a readable TOML file", e);
    }
  }

  private static String decoded(Path file, byte[] bytes) {
    for (int i = 0; i < bytes.length; i++) {
      if (bytes[i] == 0) {
        throw new PlanException(
            file + " is no text: it has a zero byte at offset " + i + ", where a plan is TOML");
      }
    }
    ByteBuffer buffer = ByteBuffer.wrap(bytes);
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(buffer).toString();
      return text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
    } catch (CharacterCodingException e) {
      throw new PlanException(
          file + " is not UTF-8, as TOML must be: see the byte at offset " + buffer.position(), e);
    }
  }
}
