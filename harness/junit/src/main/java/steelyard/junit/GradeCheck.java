package steelyard.junit;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import steelyard.results.Grade;
import steelyard.results.Observation;
import steelyard.results.Verdict;
import steelyard.results.text.Figures;
import steelyard.results.verdict.Allowances;
import steelyard.results.verdict.GradeLimit;
import steelyard.results.verdict.Verdicts;

/**
 * That the verdict is at least a grade.
 *
 * @param limit the grade with its limit
 */
record GradeCheck(GradeLimit limit) implements Check {

  @Override
  public String claim() {
    return "be at least " + limit.grade().words();
  }

  @Override
  public Optional<Finding> finding(Outcome outcome) {
    List<Observation> judged = outcome.judged();
    if (!outcome.failures().isEmpty()) {
      return Finding.ofFailures(outcome.failures(), judged.size() + outcome.failures().size());
    }
    Grade verdict = verdict(outcome);
    if (verdict.compareTo(limit.grade()) <= 0) {
      return Optional.empty();
    }
    List<Observation> broken = judged.stream().filter(row -> limit.used(row) > 1).toList();
    if (broken.isEmpty()) {
      return Optional.of(
          Finding.ofNothing(
              "the problems tried are too few, or too easy, to prove it; "
                  + (limit.grade().folds().isPresent()
                      ? "try a larger condition number with upToCondition"
                      : "try more of them with repeats")));
    }
    Observation worst =
        broken.stream()
            .max(
                Comparator.<Observation>comparingDouble(limit::used)
                    .thenComparingDouble(row -> row.forwardError().orElse(0)))
            .orElseThrow();
    return Optional.of(
        new Finding(
            "it is "
                + verdict.words()
                + ": "
                + broken.size()
                + " of "
                + judged.size()
                + " problems break it",
            Optional.of(worst),
            allowed(worst)));
  }

  private static Grade verdict(Outcome outcome) {
    return Verdicts.of(outcome.own()).stream()
        .filter(Verdict::spansAllFamilies)
        .map(Verdict::grade)
        .findFirst()
        .orElse(Grade.UNJUDGED);
  }

  private String allowed(Observation worst) {
    double stable = Allowances.c(worst.size()) * Allowances.unitRoundoff(worst.precisionBits());
    return switch (limit.grade()) {
      case CORRECTLY_ROUNDED -> "the double nearest to the exact answer";
      case FAITHFUL -> "one of the two doubles around the exact answer";
      case BACKWARD_STABLE -> "a backward error of at most " + Figures.error(stable);
      case FORWARD_STABLE ->
          "a forward error of at most "
              + Figures.error(stable * Math.max(1, worst.condition().orElse(1)));
      default ->
          "a forward error of at most "
              + Figures.error(worst.forwardError().orElse(0) / limit.used(worst));
    };
  }
}
