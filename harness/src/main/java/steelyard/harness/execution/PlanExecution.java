package steelyard.harness.execution;

import java.io.IOException;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import steelyard.harness.input.OwnFamily;
import steelyard.harness.plan.OwnFiles;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.ProblemCell;
import steelyard.harness.plan.TimingEffort;
import steelyard.harness.run.AccuracyPhase;
import steelyard.harness.run.Assignment;
import steelyard.harness.run.Interruption;
import steelyard.harness.run.Progress;
import steelyard.harness.task.Task;
import steelyard.harness.timing.Stopwatch;
import steelyard.harness.timing.TimingPhase;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.ProblemId;

/** Executes a plan: accuracy on all threads first, then times with nothing else running. */
public final class PlanExecution {

  private final List<Task<?, ?>> tasks;
  private final Stopwatch stopwatch;
  private final int threads;
  private final Progress progress;
  private final Interruption interruption;

  /**
   * Prepares an execution.
   *
   * @param tasks the tasks that plans may name
   * @param stopwatch what measures times
   * @param threads how many problems to work on at a time, at least 1
   * @param progress hears of each step
   * @param interruption asks to stop early
   */
  public PlanExecution(
      List<Task<?, ?>> tasks,
      Stopwatch stopwatch,
      int threads,
      Progress progress,
      Interruption interruption) {
    this.tasks = List.copyOf(tasks);
    this.stopwatch = stopwatch;
    this.threads = threads;
    this.progress = progress;
    this.interruption = interruption;
  }

  /**
   * Executes a plan.
   *
   * @param plan a plan that was checked against the same tasks
   * @throws steelyard.harness.input.InputException if a file that it names cannot be read any more
   * @throws IOException if inputs cannot be handed over to the timed JVMs
   */
  public Execution execute(Plan plan) throws IOException {
    Workbench workbench = new Workbench(tasks.stream().<Task<?, ?>>map(t -> own(t, plan)).toList());
    AccuracyPhase.Outcome accuracy =
        new AccuracyPhase(threads, progress, interruption)
            .run(
                plan.problems().stream()
                    .<Assignment<?, ?>>map(cell -> assignment(workbench, cell, plan.seed()))
                    .toList());
    TimingPhase.Outcome timing = TimingPhase.Outcome.NONE;
    Optional<TimingEffort> effort = plan.timing();
    if (effort.isPresent() && !interruption.requested()) {
      TimingJobs jobs = new TimingJobs(workbench, accuracy.observations(), plan.seed());
      timing =
          new TimingPhase(stopwatch, effort.get(), progress, interruption)
              .run(jobs.of(plan.timings()));
    }
    return new Execution(
        accuracy.observations(),
        timing.timings(),
        accuracy.complete() && timing.complete() && !interruption.requested(),
        timing.busy().orElse("interrupted"),
        accuracy.strayCalls());
  }

  private static <K, D extends Data> Task<K, D> own(Task<K, D> task, Plan plan) {
    List<Family<D>> families = new ArrayList<>();
    for (OwnFiles files : plan.files(task.id())) {
      families.add(OwnFamily.read(task, files.source()));
    }
    return task.withFamilies(families);
  }

  private static Assignment<?, ?> assignment(Workbench workbench, ProblemCell cell, long seed) {
    ProblemId id =
        new ProblemId(
            cell.task(), cell.family(), cell.condition(), cell.size(), cell.repeat(), seed);
    return workbench.assignment(id, cell.candidates(), Duration.ofMillis(cell.timeoutMs()));
  }
}
