package steelyard.results.verdict;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import steelyard.results.Observation;
import steelyard.results.Verdict;

/**
 * The verdicts of a run: one per candidate and family, then one over all families of the task. The
 * row over all families applies the same rules to the observations of all families together: its
 * grade is the best that holds on every one of them. A failure on any family makes it failed, and
 * no limit that is broken on a family can hold over all; yet it may be better than the grade of a
 * family, where only all problems together are many enough, or hard enough, to prove anything.
 */
public final class Verdicts {
  private record Candidate(String task, String id) {}

  private Verdicts() {}

  /**
   * Judges the candidates, in the order in which the observations first name them.
   *
   * @param observations of any tasks and candidates
   */
  public static List<Verdict> of(List<Observation> observations) {
    Map<Candidate, Map<String, List<Observation>>> byFamily = new LinkedHashMap<>();
    for (Observation o : observations) {
      byFamily
          .computeIfAbsent(new Candidate(o.task(), o.candidate()), c -> new LinkedHashMap<>())
          .computeIfAbsent(o.family(), f -> new ArrayList<>())
          .add(o);
    }
    List<Verdict> verdicts = new ArrayList<>();
    for (Map<String, List<Observation>> families : byFamily.values()) {
      families.forEach((family, rows) -> verdicts.add(VerdictRow.of(family, rows)));
      verdicts.add(VerdictRow.ofAll(families));
    }
    return verdicts;
  }
}
