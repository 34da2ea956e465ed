package steelyard.harness.api;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import steelyard.algorithms.Candidate;
import steelyard.harness.bring.Bringing;
import steelyard.harness.execution.Execution;
import steelyard.harness.execution.FileWeighing;
import steelyard.harness.execution.PlanExecution;
import steelyard.harness.execution.RunRecord;
import steelyard.harness.execution.Workbench;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Plan;
import steelyard.harness.run.Interruption;
import steelyard.harness.task.Task;
import steelyard.harness.timing.JmhStopwatch;
import steelyard.harness.timing.Stopwatch;
import steelyard.harness.timing.TimingException;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.results.run.Run;

/** Weighs with what the program was set to. */
final class Weighings {

  private static final Duration PATIENCE = Duration.ofMinutes(10);
  private static final int TIMEOUT_MS = 10_000;

  private final Bench bench;

  Weighings(Bench bench) {
    this.bench = bench;
  }

  Run run(Plan plan) {
    try (Bringing bringing = bringing(plan.additions())) {
      return execute(bringing.tasks(), plan);
    }
  }

  Run weigh(String task, OwnData own) {
    List<Addition> additions =
        bench.additions().stream().filter(each -> each.task().equals(task)).toList();
    try (Bringing bringing = bringing(additions)) {
      return weigh(new Workbench(bringing.tasks()).task(task), own, additions);
    }
  }

  private <K, D extends Data> Run weigh(Task<K, D> task, OwnData own, List<Addition> additions) {
    Family<D> family = own.family(task);
    List<String> candidates = task.candidates().stream().map(Candidate::id).toList();
    Plan plan =
        new FileWeighing(candidates, additions, bench.timed(), TIMEOUT_MS).plan(task, family);
    return execute(List.of(task.withFamilies(List.of(family))), plan);
  }

  private Bringing bringing(List<Addition> additions) {
    return new Bringing(bench.tasks(), additions, bench.isolation(), bench.threads());
  }

  private Run execute(List<Task<?, ?>> tasks, Plan plan) {
    Instant started = Instant.now();
    try {
      Execution execution =
          new PlanExecution(
                  tasks,
                  stopwatch(plan.additions()),
                  bench.threads(),
                  bench.progress(),
                  new Interruption())
              .execute(plan);
      return Run.of(
          execution.observations(),
          execution.timings(),
          plan.toToml(),
          RunRecord.of(plan, execution, started, Instant.now()));
    } catch (IOException unwritable) {
      throw new UncheckedIOException(
          "the inputs cannot be handed to the JVMs that take times: the temporary directory must"
              + " be writable",
          unwritable);
    }
  }

  private Stopwatch stopwatch(List<Addition> additions) {
    Stopwatch forks = new JmhStopwatch(PATIENCE, additions);
    return (task, candidate, data, effort) -> {
      if (bench.isObject(task, candidate)) {
        throw new TimingException("not timed: it is known to one JVM alone", null);
      }
      return forks.measure(task, candidate, data, effort);
    };
  }
}
