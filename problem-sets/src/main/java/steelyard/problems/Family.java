package steelyard.problems;

import org.apache.commons.rng.UniformRandomProvider;

/**
 * A generator of problems of one task.
 *
 * @param <D> the kind of input
 */
public interface Family<D extends Data> {

  /** Returns what the family is, for readers. */
  Profile profile();

  /** Returns the condition numbers and sizes that it can make. */
  Reach reach();

  /**
   * Makes one problem.
   *
   * @param request what is wanted; inside {@link #reach()}
   * @param random the only source of randomness
   * @throws UnreachableException if the request lies outside {@link #reach()}
   * @throws UncertifiedException if no reference could be certified
   */
  Problem<D> generate(Request request, UniformRandomProvider random);

  /**
   * Checks that a request lies inside {@link #reach()}, which generators do first.
   *
   * @throws UnreachableException if it does not
   */
  default void requireReachable(Request request) {
    Reach reach = reach();
    if (request.size() < reach.minSize() || request.size() > reach.maxSize()) {
      throw new UnreachableException(
          "family '%s' makes sizes from %s to %s, but size %s is wanted"
              .formatted(profile().id(), reach.minSize(), reach.maxSize(), request.size()));
    }
    double condition = request.condition();
    double most = reach.maxConditionAt(request.size());
    if (!(condition >= 1 && condition <= most)) {
      throw new UnreachableException(
          "family '%s' makes condition numbers from 1 to %s at size %s, but %s is wanted"
              .formatted(
                  profile().id(),
                  ConditionText.of(most),
                  request.size(),
                  ConditionText.of(condition)));
    }
  }

  /**
   * What a family is, for readers.
   *
   * @param id short name, lower case letters, digits and hyphens; unique within the task
   * @param purpose one line: what it brings out in a candidate
   * @param knob what the target condition number sets; "none" for a family without one
   * @param source where the construction was published, or "own construction" and what it is
   */
  record Profile(String id, String purpose, String knob, String source) {}

  /**
   * What is wanted of one problem.
   *
   * @param condition the target condition number; 1 for a family without a knob
   * @param size n
   */
  record Request(double condition, int size) {}
}
