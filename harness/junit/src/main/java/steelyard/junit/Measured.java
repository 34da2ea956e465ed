package steelyard.junit;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.opentest4j.AssertionFailedError;
import steelyard.algorithms.Candidate;
import steelyard.harness.api.Steelyard;
import steelyard.harness.plan.PlanException;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Verdict;
import steelyard.results.run.Run;
import steelyard.results.verdict.Verdicts;

/** What kernels did on the problems of a trial. */
final class Measured<K> {
  private final Trial trial;
  private final Witness<K> witness;
  private final Run run;

  private Measured(Trial trial, Witness<K> witness, Run run) {
    this.trial = trial;
    this.witness = witness;
    this.run = run;
  }

  static <K> Measured<K> of(Class<K> kernelType, Trial trial, List<Candidate<K>> candidates) {
    Steelyard steelyard = Steelyard.standard().withoutTiming();
    for (Candidate<K> each : candidates) {
      steelyard = steelyard.with(kernelType, each);
    }
    Witness<K> witness = Witness.of(kernelType, candidates);
    List<String> ids = candidates.stream().map(Candidate::id).toList();
    try {
      return new Measured<>(trial, witness, steelyard.runText(trial.plan(witness.taskId(), ids)));
    } catch (PlanException wrong) {
      // Where it stands in a plan that nobody wrote is of no help.
      throw new IllegalArgumentException(
          wrong.getMessage().replaceFirst("^plan(:\\d+)*: ", ""), wrong);
    }
  }

  List<Observation> rows(String candidate) {
    return run.observations().stream().filter(row -> row.candidate().equals(candidate)).toList();
  }

  List<String> families() {
    return run.observations().stream().map(Observation::family).distinct().toList();
  }

  Grade grade(String candidate) {
    return run.verdicts().stream()
        .filter(verdict -> verdict.candidate().equals(candidate))
        .filter(Verdict::spansAllFamilies)
        .findFirst()
        .map(Verdict::grade)
        .orElse(Grade.UNJUDGED);
  }

  /** Returns the largest forward error on a family; infinite where there is none, or a failure. */
  double worst(String candidate, String family) {
    List<Observation> rows =
        rows(candidate).stream().filter(row -> row.family().equals(family)).toList();
    boolean isWhole = rows.stream().noneMatch(row -> row.status().isFailure());
    return isWhole
        ? rows.stream()
            .flatMapToDouble(row -> row.forwardError().stream())
            .max()
            .orElse(Double.POSITIVE_INFINITY)
        : Double.POSITIVE_INFINITY;
  }

  /** Says whether one observation alone is worse than a grade. */
  boolean isWorse(Observation row, Grade grade) {
    return Verdicts.of(List.of(row)).get(0).grade().compareTo(grade) > 0;
  }

  /** Fails if there was no problem that could be judged, or one without an answer. */
  void requireAnswers(String candidate) {
    if (rows(candidate).stream().noneMatch(row -> row.isJudged() || row.status().isFailure())) {
      throw new AssertionFailedError(
          "Expected "
              + witness.name(candidate)
              + " to be tried, but nothing was judged on "
              + trial.text());
    }
    require(candidate, "to answer every problem", row -> !row.status().isFailure());
  }

  /** Fails if something does not hold on a problem. */
  void require(String candidate, String expectation, Predicate<Observation> holds) {
    if (!rows(candidate).stream().allMatch(holds)) {
      throw failure(candidate, expectation + ", but it does not", holds.negate());
    }
  }

  /** Returns the failure, with the worst of the problems that are to blame. */
  AssertionFailedError failure(
      String candidate, String expectation, Predicate<Observation> isToBlame) {
    List<Observation> rows = rows(candidate);
    Optional<Observation> worst =
        worst(rows.stream().filter(isToBlame).toList()).or(() -> worst(rows));
    long judged = rows.stream().filter(Observation::isJudged).count();
    return new AssertionFailedError(
        "Expected "
            + witness.name(candidate)
            + " "
            + expectation
            + ".\n"
            + worst.map(witness::text).orElse("")
            + "  tried         "
            + judged
            + " problems judged of "
            + rows.size()
            + ": "
            + trial.text());
  }

  private static Optional<Observation> worst(List<Observation> rows) {
    return rows.stream()
        .max(
            Comparator.<Observation, Boolean>comparing(row -> row.status().isFailure())
                .thenComparingDouble(row -> row.excess().orElse(0))
                .thenComparingDouble(row -> row.backwardError().orElse(0)));
  }
}
