package steelyard.harness.bring;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import java.util.stream.Stream;
import steelyard.algorithms.Candidate;
import steelyard.harness.plan.Addition;
import steelyard.harness.run.Mishap;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.results.Status;
import steelyard.results.text.NearestName;

/**
 * Tasks with the candidates of a plan beside their own. As long as it is open, the candidates from
 * outside can be called.
 */
public final class Bringing implements AutoCloseable {
  private static final String SERVICES = "services";

  private final Isolation isolation;
  private final List<ServantPool> pools = new ArrayList<>();
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
    Optional<ProgramCommand> command = ProgramCommand.find(addition.use());
    if (command.isPresent()) {
      List<String> words = command.get().words();
      Function<List<Data.Part>, double[]> pool =
          pool(() -> ProgramProcess.start(addition.task(), words));
      return candidate(
          addition, task.kernel(oneNumberIfScalar(task, pool)), "the program " + words.get(0));
    }
    if (NativeFunction.isNative(addition.use())) {
      NativeFunction function =
          NativeFunction.parse(addition.use(), Signature.of(task.kernelType()));
      return candidate(
          addition,
          isolated(task, addition, () -> kernel(task, addition, false)),
          "the shared library " + function.library().getFileName());
    }
    FoundCode code = found(task, addition);
    return candidate(
            addition,
            isolated(task, addition, () -> KernelMaker.make(task, code, false)),
            addition.jars().isEmpty() ? "the class path" : String.join(", ", addition.jars()))
        .inPrecision(code.precisionBits());
  }

  private static <K> Candidate<K> candidate(Addition addition, K kernel, String source) {
    return Candidate.of(addition.id(), kernel, addition.use(), "not stated", source);
  }

  private <K> K isolated(Task<K, ?> task, Addition addition, Supplier<K> here) {
    return isolation == Isolation.SAME_JVM
        ? here.get()
        : task.kernel(pool(() -> CandidateProcess.start(addition)));
  }

  /** Says whether a candidate from outside can be timed: a program answers through pipes. */
  public static boolean isTimed(Addition addition) {
    return !ProgramCommand.isProgram(addition.use());
  }

  /** Returns what a JVM must be told that is to run a candidate from outside. */
  public static Stream<String> jvmFlags(Addition addition) {
    return NativeFunction.isNative(addition.use())
        ? Stream.of("--enable-native-access=ALL-UNNAMED")
        : Stream.empty();
  }

  private static Function<List<Data.Part>, double[]> oneNumberIfScalar(
      Task<?, ?> task, Function<List<Data.Part>, double[]> answers) {
    if (!Signature.of(task.kernelType()).isScalar()) {
      return answers;
    }
    return parts -> {
      double[] answer = answers.apply(parts);
      if (answer.length != 1) {
        throw new Mishap(
            Status.MALFORMED, "the program gave " + answer.length + " numbers, not one");
      }
      return answer;
    };
  }

  private Function<List<Data.Part>, double[]> pool(Supplier<Servant> starter) {
    ServantPool pool = new ServantPool(starter);
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
    if (NativeFunction.isNative(addition.use())) {
      Signature signature = Signature.of(task.kernelType());
      NativeFunction function = NativeFunction.parse(addition.use(), signature);
      return task.kernel(new NativeAnswers(function, signature, keepsInput));
    }
    return KernelMaker.make(task, found(task, addition), keepsInput);
  }

  /** Ends the JVMs of the candidates. */
  @Override
  public void close() {
    pools.forEach(ServantPool::close);
  }
}
