package steelyard.harness.task;

import java.util.List;
import java.util.function.Function;
import org.openjdk.jmh.infra.Blackhole;
import steelyard.algorithms.Candidate;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;

/**
 * The binding of a task's candidates to its problems. Everything else in the harness works on this
 * interface alone.
 *
 * @param <K> the task's interface
 * @param <D> the kind of input
 */
public interface Task<K, D extends Data> {

  /** Returns the short name, lower case letters, digits and hyphens. */
  String id();

  /** Returns one line that says what is computed. */
  String description();

  /** Returns the task's interface, which has one abstract method. */
  Class<?> kernelType();

  /**
   * Returns a kernel that leaves the work to a function.
   *
   * @param answers takes the arrays of an input, named and ordered as {@link Data#parts()} has
   *     them, and returns the answer as {@link #apply} does
   */
  K kernel(Function<List<Data.Part>, double[]> answers);

  /** Returns the candidates; the first is the textbook one, to which times are compared. */
  List<Candidate<K>> candidates();

  /** Returns the families. */
  List<Family<D>> families();

  /** Returns the arrays that an input is made of, in the order of {@link Data#parts()}. */
  List<PartShape> shapes();

  /** Returns an input made of these arrays, named and ordered as {@link Data#parts()} has them. */
  D data(List<Data.Part> parts);

  /**
   * Returns the problem of this input, whoever made it.
   *
   * @throws IllegalArgumentException if the arrays do not fit together, or one is not finite
   * @throws steelyard.problems.UncertifiedException if no reference could be certified
   */
  Problem<D> problem(D data);

  /** Applies a kernel to an input; the answer of a scalar task has one entry. */
  double[] apply(K kernel, D data);

  /** Applies a kernel to an input for its running time alone, and gives the answer to the sink. */
  void time(K kernel, D data, Blackhole sink);

  /**
   * Returns what one call is divided by for a time per element, such as n; 1 where a call is the
   * unit.
   */
  default int elements(D data) {
    return 1;
  }

  /**
   * Returns this task with candidates beside its own.
   *
   * @throws IllegalArgumentException if two have the same id
   */
  default Task<K, D> with(List<Candidate<K>> more) {
    return more.isEmpty() ? this : new Enlarged<>(this, more, List.of());
  }

  /**
   * Returns this task with families beside its own.
   *
   * @throws IllegalArgumentException if two have the same id
   */
  default Task<K, D> withFamilies(List<Family<D>> more) {
    return more.isEmpty() ? this : new Enlarged<>(this, List.of(), more);
  }
}
