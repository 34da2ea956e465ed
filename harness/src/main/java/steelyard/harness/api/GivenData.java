package steelyard.harness.api;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

/**
 * The family whose one problem is an input that a caller handed over.
 *
 * @param problem the problem
 * @param <D> the kind of input
 */
record GivenData<D extends Data>(Problem<D> problem) implements Family<D> {

  private static final String ID = "given";

  @Override
  public Profile profile() {
    return new Profile(ID, "your own data", "none", "the caller");
  }

  @Override
  public Reach reach() {
    return Reach.uncontrolled(problem.size(), problem.size());
  }

  @Override
  public Problem<D> generate(Request request, UniformRandomProvider random) {
    requireReachable(request);
    return problem;
  }
}
