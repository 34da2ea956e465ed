package steelyard.results.choice;

import java.util.Optional;
import java.util.OptionalDouble;
import steelyard.results.Status;

/**
 * A candidate that does not meet a requirement.
 *
 * @param reason why not
 * @param status the status on the problem, unless it was not tried there
 * @param error its forward error on the problem, where that is the reason
 * @param problem the worst of the problems that disqualify it
 * @param count on how many problems the reason holds
 */
public record Rejected(
    String candidate,
    Reason reason,
    Optional<Status> status,
    OptionalDouble error,
    String problem,
    int count) {

  /** Why a candidate does not qualify, gravest first. */
  public enum Reason {
    /** It gave no answer that could be judged. */
    FAILED,
    /** Its error is larger than required. */
    INACCURATE,
    /** The reference could not tell its error. */
    UNCERTIFIED,
    /** Others were tried on the problem and it was not. */
    UNTRIED
  }
}
