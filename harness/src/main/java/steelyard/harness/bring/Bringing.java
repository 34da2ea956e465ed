package steelyard.harness.bring;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import steelyard.algorithms.Candidate;
import steelyard.harness.plan.Addition;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.results.text.NearestName;

/**
 * Tasks with the candidates of a plan beside their own. As long as it is open, the candidates from
 * outside can be called.
 */
public final class Bringing implements AutoCloseable {
  private static final String SERVICES = "services";

  private final Isolation isolation;
  private final List<JvmPool> pools = new ArrayList<>();
  private final List<Task<?, ?>> tasks = new ArrayList<>();

  /** Where candidates from outside run during the accuracy phase. */
  public enum Isolation {
    /** Each in a JVM of its own. */
    OWN_JVM,
    /** In the JVM of the harness, which is quicker, and at its mercy. */
    SAME_JVM
  }

  /**
   * Finds and checks the code of every addition, and starts what it runs in.
   *
   * @param tasks the tasks
   * @param additions what to add to them, as {@link #expanded} returns them
   * @param isolation where they run
   * @param threads how many calls there may be at a time
   * @throws BringException if one cannot be a candidate
   */
  public Bringing(
      List<Task<?, ?>> tasks, List<Addition> additions, Isolation isolation, int threads) {
    this.isolation = isolation;
    try {
      for (Task<?, ?> task : tasks) {
        this.tasks.add(
            enlarged(
                task, additions.stream().filter(each -> each.task().equals(task.id())).toList()));
      }
      pools.forEach(pool -> pool.fill(threads));
    } catch (RuntimeException failed) {
      close();
      throw failed;
    }
  }

  /**
   * Returns the additions with every one that stands for several replaced by those.
   *
   * @throws BringException if a task is unknown, or jars provide no such service
   */
  public static List<Addition> expanded(List<Addition> additions) {
    List<Addition> result = new ArrayList<>();
    for (Addition addition : additions) {
      Task<?, ?> task = taskNamed(addition.task());
      if (addition.use().strip().equals(SERVICES)) {
        result.addAll(Services.expand(addition, task.kernelType()));
      } else {
        result.add(addition);
      }
    }
    return List.copyOf(result);
  }

  /** Returns the tasks, those with additions enlarged. */
  public List<Task<?, ?>> tasks() {
    return List.copyOf(tasks);
  }

  static Task<?, ?> taskNamed(String id) {
    List<String> known = Tasks.all().stream().<String>map(Task::id).toList();
    return Tasks.find(id)
        .orElseThrow(
            () ->
                new BringException(
                    "there is no task '" + id + "'; " + NearestName.hint(id, known)));
  }

  private <K, D extends Data> Task<K, D> enlarged(Task<K, D> task, List<Addition> additions) {
    List<Candidate<K>> candidates = new ArrayList<>();
    for (Addition addition : additions) {
      try {
        candidates.add(candidate(task, addition));
      } catch (BringException wrong) {
        throw new BringException(
            "candidate " + task.id() + ":" + addition.id() + ": " + wrong.getMessage(), wrong);
      }
    }
    return task.with(candidates);
  }

  private <K, D extends Data> Candidate<K> candidate(Task<K, D> task, Addition addition) {
    FoundCode code = found(task, addition);
    return Candidate.of(
            addition.id(),
            isolation == Isolation.SAME_JVM
                ? KernelMaker.make(task, code, false)
                : task.kernel(pool(addition)),
            addition.use(),
            "not stated",
            addition.jars().isEmpty() ? "the class path" : String.join(", ", addition.jars()))
        .inPrecision(code.precisionBits());
  }

  private Function<List<Data.Part>, double[]> pool(Addition addition) {
    JvmPool pool = new JvmPool(addition);
    pools.add(pool);
    return pool;
  }

  private static FoundCode found(Task<?, ?> task, Addition addition) {
    return new CodeFinder(Jars.loader(addition.jars()), task.kernelType())
        .find(CodeName.parse(addition.use()));
  }

  /**
   * Makes the kernel of an addition in this JVM.
   *
   * @param keepsInput as {@link KernelMaker#make} has it
   * @throws BringException if its code does not fit
   */
  public static <K> K kernel(Task<K, ?> task, Addition addition, boolean keepsInput) {
    return KernelMaker.make(task, found(task, addition), keepsInput);
  }

  /** Ends the JVMs of the candidates. */
  @Override
  public void close() {
    pools.forEach(JvmPool::close);
  }
}
