package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.dot.DotProduct;
import steelyard.algorithms.dot.DotProducts;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.dot.DotFamilies;
import steelyard.problems.dot.DotProblem;
import steelyard.problems.dot.Vectors;

/** Binds inner products to pairs of vectors. */
final class DotTask implements Task<DotProduct, Vectors> {

  @Override
  public String id() {
    return "dot";
  }

  @Override
  public String description() {
    return "the inner product of two vectors";
  }

  @Override
  public Class<DotProduct> kernelType() {
    return DotProduct.class;
  }

  @Override
  public DotProduct kernel(Function<List<Data.Part>, double[]> answers) {
    return (x, y) -> answers.apply(new Vectors(x, y).parts())[0];
  }

  @Override
  public List<Candidate<DotProduct>> candidates() {
    return DotProducts.all();
  }

  @Override
  public List<Family<Vectors>> families() {
    return DotFamilies.all();
  }

  @Override
  public List<PartShape> shapes() {
    return List.of(PartShape.vector("x"), PartShape.vector("y"));
  }

  @Override
  public Vectors data(List<Data.Part> parts) {
    return new Vectors(Parts.vector(parts, 0), Parts.vector(parts, 1));
  }

  @Override
  public Problem<Vectors> problem(Vectors data) {
    return new DotProblem(data);
  }

  @Override
  public double[] apply(DotProduct kernel, Vectors data) {
    return new double[] {kernel.dot(data.x(), data.y())};
  }

  @Override
  public void time(DotProduct kernel, Vectors data, Blackhole sink) {
    sink.consume(kernel.dot(data.x(), data.y()));
  }

  @Override
  public int elements(Vectors data) {
    return data.x().length;
  }
}
