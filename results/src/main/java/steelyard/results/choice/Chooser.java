package steelyard.results.choice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import steelyard.results.Observation;
import steelyard.results.Status;
import steelyard.results.Timing;
import steelyard.results.choice.Rejected.Reason;
import steelyard.results.tradeoff.TimeLookup;

/** Finds the fastest candidate that meets a requirement on every problem of a run. */
public final class Chooser {
  private final Requirement requirement;
  private final TimeLookup times;
  private final Map<String, Observation> problems = new LinkedHashMap<>();
  private final List<Qualified> qualified = new ArrayList<>();
  private final List<Rejected> rejected = new ArrayList<>();
  private final List<Inapplicable> inapplicable = new ArrayList<>();

  private Chooser(Requirement requirement, List<Timing> timings) {
    this.requirement = requirement;
    this.times = new TimeLookup(timings);
  }

  /**
   * Chooses. A candidate qualifies if it was tried on every problem of the requirement's size,
   * families and condition numbers, and on each has the status ok and a forward error within the
   * requirement.
   *
   * @throws RequirementException if the run has no such task, family, size or condition number
   */
  public static Choice choose(
      Requirement requirement, List<Observation> observations, List<Timing> timings) {
    Chooser chooser = new Chooser(requirement, timings);
    return chooser.choose(Selection.of(requirement, observations));
  }

  /**
   * Chooses again without the families on which a candidate failed, since one family that cannot
   * occur where the kernel is used must not decide.
   *
   * @param choice what was chosen with them
   * @return the other choice, if there is such a family, others are left, and the outcome differs
   */
  public static Optional<Choice> spared(
      Choice choice, List<Observation> observations, List<Timing> timings) {
    Requirement requirement = choice.requirement();
    List<String> failing =
        Selection.of(requirement, observations).rows().stream()
            .filter(o -> o.status().isFailure())
            .map(Observation::family)
            .distinct()
            .toList();
    if (failing.isEmpty() || failing.size() == choice.families().size()) {
      return Optional.empty();
    }
    Choice other = choose(requirement.without(failing), observations, timings);
    return Optional.of(other).filter(o -> !o.leaders().equals(choice.leaders()));
  }

  private Choice choose(Selection selection) {
    Map<String, List<Observation>> byCandidate = new LinkedHashMap<>();
    Set<String> families = new LinkedHashSet<>();
    double maxCondition = 0;
    for (Observation o : selection.rows()) {
      problems.putIfAbsent(o.problem(), o);
      families.add(o.family());
      maxCondition = Math.max(maxCondition, o.condition().orElseThrow());
      byCandidate.computeIfAbsent(o.candidate(), c -> new ArrayList<>()).add(o);
    }
    byCandidate.forEach(this::place);
    qualified.sort(Comparator.comparingDouble(Qualified::timeOrInfinity));
    return new Choice(
        requirement,
        List.copyOf(families),
        problems.size(),
        maxCondition,
        selection.unplaced(),
        List.copyOf(qualified),
        List.copyOf(rejected),
        List.copyOf(inapplicable),
        times.sizes(requirement.task()));
  }

  private void place(String candidate, List<Observation> rows) {
    List<Observation> notFor =
        rows.stream().filter(o -> o.status() == Status.NOT_APPLICABLE).toList();
    if (!notFor.isEmpty()) {
      inapplicable.add(new Inapplicable(candidate, notFor.size(), notFor.get(0).problem()));
      return;
    }
    Optional<Rejected> rejection = rejection(candidate, rows);
    if (rejection.isPresent()) {
      rejected.add(rejection.get());
    } else {
      qualified.add(qualified(candidate, rows));
    }
  }

  private Optional<Rejected> rejection(String candidate, List<Observation> rows) {
    for (Reason reason : Reason.values()) {
      List<Observation> against =
          reason == Reason.UNTRIED
              ? untried(rows)
              : rows.stream().filter(o -> isAgainst(o, reason)).toList();
      Optional<Observation> worst = against.stream().reduce(Chooser::worse);
      if (worst.isPresent()) {
        return Optional.of(rejected(candidate, reason, worst.get(), against.size()));
      }
    }
    return Optional.empty();
  }

  private static Rejected rejected(String candidate, Reason reason, Observation worst, int count) {
    // Where the candidate was not tried, the observation of the problem is another candidate's.
    Optional<Status> status =
        reason == Reason.UNTRIED ? Optional.empty() : Optional.of(worst.status());
    OptionalDouble error =
        reason == Reason.INACCURATE ? worst.forwardError() : OptionalDouble.empty();
    return new Rejected(candidate, reason, status, error, worst.problem(), count);
  }

  private boolean isAgainst(Observation o, Reason reason) {
    return switch (reason) {
      case FAILED -> o.status().isFailure();
      case INACCURATE ->
          o.isJudged() && !(o.forwardError().orElseThrow() <= requirement.maxForwardError());
      case UNCERTIFIED -> !o.isJudged();
      case UNTRIED -> false;
    };
  }

  private List<Observation> untried(List<Observation> rows) {
    Set<String> tried = new LinkedHashSet<>();
    rows.forEach(o -> tried.add(o.problem()));
    return problems.values().stream().filter(o -> !tried.contains(o.problem())).toList();
  }

  private static Observation worse(Observation a, Observation b) {
    return b.forwardError().orElse(0) > a.forwardError().orElse(0) ? b : a;
  }

  private Qualified qualified(String candidate, List<Observation> rows) {
    Observation worst = rows.stream().reduce(Chooser::worse).orElseThrow();
    double error = worst.forwardError().orElseThrow();
    return new Qualified(
        candidate,
        rows.size(),
        error,
        worst.problem(),
        error == 0 ? Double.POSITIVE_INFINITY : requirement.maxForwardError() / error,
        rows.stream().mapToDouble(o -> o.condition().orElseThrow()).max().orElseThrow(),
        times.find(
            requirement.task(), candidate, requirement.size(), Set.copyOf(requirement.families())));
  }
}
