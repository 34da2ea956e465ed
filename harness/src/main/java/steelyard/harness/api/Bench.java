package steelyard.harness.api;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import steelyard.algorithms.Candidate;
import steelyard.harness.bring.Bringing;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Catalogue;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.PlanReader;
import steelyard.harness.plan.Weighing;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;

/**
 * What the program was set to.
 *
 * @param tasks the tasks, with the candidates that are objects of this JVM
 * @param objects the names of those candidates
 * @param additions the candidates that are named code
 * @param threads how many problems to work on at a time
 * @param timed whether times are taken where a plan asks for them
 * @param progress hears how far it has come
 * @param isolation where named code is tried
 */
record Bench(
    List<Task<?, ?>> tasks,
    List<Name> objects,
    List<Addition> additions,
    int threads,
    boolean timed,
    Progress progress,
    Bringing.Isolation isolation) {

  /** Copies the lists. */
  Bench {
    tasks = List.copyOf(tasks);
    objects = List.copyOf(objects);
    additions = List.copyOf(additions);
  }

  /** The name of a candidate. */
  record Name(String task, String id) {}

  static Bench ofTheHouse() {
    return new Bench(
        Tasks.all(),
        List.of(),
        List.of(),
        Runtime.getRuntime().availableProcessors(),
        true,
        Progress.SILENT,
        Bringing.Isolation.OWN_JVM);
  }

  /**
   * Returns this with another candidate that is an object.
   *
   * @throws IllegalArgumentException if no task has this interface, or it has such a candidate
   */
  <K> Bench with(Class<K> kernelType, Candidate<K> candidate) {
    List<Task<?, ?>> enlarged = new ArrayList<>();
    List<Name> names = new ArrayList<>(objects);
    for (Task<?, ?> task : tasks) {
      boolean fits = task.kernelType() == kernelType;
      enlarged.add(fits ? enlarged(task, candidate) : task);
      if (fits) {
        names.add(new Name(task.id(), candidate.id()));
      }
    }
    if (names.size() == objects.size()) {
      throw new IllegalArgumentException("no task has the interface " + kernelType.getName());
    }
    return new Bench(enlarged, names, additions, threads, timed, progress, isolation).checked();
  }

  Bench adding(String task, String id, String code, List<Path> jars) {
    List<String> paths =
        jars.stream().map(each -> each.toAbsolutePath().normalize().toString()).toList();
    List<Addition> all = new ArrayList<>(additions);
    all.addAll(Bringing.expanded(List.of(new Addition(task, id, code, paths))));
    return new Bench(tasks, objects, all, threads, timed, progress, isolation).checked();
  }

  Bench withThreads(int other) {
    if (other < 1) {
      throw new IllegalArgumentException("threads must be at least 1, found " + other);
    }
    return new Bench(tasks, objects, additions, other, timed, progress, isolation);
  }

  Bench untimed() {
    return new Bench(tasks, objects, additions, threads, false, progress, isolation);
  }

  Bench reporting(Progress other) {
    return new Bench(tasks, objects, additions, threads, timed, other, isolation);
  }

  Bench isolated(Bringing.Isolation other) {
    return new Bench(tasks, objects, additions, threads, timed, progress, other);
  }

  List<String> candidates(Task<?, ?> task) {
    return Stream.concat(
            task.candidates().stream().<String>map(Candidate::id),
            additions.stream().filter(a -> a.task().equals(task.id())).map(Addition::id))
        .toList();
  }

  PlanReader reader() {
    return new PlanReader(catalogue(), Bringing::expanded);
  }

  /** Returns a plan in which the added candidates take part wherever their task is weighed. */
  Plan extended(Plan plan) {
    Plan with = plan.with(additions);
    return new Plan(
        with.name(),
        with.seed(),
        with.additions(),
        timed ? with.timing() : with.withoutTiming().timing(),
        with.weighings().stream().map(this::extended).toList(),
        with.requirements());
  }

  boolean isObject(String task, String id) {
    return objects.contains(new Name(task, id));
  }

  private Weighing extended(Weighing weighing) {
    List<String> candidates = new ArrayList<>(weighing.candidates());
    for (Name each : objects) {
      if (each.task().equals(weighing.task()) && !candidates.contains(each.id())) {
        candidates.add(each.id());
      }
    }
    return new Weighing(
        weighing.task(),
        weighing.families(),
        candidates,
        weighing.repeats(),
        weighing.time(),
        weighing.timeoutMs());
  }

  private Catalogue catalogue() {
    return Catalogue.of(tasks).with(additions);
  }

  /** A task that has two candidates of one id is found out before anything is run. */
  private Bench checked() {
    catalogue();
    return this;
  }

  // The task's interface is the candidate's, as was compared.
  @SuppressWarnings("unchecked")
  private static <K, D extends Data> Task<K, D> enlarged(Task<?, D> task, Candidate<K> candidate) {
    return ((Task<K, D>) task).with(List.of(candidate));
  }
}
