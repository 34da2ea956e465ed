package steelyard.results.text;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/**
 * What someone who mistyped a name probably meant: the known name at the smallest edit distance,
 * counting an insertion, a deletion, a substitution or a swap of neighbours as one edit (Damerau,
 * "A technique for computer detection and correction of spelling errors", 1964, in its restricted
 * form in which no letter takes part in two edits).
 */
public final class NearestName {

  private NearestName() {}

  /** Returns the nearest known name, unless more than a third of the letters would be wrong. */
  public static Optional<String> of(String wanted, Collection<String> known) {
    return known.stream()
        .min(Comparator.comparingInt(name -> distance(wanted, name)))
        .filter(
            name ->
                3 * distance(wanted, name)
                    <= Math.max(4, Math.max(wanted.length(), name.length())));
  }

  /** Returns the end of a sentence about an unknown name: what was meant, or what is known. */
  public static String hint(String wanted, Collection<String> known) {
    return of(wanted, known)
        .map(name -> "did you mean '" + name + "'?")
        .orElseGet(() -> "known are: " + String.join(", ", known));
  }

  static int distance(String left, String right) {
    int[][] edits = new int[left.length() + 1][right.length() + 1];
    for (int i = 0; i <= left.length(); i++) {
      for (int j = 0; j <= right.length(); j++) {
        edits[i][j] = i == 0 || j == 0 ? i + j : cheapest(edits, left, right, i, j);
      }
    }
    return edits[left.length()][right.length()];
  }

  private static int cheapest(int[][] edits, String left, String right, int i, int j) {
    int substitution = left.charAt(i - 1) == right.charAt(j - 1) ? 0 : 1;
    int least = Math.min(edits[i - 1][j], edits[i][j - 1]) + 1;
    least = Math.min(least, edits[i - 1][j - 1] + substitution);
    boolean swapped =
        i > 1
            && j > 1
            && left.charAt(i - 1) == right.charAt(j - 2)
            && left.charAt(i - 2) == right.charAt(j - 1);
    return swapped ? Math.min(least, edits[i - 2][j - 2] + 1) : least;
  }
}
