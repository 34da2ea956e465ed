package steelyard.problems.solve;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

/**
 * A family of linear systems: what it is, and the generator of its systems.
 *
 * @param profile what it is, for readers
 * @param reach what it can make
 * @param generator makes one system
 */
record SystemFamily(Profile profile, Reach reach, Generator generator)
    implements Family<LinearSystem> {

  /** Makes one system. */
  @FunctionalInterface
  interface Generator {
    /** Makes one system for a request within the reach. */
    LinearSystem make(Request request, UniformRandomProvider random);
  }

  @Override
  public Problem<LinearSystem> generate(Request request, UniformRandomProvider random) {
    requireReachable(request);
    return SystemProblem.of(generator.make(request, random));
  }
}
