package steelyard.harness.bring;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** The lines of a stream that may be endless, and so may its lines: what is too long is cut. */
final class BoundedLines {
  private static final int LONGEST = 4096;

  private final InputStream in;

  BoundedLines(InputStream in) {
    this.in = new BufferedInputStream(in);
  }

  /** Returns the next line; empty at the end of the stream. */
  Optional<String> next() throws IOException {
    byte[] line = new byte[LONGEST];
    int length = 0;
    int next = in.read();
    if (next < 0) {
      return Optional.empty();
    }
    while (next >= 0 && next != '\n') {
      if (length < LONGEST) {
        line[length++] = (byte) next;
      }
      next = in.read();
    }
    return Optional.of(new String(line, 0, length, StandardCharsets.UTF_8).stripTrailing());
  }
}
