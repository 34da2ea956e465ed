package steelyard.harness.api;

import java.nio.file.Path;
import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.harness.bring.Bringing;
import steelyard.harness.execution.Workbench;
import steelyard.harness.export.ExportedProblem;
import steelyard.harness.export.ProblemExport;
import steelyard.harness.input.DataFiles;
import steelyard.harness.plan.Plan;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.results.choice.Choice;
import steelyard.results.choice.Chooser;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;

/**
 * Steelyard as a library. Objects are immutable; each method that adjusts something returns another
 * one. Nothing is printed, and nothing is written unless a method says so.
 *
 * <p>What is wrong with an argument, a plan or a file is said by a runtime exception whose message
 * is one sentence. A thread that is interrupted leaves off early and returns what is complete;
 * {@code run.provenance().complete()} tells.
 */
public final class Steelyard {

  private final Bench bench;

  private Steelyard(Bench bench) {
    this.bench = bench;
  }

  /** Returns one with the tasks, families and candidates that ship with it. */
  public static Steelyard standard() {
    return new Steelyard(Bench.ofTheHouse());
  }

  /**
   * Returns one with another candidate, which runs in this JVM and takes part wherever its task is
   * weighed. It is not timed, because times are taken in JVMs of their own; {@linkplain #withCode
   * code that is named} is.
   *
   * @param kernelType the interface of its task, such as {@code Summation.class}
   * @param id its id: lower case letters, digits and hyphens
   * @param kernel the candidate; it must not modify its input
   * @throws IllegalArgumentException if no task has this interface, or it has such a candidate
   */
  public <K> Steelyard with(Class<K> kernelType, String id, K kernel) {
    return with(
        kernelType,
        Candidate.of(id, kernel, "a candidate from Java", "not stated", "the calling program"));
  }

  /**
   * Returns one with another candidate, with all that it says of itself: the bound that it claims,
   * the problems that it is for, its precision. It runs in this JVM and is not timed.
   *
   * @throws IllegalArgumentException if no task has this interface, or it has such a candidate
   */
  public <K> Steelyard with(Class<K> kernelType, Candidate<K> candidate) {
    return new Steelyard(bench.with(kernelType, candidate));
  }

  /**
   * Returns one with another candidate that is code by its name, as {@code --add} takes it. It is
   * timed, and is tried in a JVM of its own unless {@link #inThisJvm} says otherwise.
   *
   * @param task the id of its task, such as {@code sum}
   * @param id its id: lower case letters, digits and hyphens
   * @param code such as {@code com.acme.Totals#net}, a method, or a class that implements the
   *     task's interface
   * @param jars the jars and folders with its classes; none: the class path
   */
  public Steelyard withCode(String task, String id, String code, Path... jars) {
    return new Steelyard(bench.adding(task, id, code, List.of(jars)));
  }

  /**
   * Returns one that works on so many problems at a time.
   *
   * @throws IllegalArgumentException if it is less than 1
   */
  public Steelyard withThreads(int count) {
    return new Steelyard(bench.withThreads(count));
  }

  /** Returns one that measures errors alone. */
  public Steelyard withoutTiming() {
    return new Steelyard(bench.untimed());
  }

  /** Returns one that says how far it has come. */
  public Steelyard withProgress(Progress progress) {
    return new Steelyard(bench.reporting(progress));
  }

  /** Returns one that tries code by its name in this JVM, which is quicker, and at its mercy. */
  public Steelyard inThisJvm() {
    return new Steelyard(bench.isolated(Bringing.Isolation.SAME_JVM));
  }

  /** Returns the ids of the tasks. */
  public List<String> tasks() {
    return bench.tasks().stream().<String>map(Task::id).toList();
  }

  /** Returns the ids of a task's families. */
  public List<String> families(String task) {
    return workbench().task(task).families().stream().map(each -> each.profile().id()).toList();
  }

  /** Returns the ids of a task's candidates, the textbook one first. */
  public List<String> candidates(String task) {
    return bench.candidates(workbench().task(task));
  }

  /** Returns a plan to adjust: the name of a built-in one, or the path of a file. */
  public Plan plan(String nameOrFile) {
    return bench.extended(bench.reader().find(nameOrFile));
  }

  /**
   * Returns a plan to adjust.
   *
   * @param toml its text; jars and data files that it names are looked for in the working folder
   */
  public Plan planOf(String toml) {
    return bench.extended(bench.reader().read("plan", toml));
  }

  /** Executes a plan: the name of a built-in one, or the path of a file. */
  public Run run(String plan) {
    return run(plan(plan));
  }

  /**
   * Executes a plan.
   *
   * @param toml its text; jars and data files that it names are looked for in the working folder
   */
  public Run runText(String toml) {
    return run(planOf(toml));
  }

  /**
   * Executes a plan.
   *
   * @param plan a plan of this very object, since it names the candidates that were added
   */
  public Run run(Plan plan) {
    return new Weighings(bench).run(plan);
  }

  /**
   * Weighs every candidate of a task on one problem from files.
   *
   * @param task the id of the task
   * @param files the files, as the command {@code weigh} takes them
   * @param columns the columns of a table, by name or by number from 1; empty where there is one
   */
  public Run weigh(String task, List<Path> files, List<String> columns) {
    return new Weighings(bench).weigh(task, new OwnData.InFiles(new DataFiles(files, columns)));
  }

  /**
   * Weighs every candidate of a task on one problem in memory.
   *
   * @param task the id of the task
   * @param data the input, such as {@code Terms} for {@code sum}
   */
  public Run weigh(String task, Data data) {
    return new Weighings(bench).weigh(task, new OwnData.InArrays(data.parts()));
  }

  /** Makes the problem with this id, which can judge any answer. */
  public Problem<?> problem(String id) {
    return workbench().problem(ProblemId.parse(id));
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

  /** Writes a run to a folder, in place of the run that is there, if there is one. */
  public static void replace(Run run, Path folder) {
    RunFolder.write(folder, run, RunFolder.Existing.REPLACE);
  }

  /** Reads a run back. */
  public static Run read(Path folder) {
    return RunFolder.read(folder);
  }

  private Workbench workbench() {
    return new Workbench(bench.tasks());
  }
}
