package steelyard.harness.input;

import java.util.List;
import java.util.Locale;

/**
 * The first line of a Matrix Market file.
 *
 * @param coordinate whether entries come with their row and column; else all come in order
 * @param symmetry which entries follow from others
 */
record Banner(boolean coordinate, Symmetry symmetry) {

  /** Which entries follow from others. */
  enum Symmetry {
    GENERAL,
    SYMMETRIC,
    SKEW_SYMMETRIC;

    String words() {
      return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
  }

  private static final String MARK = "%%MatrixMarket";
  private static final String RIGHT =
      "'%%MatrixMarket matrix', then coordinate or array, then real or integer, then general,"
          + " symmetric or skew-symmetric";
  private static final int WORDS = 5;

  static Banner parse(String line, Place place) {
    if (line == null || !line.startsWith(MARK)) {
      throw place.fail("a Matrix Market file starts with " + RIGHT);
    }
    String[] words = line.strip().toLowerCase(Locale.ROOT).split("\\s+", -1);
    if (words.length != WORDS) {
      throw place.fail("the first line has " + words.length + " words; it must be " + RIGHT);
    }
    require(words[1], List.of("matrix"), place);
    require(words[2], List.of("coordinate", "array"), place);
    refuse(words[3], "pattern", "holds no values", place);
    refuse(words[3], "complex", "holds complex numbers", place);
    require(words[3], List.of("real", "integer"), place);
    refuse(words[4], "hermitian", "holds complex numbers", place);
    require(words[4], List.of("general", "symmetric", "skew-symmetric"), place);
    return new Banner(
        words[2].equals("coordinate"),
        Symmetry.valueOf(words[4].toUpperCase(Locale.ROOT).replace('-', '_')));
  }

  private static void require(String word, List<String> allowed, Place place) {
    if (!allowed.contains(word)) {
      throw place.fail(NumberText.quoted(word) + " is out of place; the first line is " + RIGHT);
    }
  }

  private static void refuse(String word, String refused, String reason, Place place) {
    if (word.equals(refused)) {
      throw place.fail(
          "a matrix of the kind '"
              + refused
              + "' "
              + reason
              + "; real or integer values are wanted");
    }
  }
}
