package steelyard.junit;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import steelyard.results.Observation;

/** What a test asserts. */
interface Check {

  /** The smallest and easiest problem first: what fails there fails for the plainest reason. */
  Comparator<Observation> EASIEST_FIRST =
      Comparator.comparingInt(Observation::size)
          .thenComparingDouble(row -> row.condition().orElse(0));

  /** Returns what is asserted, as it follows "expected the kernel to". */
  String claim();

  /** Returns what contradicts it; nothing if it holds. */
  Optional<Finding> finding(Outcome outcome);

  /**
   * What contradicts an assertion.
   *
   * @param what what is wrong, as it follows "but"
   * @param worst where it shows the most, if it shows on a problem
   * @param allowed what was allowed there; empty where it is no matter of degree
   */
  record Finding(String what, Optional<Observation> worst, String allowed) {

    /** Finds the problems that got no answer, by the candidate's fault. */
    static Optional<Finding> ofFailures(List<Observation> failures, int tried) {
      return failures.stream()
          .min(EASIEST_FIRST)
          .map(
              worst ->
                  new Finding(
                      "it gave no answer to judge on %s of %s problems"
                          .formatted(failures.size(), tried),
                      Optional.of(worst),
                      ""));
    }

    /** Finds that what was tried proves nothing. */
    static Finding ofNothing(String what) {
      return new Finding(what, Optional.empty(), "");
    }
  }
}
