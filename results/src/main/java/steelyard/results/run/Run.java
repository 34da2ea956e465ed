package steelyard.results.run;

import java.util.List;
import steelyard.results.Observation;
import steelyard.results.Timing;
import steelyard.results.Tradeoff;
import steelyard.results.Verdict;
import steelyard.results.tradeoff.Tradeoffs;
import steelyard.results.verdict.Verdicts;

/**
 * What executing a plan gave.
 *
 * @param plan the text of the plan as executed
 */
public record Run(
    List<Observation> observations,
    List<Timing> timings,
    List<Tradeoff> tradeoffs,
    List<Verdict> verdicts,
    String plan,
    Provenance provenance) {

  /** Makes a run of what was measured; tradeoffs and verdicts follow from it. */
  public static Run of(
      List<Observation> observations, List<Timing> timings, String plan, Provenance provenance) {
    return new Run(
        List.copyOf(observations),
        List.copyOf(timings),
        Tradeoffs.of(observations, timings),
        Verdicts.of(observations),
        plan,
        provenance);
  }
}
