package steelyard.harness.api;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import steelyard.algorithms.Candidate;
import steelyard.harness.bring.Bringing;
import steelyard.harness.execution.Execution;
import steelyard.harness.execution.FileWeighing;
import steelyard.harness.execution.PlanExecution;
import steelyard.harness.execution.RunRecord;
import steelyard.harness.execution.Workbench;
import steelyard.harness.export.ExportedProblem;
import steelyard.harness.export.ProblemExport;
import steelyard.harness.input.DataFiles;
import steelyard.harness.input.OwnFamily;
import steelyard.harness.plan.Catalogue;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.PlanReader;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.harness.timing.JmhStopwatch;
import steelyard.harness.timing.Stopwatch;
import steelyard.harness.timing.TimingException;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.results.choice.Choice;
import steelyard.results.choice.Chooser;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;

/**
 * Steelyard as a library. Objects are immutable; each {@code with} returns another one.
 *
 * <p>What is wrong with an argument, a plan or a file is said by a runtime exception whose message
 * is one sentence.
 */
public final class Steelyard {
  private static final Duration PATIENCE = Duration.ofMinutes(10);
  private static final int TIMEOUT_MS = 10_000;

  private final List<Task<?, ?>> tasks;
  private final Set<String> fromThisJvm;
  private final int threads;
  private final boolean isTimed;

  private Steelyard(List<Task<?, ?>> tasks, Set<String> fromThisJvm, int threads, boolean isTimed) {
    this.tasks = List.copyOf(tasks);
    this.fromThisJvm = Set.copyOf(fromThisJvm);
    this.threads = threads;
    this.isTimed = isTimed;
  }

  /** Returns one with the tasks, families and candidates that ship with it. */
  public static Steelyard standard() {
    return new Steelyard(Tasks.all(), Set.of(), Runtime.getRuntime().availableProcessors(), true);
  }

  /**
   * Returns one with another candidate, which runs in this JVM. It is not timed, because times are
   * taken in JVMs of their own; code in a jar is, if a plan names it.
   *
   * @param kernelType the interface of its task, such as {@code Summation.class}
   * @param id its id: lower case letters, digits and hyphens
   * @param kernel the candidate
   * @throws IllegalArgumentException if no task has this interface, or it has such a candidate
   */
  public <K> Steelyard with(Class<K> kernelType, String id, K kernel) {
    return with(
        kernelType,
        Candidate.of(id, kernel, "a candidate from Java", "not stated", "the calling program"));
  }

  /**
   * Returns one with another candidate, which runs in this JVM and is not timed.
   *
   * @throws IllegalArgumentException if no task has this interface, or it has such a candidate
   */
  public <K> Steelyard with(Class<K> kernelType, Candidate<K> candidate) {
    List<Task<?, ?>> more = new ArrayList<>();
    Set<String> here = new HashSet<>(fromThisJvm);
    for (Task<?, ?> task : tasks) {
      if (task.kernelType() == kernelType) {
        more.add(enlarged(task, candidate));
        here.add(task.id() + ":" + candidate.id());
      } else {
        more.add(task);
      }
    }
    if (here.size() == fromThisJvm.size()) {
      throw new IllegalArgumentException("no task has the interface " + kernelType.getName());
    }
    return new Steelyard(more, here, threads, isTimed);
  }

  // The task's interface is the candidate's, as was compared.
  @SuppressWarnings("unchecked")
  private static <K, D extends Data> Task<K, D> enlarged(Task<?, ?> task, Candidate<K> candidate) {
    return ((Task<K, D>) task).with(List.of(candidate));
  }

  /**
   * Returns one that works on so many problems at a time.
   *
   * @throws IllegalArgumentException if it is less than 1
   */
  public Steelyard withThreads(int count) {
    if (count < 1) {
      throw new IllegalArgumentException("threads must be at least 1, found " + count);
    }
    return new Steelyard(tasks, fromThisJvm, count, isTimed);
  }

  /** Returns one that measures errors alone. */
  public Steelyard withoutTiming() {
    return new Steelyard(tasks, fromThisJvm, threads, false);
  }

  /** Returns the ids of the tasks. */
  public List<String> tasks() {
    return tasks.stream().<String>map(Task::id).toList();
  }

  /** Returns the ids of a task's families. */
  public List<String> families(String task) {
    return new Workbench(tasks)
        .task(task).families().stream().map(family -> family.profile().id()).toList();
  }

  /** Returns the ids of a task's candidates, the textbook one first. */
  public List<String> candidates(String task) {
    return ids(new Workbench(tasks).task(task));
  }

  /** Executes a plan: the name of a built-in one, or the path of a file. */
  public Run run(String plan) {
    return execute(reader().find(plan));
  }

  /**
   * Executes a plan.
   *
   * @param toml its text; jars and data files that it names are looked for in the working folder
   */
  public Run runText(String toml) {
    return execute(reader().read("plan", toml));
  }

  /**
   * Weighs every candidate of a task on one problem from files.
   *
   * @param task the id of the task
   * @param files the files, as the command {@code weigh} takes them
   * @param columns the columns of a table, by name or by number from 1; empty where there is one
   */
  public Run weigh(String task, List<Path> files, List<String> columns) {
    return weigh(new Workbench(tasks).task(task), new DataFiles(files, columns));
  }

  private <K, D extends Data> Run weigh(Task<K, D> task, DataFiles files) {
    OwnFamily<D> family = OwnFamily.read(task, files);
    Plan plan = new FileWeighing(ids(task), List.of(), isTimed, TIMEOUT_MS).plan(task, family);
    return execute(plan, List.of(task.withFamilies(List.of(family))));
  }

  /** Makes the problem with this id, which can judge any answer. */
  public Problem<?> problem(String id) {
    return new Workbench(tasks).problem(ProblemId.parse(id));
  }

  /**
   * Writes the problem with this id to files, for other programs.
   *
   * @return its folder, below the given one
   */
  public Path export(String id, Path folder) {
    ProblemId parsed = ProblemId.parse(id);
    return new ProblemExport(folder, false)
        .write(
            new ExportedProblem(
                id,
                parsed.task(),
                parsed.family(),
                parsed.condition(),
                parsed.seed(),
                problem(id)));
  }

  /** Decides which candidate of a run to ship. */
  public static Choice choose(Run run, Requirement requirement) {
    return Chooser.choose(requirement, run.observations(), run.timings());
  }

  /** Writes a run to a folder that holds none yet. */
  public static void write(Run run, Path folder) {
    RunFolder.write(folder, run, RunFolder.Existing.KEEP);
  }

  /** Reads a run back. */
  public static Run read(Path folder) {
    return RunFolder.read(folder);
  }

  private PlanReader reader() {
    return new PlanReader(Catalogue.of(tasks), Bringing::expanded);
  }

  private Run execute(Plan plan) {
    return execute(plan, tasks);
  }

  private Run execute(Plan wanted, List<Task<?, ?>> weighed) {
    Plan plan = isTimed ? wanted : wanted.withoutTiming();
    Instant started = Instant.now();
    try (Bringing bringing =
        new Bringing(weighed, plan.additions(), Bringing.Isolation.OWN_JVM, threads)) {
      Stopwatch jmh = new JmhStopwatch(PATIENCE, plan.additions());
      Execution execution =
          new PlanExecution(
                  bringing.tasks(),
                  (task, candidate, data, effort) -> {
                    if (fromThisJvm.contains(task + ":" + candidate)) {
                      throw new TimingException("not timed: it is known to one JVM alone", null);
                    }
                    return jmh.measure(task, candidate, data, effort);
                  },
                  threads,
                  Progress.SILENT,
                  new Interruption())
              .execute(plan);
      return Run.of(
          execution.observations(),
          execution.timings(),
          plan.toToml(),
          RunRecord.of(plan, execution, started, Instant.now()));
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  private static List<String> ids(Task<?, ?> task) {
    return task.candidates().stream().<String>map(Candidate::id).toList();
  }
}
