package steelyard.results.text;

import java.util.ArrayList;
import java.util.List;
import steelyard.results.table.GuardedText;

/**
 * A table of plain text with aligned columns. Where it would be too wide, the cells of its widest
 * wrapping columns take several lines.
 */
public final class TextTable {
  private static final String GAP = "  ";
  private static final int NARROWEST = 10;

  /** On which side of a column its cells stand. */
  public enum Align {
    /** For text. */
    LEFT,
    /** For numbers. */
    RIGHT
  }

  /**
   * The head of a column.
   *
   * @param wraps whether its cells may be broken into several lines
   */
  public record Heading(String title, Align align, boolean wraps) {
    /** A column of text that may be broken into lines. */
    public static Heading text(String title) {
      return new Heading(title, Align.LEFT, true);
    }

    /** A column of numbers. */
    public static Heading number(String title) {
      return new Heading(title, Align.RIGHT, false);
    }
  }

  private final List<Heading> headings;
  private final List<List<String>> rows = new ArrayList<>();

  /** Starts a table. */
  public TextTable(List<Heading> headings) {
    this.headings = List.copyOf(headings);
  }

  /**
   * Adds a row; control characters in its cells are made visible.
   *
   * @throws IllegalArgumentException if there is not one cell per column
   */
  public void add(List<String> cells) {
    if (cells.size() != headings.size()) {
      throw new IllegalArgumentException(
          "A row needs " + headings.size() + " cells, not " + cells.size() + ".");
    }
    rows.add(cells.stream().map(GuardedText::visible).toList());
  }

  /** Returns the lines, each ended by a line feed, without spaces at their ends. */
  public String render(int maxWidth) {
    return render(maxWidth, Paint.NONE);
  }

  /**
   * Returns the lines, each ended by a line feed.
   *
   * @param paint adds what takes no room, such as colour, to a row that is already laid out
   */
  public String render(int maxWidth, Paint paint) {
    int[] widths = widths(maxWidth);
    StringBuilder out = new StringBuilder();
    append(out, headings.stream().map(Heading::title).toList(), widths, Paint.NONE);
    for (List<String> row : rows) {
      append(out, row, widths, paint);
    }
    return out.toString();
  }

  private int[] widths(int maxWidth) {
    int[] widths = new int[headings.size()];
    for (int i = 0; i < widths.length; i++) {
      widths[i] = titleWidth(headings.get(i).title());
      for (List<String> row : rows) {
        widths[i] = Math.max(widths[i], DisplayWidth.of(row.get(i)));
      }
    }
    while (total(widths) > maxWidth && shrinkWidest(widths)) {
      // One column narrower each time, until the table fits or nothing can give way.
    }
    return widths;
  }

  /** A long title may take two lines even where the cells may not be broken. */
  private static int titleWidth(String title) {
    if (title.length() <= NARROWEST) {
      return DisplayWidth.of(title);
    }
    int width = 2;
    for (String word : title.split(" ", -1)) {
      width = Math.max(width, DisplayWidth.of(word));
    }
    while (Wrap.lines(title, width).size() > 2) {
      width++;
    }
    return width;
  }

  private static int total(int[] widths) {
    int total = GAP.length() * (widths.length - 1);
    for (int width : widths) {
      total += width;
    }
    return total;
  }

  private boolean shrinkWidest(int[] widths) {
    int widest = -1;
    for (int i = 0; i < widths.length; i++) {
      if (headings.get(i).wraps()
          && widths[i] > NARROWEST
          && (widest < 0 || widths[i] > widths[widest])) {
        widest = i;
      }
    }
    if (widest >= 0) {
      widths[widest]--;
    }
    return widest >= 0;
  }

  private void append(StringBuilder out, List<String> cells, int[] widths, Paint paint) {
    List<List<String>> lines = new ArrayList<>();
    int height = 0;
    for (int i = 0; i < widths.length; i++) {
      lines.add(Wrap.lines(cells.get(i), Math.max(2, widths[i])));
      height = Math.max(height, lines.get(i).size());
    }
    for (int y = 0; y < height; y++) {
      StringBuilder line = new StringBuilder();
      for (int x = 0; x < widths.length; x++) {
        String text = y < lines.get(x).size() ? lines.get(x).get(y) : "";
        String pad = " ".repeat(Math.max(0, widths[x] - DisplayWidth.of(text)));
        line.append(x == 0 ? "" : GAP);
        line.append(headings.get(x).align() == Align.LEFT ? text + pad : pad + text);
      }
      out.append(paint.paint(cells, line.toString().stripTrailing())).append('\n');
    }
  }

  /** Adds what takes no room to a line of a row. */
  @FunctionalInterface
  public interface Paint {
    /** Adds nothing. */
    Paint NONE = (cells, line) -> line;

    /**
     * Returns the line with what was added.
     *
     * @param cells the row
     * @param line one line of it, laid out
     */
    String paint(List<String> cells, String line);
  }
}
