package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.solve.LinearSolver;
import steelyard.algorithms.solve.LinearSolvers;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.solve.LinearSystem;
import steelyard.problems.solve.SystemFamilies;
import steelyard.problems.solve.SystemProblem;

/** Binds linear solvers to square systems. */
final class SolveTask implements Task<LinearSolver, LinearSystem> {

  /** The certificate of a larger system takes minutes where it is ill-conditioned. */
  private static final int LARGEST_SIZE = 1000;

  @Override
  public String id() {
    return "solve";
  }

  @Override
  public String description() {
    return "the solution of a square system of linear equations";
  }

  @Override
  public Class<LinearSolver> kernelType() {
    return LinearSolver.class;
  }

  @Override
  public LinearSolver kernel(Function<List<Data.Part>, double[]> answers) {
    return (a, b) -> answers.apply(new LinearSystem(a, b).parts());
  }

  @Override
  public List<Candidate<LinearSolver>> candidates() {
    return LinearSolvers.all();
  }

  @Override
  public List<Family<LinearSystem>> families() {
    return SystemFamilies.all();
  }

  @Override
  public List<PartShape> shapes() {
    return List.of(PartShape.matrix("a", LARGEST_SIZE), PartShape.vector("b", LARGEST_SIZE));
  }

  @Override
  public LinearSystem data(List<Data.Part> parts) {
    return new LinearSystem(Parts.matrix(parts, 0), Parts.vector(parts, 1));
  }

  @Override
  public Problem<LinearSystem> problem(LinearSystem data) {
    return SystemProblem.of(data);
  }

  @Override
  public double[] apply(LinearSolver kernel, LinearSystem data) {
    return kernel.solve(data.a(), data.b());
  }

  @Override
  public void time(LinearSolver kernel, LinearSystem data, Blackhole sink) {
    sink.consume(kernel.solve(data.a(), data.b()));
  }
}
