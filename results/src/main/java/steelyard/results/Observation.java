package steelyard.results;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One candidate on one problem: a row of {@code errors.csv}. What each column means, with its unit,
 * stands in the schema of that table.
 */
public record Observation(
    String task,
    String family,
    String problem,
    String candidate,
    int size,
    OptionalDouble targetCondition,
    int repeat,
    long seed,
    int precisionBits,
    OptionalDouble condition,
    OptionalDouble componentwiseCondition,
    Optional<Boolean> targetMet,
    Optional<String> dataDigest,
    Optional<String> referenceRoute,
    OptionalDouble referenceBound,
    Status status,
    String detail,
    OptionalDouble backwardError,
    OptionalDouble forwardError,
    OptionalDouble componentwiseBackwardError,
    OptionalDouble componentwiseForwardError,
    OptionalDouble excess,
    Optional<Rounding> rounding,
    Optional<Claim> claim,
    OptionalDouble answer,
    Optional<String> answerDigest) {

  /**
   * A bound that the candidate claims, held against this observation.
   *
   * @param limits which error it limits, such as {@code forward_error}
   * @param bound its value here
   * @param held whether the observed error is within it
   */
  public record Claim(String limits, double bound, boolean held) {}

  /**
   * Says whether this row can be judged: its status is {@code ok} and both its forward error and
   * its condition number are known.
   */
  public boolean isJudged() {
    return status == Status.OK && forwardError.isPresent() && condition.isPresent();
  }
}
