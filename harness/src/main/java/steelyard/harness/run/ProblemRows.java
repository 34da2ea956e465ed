package steelyard.harness.run;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.algorithms.Bound;
import steelyard.algorithms.Candidate;
import steelyard.harness.data.DataDigest;
import steelyard.problems.Condition;
import steelyard.problems.Data;
import steelyard.problems.Judgement;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.results.Observation;
import steelyard.results.Rounding;
import steelyard.results.Status;

/** Turns what candidates did with one problem into rows, with the problem's own judgement. */
final class ProblemRows<K, D extends Data> {

  /**
   * A claimed bound is evaluated in double arithmetic, a handful of operations; an observation
   * within this relative distance of it is not called a violation.
   */
  private static final double EVALUATION_ALLOWANCE = 0x1p-40;

  private static final double CALIBRATION_FACTOR = 2;

  private static final String TOO_VAGUE =
      "the reference is certified, but its bound is too coarse to tell the error of this answer";

  private final Assignment<K, D> assignment;
  private final Problem<D> problem;
  private final String digest;

  ProblemRows(Assignment<K, D> assignment, Problem<D> problem) {
    this.assignment = assignment;
    this.problem = problem;
    this.digest = DataDigest.of(problem.data());
  }

  Problem<D> problem() {
    return problem;
  }

  boolean covers(Candidate<K> candidate) {
    return candidate.scope().covers(problem.traits(), problem.size());
  }

  Observation row(Candidate<K> candidate, Attempt attempt) {
    if (attempt.status() != Status.OK) {
      return row(candidate, attempt.status(), attempt.detail(), Optional.empty(), null);
    }
    Judgement judgement = problem.judge(attempt.answer());
    boolean isVague = judgement.standing() == Judgement.Standing.UNCERTIFIED;
    return row(
        candidate,
        status(judgement.standing()),
        isVague ? TOO_VAGUE : attempt.detail(),
        Optional.of(judgement),
        attempt.answer());
  }

  /** Returns the row of a problem that has no certified reference. */
  static <K, D extends Data> Observation uncertified(
      Assignment<K, D> assignment, Candidate<K> candidate, String sentence) {
    ProblemId id = assignment.id();
    return new Observation(
        id.task(),
        id.family(),
        id.toString(),
        candidate.id(),
        id.size(),
        id.condition(),
        id.repeat(),
        id.seed(),
        candidate.precisionBits(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        Status.UNCERTIFIED,
        sentence,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.empty(),
        Optional.empty());
  }

  private Observation row(
      Candidate<K> candidate,
      Status status,
      String detail,
      Optional<Judgement> judged,
      double[] answer) {
    ProblemId id = assignment.id();
    Condition condition = problem.condition();
    Optional<Judgement> errors = judged.filter(j -> j.standing() == Judgement.Standing.OK);
    return new Observation(
        id.task(),
        id.family(),
        id.toString(),
        candidate.id(),
        problem.size(),
        id.condition(),
        id.repeat(),
        id.seed(),
        candidate.precisionBits(),
        OptionalDouble.of(condition.kappa()),
        condition.componentwise(),
        targetMet(id.condition(), condition.kappa()),
        Optional.of(digest),
        Optional.of(problem.reference().route()),
        OptionalDouble.of(problem.reference().relativeBound()),
        status,
        detail,
        value(errors.map(Judgement::backwardError)),
        value(errors.map(Judgement::forwardError)),
        errors.map(Judgement::componentwiseBackwardError).orElse(OptionalDouble.empty()),
        errors.map(Judgement::componentwiseForwardError).orElse(OptionalDouble.empty()),
        errors
            .map(j -> excess(j, condition, unitRoundoff(candidate)))
            .orElse(OptionalDouble.empty()),
        errors.map(j -> Rounding.valueOf(j.rounding().name())),
        errors.flatMap(j -> claim(candidate, j)),
        answer != null && answer.length == 1
            ? OptionalDouble.of(answer[0])
            : OptionalDouble.empty(),
        answer == null
            ? Optional.empty()
            : Optional.of(DataDigest.of(List.of(new Data.Vector("answer", answer)))));
  }

  private static OptionalDouble value(Optional<Double> value) {
    return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
  }

  private static Optional<Boolean> targetMet(OptionalDouble target, double achieved) {
    if (target.isEmpty()) {
      return Optional.empty();
    }
    double wanted = target.getAsDouble();
    return Optional.of(
        achieved >= wanted / CALIBRATION_FACTOR && achieved <= wanted * CALIBRATION_FACTOR);
  }

  /** Where the condition number is infinite, no answer is worse than conditioning explains. */
  private static OptionalDouble excess(
      Judgement judgement, Condition condition, double unitRoundoff) {
    double explained = Math.max(condition.kappa(), 1) * unitRoundoff;
    return Double.isInfinite(explained)
        ? OptionalDouble.empty()
        : OptionalDouble.of(judgement.forwardError() / explained);
  }

  private Optional<Observation.Claim> claim(Candidate<K> candidate, Judgement judgement) {
    return candidate
        .bound()
        .filter(bound -> problem.traits().containsAll(bound.traits()))
        .flatMap(bound -> claim(bound, judgement, unitRoundoff(candidate)));
  }

  private Optional<Observation.Claim> claim(Bound bound, Judgement judgement, double unitRoundoff) {
    OptionalDouble observed =
        switch (bound.limits()) {
          case FORWARD_ERROR -> OptionalDouble.of(judgement.forwardError());
          case BACKWARD_ERROR -> OptionalDouble.of(judgement.backwardError());
          case COMPONENTWISE_BACKWARD_ERROR -> judgement.componentwiseBackwardError();
        };
    if (observed.isEmpty()) {
      return Optional.empty();
    }
    double allowed = bound.formula().at(problem.size(), problem.condition().kappa(), unitRoundoff);
    boolean held = observed.getAsDouble() <= allowed * (1 + EVALUATION_ALLOWANCE);
    return Optional.of(
        new Observation.Claim(bound.limits().name().toLowerCase(Locale.ROOT), allowed, held));
  }

  private static double unitRoundoff(Candidate<?> candidate) {
    return Math.scalb(1.0, -candidate.precisionBits());
  }

  private static Status status(Judgement.Standing standing) {
    return switch (standing) {
      case OK -> Status.OK;
      case NAN -> Status.NAN;
      case INFINITE -> Status.INFINITE;
      case MALFORMED -> Status.MALFORMED;
      case UNCERTIFIED -> Status.UNCERTIFIED;
    };
  }
}
