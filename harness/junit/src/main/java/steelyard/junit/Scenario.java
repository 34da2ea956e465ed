package steelyard.junit;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import steelyard.harness.data.DoubleText;
import steelyard.harness.execution.Workbench;
import steelyard.harness.plan.PlanException;
import steelyard.harness.task.PartShape;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;

/**
 * Which problems are tried.
 *
 * @param families the families, in this order
 * @param named whether the test names them; a named family must reach the sizes that are asked for
 * @param conditionUpTo the largest condition number
 * @param sizes the sizes
 * @param repeats problems alike
 * @param seed from which all randomness comes
 * @param timeout the longest that one call may take
 * @param <D> the kind of input
 */
record Scenario<D extends Data>(
    List<Family<D>> families,
    boolean named,
    double conditionUpTo,
    Optional<List<Integer>> sizes,
    int repeats,
    long seed,
    Duration timeout) {

  private static final double CONDITION = 1e12;
  private static final int REPEATS_OF_MATRICES = 1;
  private static final int REPEATS_OF_VECTORS = 3;
  private static final long SEED = 1;
  private static final Duration TIMEOUT = Duration.ofSeconds(2);

  /** The work on a matrix grows with the cube of its size. */
  private static final List<Integer> SIZES_OF_MATRICES = List.of(5, 20);

  private static final List<Integer> SIZES_OF_VECTORS = List.of(10, 100, 1000);

  static <D extends Data> Scenario<D> usual(Task<?, D> task) {
    return new Scenario<>(
        task.families(),
        false,
        CONDITION,
        Optional.empty(),
        hasMatrix(task) ? REPEATS_OF_MATRICES : REPEATS_OF_VECTORS,
        SEED,
        TIMEOUT);
  }

  Scenario<D> on(Task<?, D> task, List<String> ids) {
    require(!ids.isEmpty(), "name at least one family");
    List<Family<D>> chosen = ids.stream().distinct().map(id -> family(task, id)).toList();
    return new Scenario<>(chosen, true, conditionUpTo, sizes, repeats, seed, timeout);
  }

  Scenario<D> except(Task<?, D> task, List<String> ids) {
    ids.forEach(id -> family(task, id));
    List<Family<D>> left =
        families.stream().filter(each -> !ids.contains(each.profile().id())).toList();
    return new Scenario<>(left, named, conditionUpTo, sizes, repeats, seed, timeout);
  }

  Scenario<D> upToCondition(double largest) {
    require(
        largest >= 1 && largest <= Double.MAX_VALUE,
        "the largest condition number must be finite and at least 1, found "
            + DoubleText.shortest(largest));
    return new Scenario<>(families, named, largest, sizes, repeats, seed, timeout);
  }

  Scenario<D> sizes(List<Integer> wanted) {
    require(!wanted.isEmpty(), "name at least one size");
    wanted.forEach(size -> require(size >= 1, "a size must be at least 1, found " + size));
    return new Scenario<>(
        families, named, conditionUpTo, Optional.of(wanted), repeats, seed, timeout);
  }

  Scenario<D> repeats(int count) {
    require(count >= 1, "repeats must be at least 1, found " + count);
    return new Scenario<>(families, named, conditionUpTo, sizes, count, seed, timeout);
  }

  Scenario<D> seed(long other) {
    return new Scenario<>(families, named, conditionUpTo, sizes, repeats, other, timeout);
  }

  Scenario<D> timeout(Duration longest) {
    require(!longest.isNegative() && !longest.isZero(), "the timeout must be above zero");
    return new Scenario<>(families, named, conditionUpTo, sizes, repeats, seed, longest);
  }

  /** Returns the sizes that are wanted of every family. */
  List<Integer> sizesFor(Task<?, D> task) {
    return sizes.orElse(hasMatrix(task) ? SIZES_OF_MATRICES : SIZES_OF_VECTORS);
  }

  private static boolean hasMatrix(Task<?, ?> task) {
    return task.shapes().stream().anyMatch(PartShape::matrix);
  }

  private static <D extends Data> Family<D> family(Task<?, D> task, String id) {
    try {
      return new Workbench(List.of(task)).family(task, id);
    } catch (PlanException unknown) {
      throw new IllegalArgumentException(unknown.getMessage(), unknown);
    }
  }

  private static void require(boolean condition, String sentence) {
    if (!condition) {
      throw new IllegalArgumentException(sentence);
    }
  }
}
