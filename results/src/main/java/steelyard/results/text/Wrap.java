package steelyard.results.text;

import java.util.ArrayList;
import java.util.List;

/** Breaks a text into lines: between words, and within a word only where it is too long alone. */
public final class Wrap {
  private Wrap() {}

  /**
   * Returns at least one line.
   *
   * @param width the columns of a line, at least 2
   */
  public static List<String> lines(String text, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" ", -1)) {
      String rest = word;
      boolean joins = line.length() > 0;
      if (joins && DisplayWidth.of(line + " " + rest) <= width) {
        line.append(' ').append(rest);
        continue;
      }
      if (joins) {
        lines.add(line.toString());
        line.setLength(0);
      }
      while (DisplayWidth.of(rest) > width) {
        int cut = prefix(rest, width);
        lines.add(rest.substring(0, cut));
        rest = rest.substring(cut);
      }
      line.append(rest);
    }
    lines.add(line.toString());
    return lines;
  }

  private static int prefix(String text, int width) {
    int used = 0;
    int end = 0;
    while (end < text.length()) {
      int c = text.codePointAt(end);
      used += DisplayWidth.of(c);
      if (used > width) {
        break;
      }
      end += Character.charCount(c);
    }
    return end;
  }
}
