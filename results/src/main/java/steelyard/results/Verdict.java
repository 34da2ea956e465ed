package steelyard.results;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the observations of a candidate amount to on one family, or on all families of a task: a row
 * of {@code verdicts.csv}. What each column means, with its unit, stands in the schema of that
 * table.
 *
 * @param family the family, or {@link #ALL_FAMILIES}
 * @param elsewhere on the row over all families: the grade over the families on which the candidate
 *     is neither failed nor unstable nor weaker, where that leaves some out and some in
 * @param failedFamilies on the same row: the families on which something failed, space-separated
 * @param unstableFamilies on the same row: the families on which it is unstable, space-separated
 * @param weakerFamily on the same row: the one other family without which the grade is one of
 *     k-fold precision
 * @param problems on how many problems the answer was judged
 * @param failureStatuses how often each failing status occurred, such as {@code nan:3 timeout:1}
 */
public record Verdict(
    String task,
    String candidate,
    String family,
    Grade grade,
    Optional<Grade> elsewhere,
    Optional<String> failedFamilies,
    Optional<String> unstableFamilies,
    Optional<String> weakerFamily,
    int problems,
    int notApplicable,
    int uncertified,
    int failures,
    Optional<String> failureStatuses,
    OptionalDouble minCondition,
    OptionalDouble maxCondition,
    OptionalDouble worstForwardError,
    OptionalDouble medianForwardError,
    OptionalDouble worstBackwardError,
    OptionalDouble worstExcess,
    Optional<String> worstExcessProblem,
    OptionalDouble failsFromCondition,
    Optional<String> failsFromProblem,
    int boundsHeld,
    int boundsBroken,
    Optional<String> firstBrokenProblem) {

  /** The family of the row that spans all families of a task. */
  public static final String ALL_FAMILIES = "all";

  /** Says whether this row spans all families of its task. */
  public boolean spansAllFamilies() {
    return family.equals(ALL_FAMILIES);
  }
}
