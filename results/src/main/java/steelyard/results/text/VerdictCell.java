package steelyard.results.text;

import java.util.ArrayList;
import java.util.List;
import steelyard.results.Grade;
import steelyard.results.Verdict;

/** A verdict in a few words, with what it must not hide. */
final class VerdictCell {
  /** What a broken bound is called. */
  static final String BROKEN = "bound broken";

  private VerdictCell() {}

  private static final int MOST_NAMED = 4;

  /**
   * Returns words such as {@code backward stable; unstable on wilkinson-growth}.
   *
   * @param families how many families the candidate is for
   */
  static String text(Verdict verdict, int families) {
    List<String> parts = new ArrayList<>();
    verdict.elsewhere().ifPresent(grade -> parts.add(grade.words()));
    boolean split =
        verdict.elsewhere().isPresent()
            || (verdict.failedFamilies().isPresent() && verdict.unstableFamilies().isPresent());
    if (split) {
      verdict.weakerFamily().ifPresent(name -> parts.add("less on " + name));
      verdict.unstableFamilies().ifPresent(names -> parts.add(on(Grade.UNSTABLE, names, families)));
      verdict.failedFamilies().ifPresent(names -> parts.add(on(Grade.FAILED, names, families)));
    } else {
      parts.add(verdict.grade().words());
    }
    if (verdict.boundsBroken() > 0) {
      parts.add(BROKEN + " on " + verdict.boundsBroken());
    }
    if (verdict.notApplicable() > 0 && verdict.grade() != Grade.NOT_APPLICABLE) {
      int count = verdict.notApplicable();
      parts.add("not for " + count + (count == 1 ? " problem" : " problems"));
    }
    if (verdict.uncertified() > 0) {
      parts.add(verdict.uncertified() + " uncertified");
    }
    return String.join("; ", parts);
  }

  private static String on(Grade grade, String named, int families) {
    List<String> names = List.of(named.split(" ", -1));
    return grade.words()
        + " on "
        + (names.size() > MOST_NAMED
            ? names.size() + " of " + families + " families"
            : String.join(", ", names));
  }
}
