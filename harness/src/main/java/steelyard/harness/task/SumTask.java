package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.sum.Summation;
import steelyard.algorithms.sum.Summations;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.sum.SumFamilies;
import steelyard.problems.sum.SumProblem;
import steelyard.problems.sum.Terms;

/** Binds summations to arrays of terms. */
final class SumTask implements Task<Summation, Terms> {

  @Override
  public String id() {
    return "sum";
  }

  @Override
  public String description() {
    return "the sum of the terms of an array";
  }

  @Override
  public Class<Summation> kernelType() {
    return Summation.class;
  }

  @Override
  public Summation kernel(Function<List<Data.Part>, double[]> answers) {
    return terms -> answers.apply(new Terms(terms).parts())[0];
  }

  @Override
  public List<Candidate<Summation>> candidates() {
    return Summations.all();
  }

  @Override
  public List<Family<Terms>> families() {
    return SumFamilies.all();
  }

  @Override
  public List<PartShape> shapes() {
    return List.of(PartShape.vector("terms"));
  }

  @Override
  public Terms data(List<Data.Part> parts) {
    return new Terms(Parts.vector(parts, 0));
  }

  @Override
  public Problem<Terms> problem(Terms data) {
    return new SumProblem(data);
  }

  @Override
  public double[] apply(Summation kernel, Terms data) {
    return new double[] {kernel.sum(data.values())};
  }

  @Override
  public void time(Summation kernel, Terms data, Blackhole sink) {
    sink.consume(kernel.sum(data.values()));
  }

  @Override
  public int elements(Terms data) {
    return data.values().length;
  }
}
