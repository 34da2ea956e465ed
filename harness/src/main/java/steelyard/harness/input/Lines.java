package steelyard.harness.input;

import java.io.BufferedInputStream;
import java.io.BufferedReader;
import java.io.EOFException;
import java.io.FileInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipException;

/**
 * The lines of a text file, one at a time, unpacked where the file is compressed by gzip. What is
 * no text, and what would not fit in memory, is refused in a sentence.
 */
final class Lines implements AutoCloseable {

  /** The most characters of a line. */
  static final int MAX_LINE = 1 << 20;

  /** The most characters of a file, once unpacked. */
  static final long MAX_TEXT = 1L << 30;

  private static final int GZIP_MAGIC_1 = 0x1F;
  private static final int GZIP_MAGIC_2 = 0x8B;
  private static final int BYTE_ORDER_MARK = '\uFEFF';
  private static final int END = -1;

  private final String file;
  private final Reader reader;
  private int number;
  private long characters;
  private int ahead;

  private Lines(String file, Reader reader) throws IOException {
    this.file = file;
    this.reader = reader;
    ahead = reader.read();
    if (ahead == BYTE_ORDER_MARK) {
      ahead = reader.read();
    }
  }

  /**
   * Opens a file, or a pipe: a channel would want to seek in it.
   *
   * @throws InputException if it is none that can be read
   */
  static Lines of(Path file) {
    if (Files.isDirectory(file)) {
      throw new InputException(file + " is a directory, where a file with data is wanted");
    }
    if (!Files.exists(file)) {
      throw new InputException("there is no file " + file);
    }
    if (!Files.isReadable(file)) {
      throw new InputException(file + " may not be read; its owner must allow it");
    }
    InputStream in = null;
    try {
      in = new BufferedInputStream(new FileInputStream(file.toFile()));
      Reader reader =
          new InputStreamReader(
              unpacked(in),
              StandardCharsets.UTF_8
                  .newDecoder()
                  .onMalformedInput(CodingErrorAction.REPORT)
                  .onUnmappableCharacter(CodingErrorAction.REPORT));
      return new Lines(file.toString(), new BufferedReader(reader));
    } catch (IOException e) {
      closeQuietly(in);
      throw unreadable(file.toString(), 1, e);
    }
  }

  /** Returns the next line without its end, or null after the last one. */
  String next() {
    if (ahead == END) {
      return null;
    }
    number++;
    StringBuilder line = new StringBuilder();
    try {
      int c = ahead;
      while (c != END && c != '\n' && c != '\r') {
        if (c == 0) {
          throw place(line.length() + 1)
              .fail("there is a zero byte, so this is no text; write the numbers as UTF-8 text");
        }
        if (line.length() == MAX_LINE) {
          throw place(line.length() + 1)
              .fail("the line is longer than " + MAX_LINE + " characters; break it into several");
        }
        line.append((char) c);
        c = reader.read();
      }
      ahead = c == END ? END : reader.read();
      if (c == '\r' && ahead == '\n') {
        ahead = reader.read();
      }
    } catch (IOException e) {
      throw unreadable(file, number, e);
    }
    characters += line.length() + 1;
    if (characters > MAX_TEXT) {
      throw place(1).fail("the file has more than " + MAX_TEXT + " characters up to here");
    }
    return line.toString();
  }

  /** Returns a place in the line that was read last; line 1 before the first. */
  Place place(int column) {
    return new Place(file, Math.max(1, number), column);
  }

  String file() {
    return file;
  }

  @Override
  public void close() {
    closeQuietly(reader);
  }

  private static InputStream unpacked(InputStream in) throws IOException {
    in.mark(2);
    boolean packed = in.read() == GZIP_MAGIC_1 && in.read() == GZIP_MAGIC_2;
    in.reset();
    return packed ? new GZIPInputStream(in, 1 << 16) : in;
  }

  private static InputException unreadable(String file, int line, IOException cause) {
    String sentence;
    if (cause instanceof CharacterCodingException) {
      sentence = file + ":" + line + ": near this line the file is not UTF-8, as it must be";
    } else if (cause instanceof ZipException || cause instanceof EOFException) {
      sentence = file + " is no whole gzip file: it is damaged or cut off after line " + line;
    } else {
      sentence = file + " cannot be read: it must be a readable file";
    }
    return new InputException(sentence, cause);
  }

  /** Nothing was written, so a failure to close loses nothing. */
  private static void closeQuietly(AutoCloseable resource) {
    if (resource != null) {
      try {
        resource.close();
      } catch (Exception ignored) {
        return;
      }
    }
  }
}
