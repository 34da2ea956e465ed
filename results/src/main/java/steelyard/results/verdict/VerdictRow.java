package steelyard.results.verdict;

import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
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

  /** The families on which a candidate comes to grief, and its grade over the others. */
  private record Exceptions(
      Optional<Grade> elsewhere,
      Optional<String> failed,
      Optional<String> unstable,
      Optional<String> weaker) {
    static final Exceptions NONE =
        new Exceptions(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
  }

  /** Judges one family. */
  static Verdict of(String family, List<Observation> rows) {
    return row(family, rows, Exceptions.NONE);
  }

  /** Judges all families together, and those on which nothing goes wrong. */
  static Verdict ofAll(Map<String, List<Observation>> families) {
    Map<String, List<Observation>> settled = new LinkedHashMap<>(families);
    List<String> failed = take(settled, Grade.FAILED);
    List<String> unstable = take(settled, Grade.UNSTABLE);
    Optional<String> weaker = weaker(settled);
    weaker.ifPresent(settled::remove);
    boolean split = settled.size() < families.size() && !settled.isEmpty();
    return row(
        Verdict.ALL_FAMILIES,
        union(families),
        new Exceptions(
            split ? Optional.of(Grader.grade(union(settled))) : Optional.empty(),
            joined(failed),
            joined(unstable),
            weaker));
  }

  private static List<String> take(Map<String, List<Observation>> families, Grade grade) {
    List<String> taken =
        families.keySet().stream()
            .filter(family -> Grader.grade(families.get(family)) == grade)
            .toList();
    taken.forEach(families::remove);
    return taken;
  }

  /**
   * Returns the one family that hides the multiple precision which the others prove. A grade of
   * k-fold precision needs evidence, so that no family is left out for being the hard one.
   */
  private static Optional<String> weaker(Map<String, List<Observation>> families) {
    if (families.size() < 2 || Grader.grade(union(families)).compareTo(Grade.BACKWARD_STABLE) < 0) {
      return Optional.empty();
    }
    for (String family : families.keySet()) {
      Map<String, List<Observation>> others = new LinkedHashMap<>(families);
      others.remove(family);
      if (Grader.grade(union(others)).folds().isPresent()) {
        return Optional.of(family);
      }
    }
    return Optional.empty();
  }

  private static List<Observation> union(Map<String, List<Observation>> families) {
    return families.values().stream().flatMap(List::stream).toList();
  }

  private static Optional<String> joined(List<String> families) {
    return families.isEmpty() ? Optional.empty() : Optional.of(String.join(" ", families));
  }

  private static Verdict row(String family, List<Observation> rows, Exceptions exceptions) {
    Grade grade = Grader.grade(rows);
    ErrorSummary errors = ErrorSummary.of(rows);
    boolean unstable = grade == Grade.UNSTABLE || exceptions.unstable().isPresent();
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
        exceptions.elsewhere(),
        exceptions.failed(),
        exceptions.unstable(),
        exceptions.weaker(),
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
        .filter(o -> new ForwardStableRule().used(o) > 1)
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
