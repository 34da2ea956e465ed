package steelyard.problems.dot;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

/** A family of dot products: its description beside the method that makes its vectors. */
record DotFamily(Profile profile, Reach reach, Generator generator) implements Family<Vectors> {

  /** Makes the vectors of one problem; the request has been checked against the reach. */
  @FunctionalInterface
  interface Generator {
    Vectors vectors(Request request, UniformRandomProvider random);
  }

  @Override
  public Problem<Vectors> generate(Request request, UniformRandomProvider random) {
    requireReachable(request);
    return new DotProblem(generator.vectors(request, random));
  }
}
