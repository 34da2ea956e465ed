package steelyard.harness.input;

import java.util.BitSet;
import steelyard.harness.input.Banner.Symmetry;

/**
 * A matrix in the Matrix Market exchange formats: coordinate or array, real or integer, general,
 * symmetric or skew-symmetric. A coordinate matrix becomes a dense one.
 *
 * @see <a href="https://doi.org/10.6028/NIST.IR.5935">Boisvert, Pozo and Remington, The Matrix
 *     Market Exchange Formats: Initial Design, NISTIR 5935, 1996</a>
 */
final class MatrixMarketFile {

  private final Banner banner;
  private final MarketWords words;
  private final InexactTally tally = new InexactTally();
  private double[][] rows;
  private int columns;

  private MatrixMarketFile(Lines lines) {
    this.banner = Banner.parse(lines.next(), lines.place(1));
    this.words = new MarketWords(lines);
  }

  /**
   * Reads a matrix.
   *
   * @throws InputException if it is of another kind, too large, or something is wrong with it
   */
  static Grid read(Lines lines) {
    MatrixMarketFile file = new MatrixMarketFile(lines);
    file.makeRoom();
    if (file.banner.coordinate()) {
      file.readCoordinates();
    } else {
      file.readArray();
    }
    file.words.endOfFile();
    return new Grid(file.rows, file.tally.inexact());
  }

  private void makeRoom() {
    String what = "the number of rows";
    int rowCount = words.whole(words.wordOnNewLine(what), what, 1, NumberList.MAX_NUMBERS);
    what = "the number of columns";
    columns = words.whole(words.word(what), what, 1, NumberList.MAX_NUMBERS);
    String shape = rowCount + " by " + columns;
    if ((long) rowCount * columns > NumberList.MAX_NUMBERS) {
      throw words
          .here()
          .fail(
              "a matrix of "
                  + shape
                  + " has too many entries; it may have "
                  + NumberList.MAX_NUMBERS
                  + ", zeros included");
    }
    if (banner.symmetry() != Symmetry.GENERAL && rowCount != columns) {
      throw words
          .here()
          .fail("a " + banner.symmetry().words() + " matrix is square, but this one is " + shape);
    }
    rows = new double[rowCount][columns];
  }

  private void readCoordinates() {
    String what = "the number of entries";
    int count = words.whole(words.word(what), what, 0, rows.length * columns);
    BitSet seen = new BitSet(rows.length * columns);
    for (int k = 1; k <= count; k++) {
      String row = words.wordOnNewLine("entry " + k + " of " + count);
      Place place = words.here();
      int i = words.whole(row, "a row", 1, rows.length) - 1;
      int j = words.whole(words.word("a column"), "a column", 1, columns) - 1;
      requireStored(i, j, place);
      if (seen.get(i * columns + j)) {
        throw place.fail("the entry " + at(i, j) + " stands here again; it may stand but once");
      }
      seen.set(i * columns + j);
      set(i, j, words.word("the value of the entry " + at(i, j)));
    }
    words.endOfLine();
  }

  private void readArray() {
    words.endOfLine();
    for (int j = 0; j < columns; j++) {
      for (int i = firstStored(j); i < rows.length; i++) {
        set(i, j, words.wordOnAnyLine("the entry " + at(i, j)));
      }
    }
  }

  private void set(int i, int j, String text) {
    double value = tally.read(text, words.here());
    rows[i][j] = value;
    if (i != j && banner.symmetry() != Symmetry.GENERAL) {
      rows[j][i] = banner.symmetry() == Symmetry.SYMMETRIC ? value : -value;
    }
  }

  private int firstStored(int column) {
    return switch (banner.symmetry()) {
      case GENERAL -> 0;
      case SYMMETRIC -> column;
      case SKEW_SYMMETRIC -> column + 1;
    };
  }

  private void requireStored(int i, int j, Place place) {
    if (i < firstStored(j)) {
      throw place.fail(
          "a "
              + banner.symmetry().words()
              + " matrix stores what lies "
              + (banner.symmetry() == Symmetry.SYMMETRIC ? "on or " : "")
              + "below the diagonal, but this is the entry "
              + at(i, j));
    }
  }

  private static String at(int i, int j) {
    return "(" + (i + 1) + ", " + (j + 1) + ")";
  }
}
