package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.problems.Data;
import steelyard.problems.Family;

/**
 * A task with candidates beside its own, which stay where they are: the textbook one is still the
 * first.
 *
 * @param <K> the task's interface
 * @param <D> the kind of input
 */
final class Enlarged<K, D extends Data> implements Task<K, D> {

  private final Task<K, D> task;
  private final List<Candidate<K>> candidates;

  Enlarged(Task<K, D> task, List<Candidate<K>> more) {
    this.task = task;
    this.candidates = Stream.concat(task.candidates().stream(), more.stream()).toList();
    List<String> ids = candidates.stream().map(Candidate::id).toList();
    for (Candidate<K> each : more) {
      if (ids.indexOf(each.id()) != ids.lastIndexOf(each.id())) {
        throw new IllegalArgumentException(
            "task '" + task.id() + "' has two candidates named '" + each.id() + "'");
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
    return task.families();
  }

  @Override
  public D data(List<Data.Part> parts) {
    return task.data(parts);
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
