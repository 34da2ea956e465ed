package steelyard.results.verdict;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;
import steelyard.results.ErrorSummary;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.Verdict;

/** Makes one verdict of the observations of one candidate. */
final class VerdictRow {
  private VerdictRow() {}

  /** Judges one family. */
  static Verdict of(String family, List<Observation> rows) {
    return row(family, rows, Optional.empty(), Optional.empty());
  }

  /** Judges all families together, and those on which nothing failed. */
  static Verdict ofAll(Map<String, List<Observation>> families) {
    List<Observation> all = new ArrayList<>();
    List<Observation> unfailed = new ArrayList<>();
    List<String> failed = new ArrayList<>();
    families.forEach(
        (family, rows) -> {
          all.addAll(rows);
          if (Grader.grade(rows) == Grade.FAILED) {
            failed.add(family);
          } else {
            unfailed.addAll(rows);
          }
        });
    return row(
        Verdict.ALL_FAMILIES,
        all,
        failed.isEmpty() || unfailed.isEmpty()
            ? Optional.empty()
            : Optional.of(Grader.grade(unfailed)),
        failed.isEmpty() ? Optional.empty() : Optional.of(String.join(" ", failed)));
  }

  private static Verdict row(
      String family,
      List<Observation> rows,
      Optional<Grade> elsewhere,
      Optional<String> failedFamilies) {
    Grade grade = Grader.grade(rows);
    ErrorSummary errors = ErrorSummary.of(rows);
    boolean unstable = grade == Grade.UNSTABLE || elsewhere.equals(Optional.of(Grade.UNSTABLE));
    Optional<Observation> failsFrom = unstable ? failsFrom(rows) : Optional.empty();
    List<BrokenBound> broken = BrokenBound.in(rows);
    int failures = count(rows.stream().filter(o -> o.status().isFailure()).count());
    int judged = count(rows.stream().filter(Observation::isJudged).count());
    int notApplicable =
        count(rows.stream().filter(o -> o.status() == Status.NOT_APPLICABLE).count());
    return new Verdict(
        rows.get(0).task(),
        rows.get(0).candidate(),
        family,
        grade,
        elsewhere,
        failedFamilies,
        judged,
        notApplicable,
        rows.size() - judged - notApplicable - failures,
        failures,
        statuses(rows),
        conditions(rows).min(),
        conditions(rows).max(),
        errors.worstForwardError(),
        errors.medianForwardError(),
        errors.worstBackwardError(),
        errors.worstExcess(),
        errors.worstExcessProblem(),
        failsFrom.map(Observation::condition).orElse(OptionalDouble.empty()),
        failsFrom.map(Observation::problem),
        count(rows.stream().filter(o -> o.claim().isPresent()).count()) - broken.size(),
        broken.size(),
        broken.stream().map(BrokenBound::problem).findFirst());
  }

  private static int count(long count) {
    return Math.toIntExact(count);
  }

  private static DoubleStream conditions(List<Observation> rows) {
    return rows.stream()
        .filter(o -> o.isJudged() || o.status().isFailure())
        .flatMapToDouble(o -> o.condition().stream());
  }

  private static Optional<Observation> failsFrom(List<Observation> rows) {
    return rows.stream()
        .filter(Observation::isJudged)
        .filter(o -> !ForwardStableRule.holds(o))
        .min(Comparator.comparingDouble(o -> o.condition().orElseThrow()));
  }

  private static Optional<String> statuses(List<Observation> rows) {
    String text =
        Arrays.stream(Status.values())
            .filter(Status::isFailure)
            .map(status -> countOf(status, rows))
            .flatMap(Optional::stream)
            .collect(Collectors.joining(" "));
    return Optional.of(text).filter(t -> !t.isEmpty());
  }

  private static Optional<String> countOf(Status status, List<Observation> rows) {
    long count = rows.stream().filter(o -> o.status() == status).count();
    return count == 0 ? Optional.empty() : Optional.of(status.text() + ":" + count);
  }
}
