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

  /** Returns words such as {@code backward stable; failed on overflow}. */
  static String text(Verdict verdict) {
    List<String> parts = new ArrayList<>();
    verdict.elsewhere().ifPresent(grade -> parts.add(grade.words()));
    if (verdict.grade() == Grade.FAILED) {
      parts.add(failed(verdict));
    } else {
      parts.add(verdict.grade().words());
    }
    if (verdict.boundsBroken() > 0) {
      parts.add(BROKEN + " on " + verdict.boundsBroken());
    }
    if (verdict.notApplicable() > 0 && verdict.grade() != Grade.NOT_APPLICABLE) {
      parts.add("not for " + verdict.notApplicable());
    }
    if (verdict.uncertified() > 0) {
      parts.add(verdict.uncertified() + " uncertified");
    }
    return String.join("; ", parts);
  }

  private static String failed(Verdict verdict) {
    String where =
        verdict.elsewhere().isPresent()
            ? " on " + verdict.failedFamilies().orElse("").replace(" ", ", ")
            : "";
    return Grade.FAILED.words() + where;
  }
}
