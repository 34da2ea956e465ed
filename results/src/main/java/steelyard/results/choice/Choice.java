package steelyard.results.choice;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import steelyard.results.choice.Rejected.Reason;

/**
 * The answer to a requirement.
 *
 * @param families of the problems that were looked at
 * @param problems how many problems were looked at
 * @param maxCondition the largest condition number among them
 * @param unplaced how many observations were left out because no condition number is known
 * @param qualified fastest first; those without a time last
 * @param rejected in the order of the observations
 * @param inapplicable candidates that are not for some of the problems, and cannot win therefore
 * @param timedSizes the sizes of the task for which any time was measured
 */
public record Choice(
    Requirement requirement,
    List<String> families,
    int problems,
    double maxCondition,
    int unplaced,
    List<Qualified> qualified,
    List<Rejected> rejected,
    List<Inapplicable> inapplicable,
    List<Integer> timedSizes) {

  /** Returns the fastest candidate that qualifies; none where none does or none was timed. */
  public Optional<Qualified> winner() {
    return qualified.stream().findFirst().filter(q -> q.timing().isPresent());
  }

  /** Returns the winner, or all that qualify where the fastest is not known. */
  List<String> leaders() {
    return winner().isPresent()
        ? List.of(winner().get().candidate())
        : qualified.stream().map(Qualified::candidate).toList();
  }

  /** Returns the next fastest candidate that qualifies and was timed. */
  public Optional<Qualified> runnerUp() {
    return qualified.stream().skip(1).findFirst().filter(q -> q.timing().isPresent());
  }

  /** Returns the other candidates whose time cannot be told apart from the winner's. */
  public List<Qualified> tied() {
    return qualified.stream()
        .skip(1)
        .filter(other -> winner().filter(other::tiesWith).isPresent())
        .toList();
  }

  /** Returns, where none qualifies, the inaccurate candidate with the smallest worst error. */
  public Optional<Rejected> nearestMiss() {
    return rejected.stream()
        .filter(r -> qualified.isEmpty() && r.reason() == Reason.INACCURATE)
        .min(Comparator.comparingDouble(r -> r.error().orElseThrow()));
  }
}
