package steelyard.problems.sum;

import org.apache.commons.rng.UniformRandomProvider;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

/** A family of sums: its description beside the method that makes its terms. */
record SumFamily(Profile profile, Reach reach, Generator generator) implements Family<Terms> {

  /** Makes the terms of one problem; the request has been checked against the reach. */
  @FunctionalInterface
  interface Generator {
    double[] terms(Request request, UniformRandomProvider random);
  }

  @Override
  public Problem<Terms> generate(Request request, UniformRandomProvider random) {
    requireReachable(request);
    return new SumProblem(new Terms(generator.terms(request, random)));
  }
}
