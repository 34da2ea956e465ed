package steelyard.results.table;

import java.io.FilterReader;
import java.io.IOException;
import java.io.Reader;

/** A reader that remembers whether the text ends with a line break. */
final class LastCharacter extends FilterReader {
  private int last = '\n';

  LastCharacter(Reader in) {
    super(in);
  }

  @Override
  public int read() throws IOException {
    int c = super.read();
    last = c < 0 ? last : c;
    return c;
  }

  @Override
  public int read(char[] buffer, int offset, int length) throws IOException {
    int count = super.read(buffer, offset, length);
    last = count > 0 ? buffer[offset + count - 1] : last;
    return count;
  }

  boolean endsLine() {
    return last == '\n';
  }
}
