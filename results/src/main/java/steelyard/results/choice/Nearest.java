package steelyard.results.choice;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the name that a mistyped one was meant to be. */
final class Nearest {
  private Nearest() {}

  /** Returns the known name with the fewest changed letters, if at most half of them changed. */
  static Optional<String> to(String typed, Collection<String> known) {
    return known.stream()
        .min(Comparator.comparingInt(name -> distance(typed, name)))
        .filter(name -> 2 * distance(typed, name) <= Math.max(typed.length(), name.length()));
  }

  /** Levenshtein's distance (1966): insertions, deletions and substitutions. */
  private static int distance(String a, String b) {
    int[] previous = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      previous[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] current = new int[b.length() + 1];
      current[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int substitution = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        current[j] = Math.min(substitution, 1 + Math.min(previous[j], current[j - 1]));
      }
      previous = current;
    }
    return previous[b.length()];
  }
}
