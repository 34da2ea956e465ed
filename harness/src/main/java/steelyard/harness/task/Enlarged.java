package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;

/**
 * A task with candidates or families beside its own, which stay where they are: the textbook
 * candidate is still the first.
 *
 * @param <K> the task's interface
 * @param <D> the kind of input
 */
final class Enlarged<K, D extends Data> implements Task<K, D> {

  private final Task<K, D> task;
  private final List<Candidate<K>> candidates;
  private final List<Family<D>> families;

  Enlarged(Task<K, D> task, List<Candidate<K>> candidates, List<Family<D>> families) {
    this.task = task;
    this.candidates = joined(task.candidates(), candidates);
    this.families = joined(task.families(), families);
    requireDistinct("candidates", this.candidates.stream().map(Candidate::id).toList());
    requireDistinct("families", this.families.stream().map(each -> each.profile().id()).toList());
  }

  private static <T> List<T> joined(List<T> own, List<T> more) {
    return Stream.concat(own.stream(), more.stream()).toList();
  }

  private void requireDistinct(String kind, List<String> ids) {
    for (String id : ids) {
      if (ids.indexOf(id) != ids.lastIndexOf(id)) {
        throw new IllegalArgumentException(
            "task '" + task.id() + "' has two " + kind + " named '" + id + "'");
      }
    }
  }

  @Override
  public String id() {
    return task.id();
  }

  @Override
  public String description() {
    return task.description();
  }

  @Override
  public Class<?> kernelType() {
    return task.kernelType();
  }

  @Override
  public K kernel(Function<List<Data.Part>, double[]> answers) {
    return task.kernel(answers);
  }

  @Override
  public List<Candidate<K>> candidates() {
    return candidates;
  }

  @Override
  public List<Family<D>> families() {
    return families;
  }

  @Override
  public List<PartShape> shapes() {
    return task.shapes();
  }

  @Override
  public D data(List<Data.Part> parts) {
    return task.data(parts);
  }

  @Override
  public Problem<D> problem(D data) {
    return task.problem(data);
  }

  @Override
  public double[] apply(K kernel, D data) {
    return task.apply(kernel, data);
  }

  @Override
  public void time(K kernel, D data, Blackhole sink) {
    task.time(kernel, data, sink);
  }

  @Override
  public int elements(D data) {
    return task.elements(data);
  }
}
