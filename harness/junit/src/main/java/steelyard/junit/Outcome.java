package steelyard.junit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import steelyard.results.Observation;
import steelyard.results.Status;

/**
 * What came of an experiment.
 *
 * @param rows the rows of every candidate on every problem that counts
 * @param subject the id of the candidate under test
 * @param aboveCondition problems that were left out, as their condition number came out larger than
 *     was asked for
 * @param stopped whether a call that did not return ended it early
 */
record Outcome(List<Observation> rows, String subject, int aboveCondition, boolean stopped) {

  /** Returns the rows of the candidate under test. */
  List<Observation> own() {
    return of(subject);
  }

  /** Returns the rows of a candidate. */
  List<Observation> of(String candidate) {
    return rows.stream().filter(row -> row.candidate().equals(candidate)).toList();
  }

  /** Returns the rows in which the candidate under test gave an answer that was judged. */
  List<Observation> judged() {
    return own().stream().filter(Observation::isJudged).toList();
  }

  /** Returns the rows in which it gave none, by its own fault. */
  List<Observation> failures() {
    return own().stream().filter(row -> row.status().isFailure()).toList();
  }

  /** Returns how many problems it was tried on, by family. */
  Map<String, Long> triedByFamily() {
    return own().stream()
        .filter(row -> row.isJudged() || row.status().isFailure())
        .collect(
            Collectors.groupingBy(Observation::family, LinkedHashMap::new, Collectors.counting()));
  }

  /** Says why problems do not count, if some do not. */
  Optional<String> leftOut() {
    String reasons =
        List.of(
                reason(count(Status.NOT_APPLICABLE), "outside the candidate's scope"),
                reason(count(Status.UNCERTIFIED), "without a certified answer"),
                reason(aboveCondition, "of a larger condition number"))
            .stream()
            .flatMap(Optional::stream)
            .collect(Collectors.joining(", "));
    return reasons.isEmpty() ? Optional.empty() : Optional.of(reasons);
  }

  private long count(Status status) {
    return own().stream().filter(row -> row.status() == status).count();
  }

  private static Optional<String> reason(long count, String words) {
    return count == 0 ? Optional.empty() : Optional.of(count + " " + words);
  }
}
