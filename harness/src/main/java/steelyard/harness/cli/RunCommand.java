package steelyard.harness.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import steelyard.harness.bring.Bringing;
import steelyard.harness.execution.Execution;
import steelyard.harness.execution.PlanExecution;
import steelyard.harness.execution.PlanFindings;
import steelyard.harness.execution.RunRecord;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Catalogue;
import steelyard.harness.plan.OwnFiles;
import steelyard.harness.plan.Plan;
import steelyard.harness.plan.PlanReader;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.harness.timing.JmhStopwatch;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;
import steelyard.results.text.SummaryText;

/** Executes a plan and writes a run. */
@Command(
    name = "run",
    description = {
      "Execute a plan: make problems, compute references, run every candidate, take times, write a",
      "run folder and print one table for each task."
    },
    mixinStandardHelpOptions = true)
final class RunCommand implements Callable<Integer> {

  private static final int MAX_THREADS = 1024;
  private static final Duration PATIENCE = Duration.ofMinutes(10);

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(paramLabel = "PLAN", description = "A built-in plan (tour, nightly), or a TOML file.")
  private String planName;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      description = "The run folder to write; default: runs/ and the plan's name.")
  private Path out;

  @Option(names = "--seed", paramLabel = "SEED", description = "Another seed than the plan's.")
  private Long seed;

  @Option(names = "--only", paramLabel = "TASK", description = "Only this task of the plan.")
  private String only;

  @Option(names = "--no-timing", description = "Measure errors alone.")
  private boolean noTiming;

  @Option(
      names = "--threads",
      paramLabel = "T",
      description = "Problems to work on at a time; default: the number of processor cores.")
  private Integer threads;

  @Option(names = "--overwrite", description = "Replace the run that is already in the folder.")
  private boolean overwrite;

  @CommandLine.Mixin private BringOptions bring;

  RunCommand() {}

  @Override
  public Integer call() throws IOException {
    Plan plan = plan();
    int workers = workers();
    Path folder = out != null ? out : Path.of("runs", folderName(plan.name()));
    RunFolder.Existing existing = overwrite ? RunFolder.Existing.REPLACE : RunFolder.Existing.KEEP;
    PrintWriter err = spec.commandLine().getErr();
    Screen screen = Screen.ofProcess();
    for (Task<?, ?> task : Tasks.all()) {
      for (OwnFiles own : plan.files(task.id())) {
        err.println(own.source().words() + ": " + own.inexact().words());
      }
    }
    Instant started = Instant.now();
    // The watch is closed last: until then an interrupt waits for what candidates run in to end.
    try (InterruptWatch watch = new InterruptWatch();
        Bringing bringing =
            new Bringing(Tasks.all(), plan.additions(), bring.isolation(), workers)) {
      RunFolder.prepare(folder, existing);
      Execution execution =
          new PlanExecution(
                  bringing.tasks(),
                  new JmhStopwatch(PATIENCE, plan.additions()),
                  workers,
                  new ProgressReport(err, screen.terminal(), System::currentTimeMillis),
                  watch.interruption())
              .execute(plan);
      Run run =
          Run.of(
              execution.observations(),
              execution.timings(),
              plan.toToml(),
              RunRecord.of(plan, execution, started, Instant.now()));
      RunFolder.write(folder, run, existing);
      return report(plan, execution, run, folder, screen);
    }
  }

  private int report(Plan plan, Execution execution, Run run, Path folder, Screen screen) {
    PrintWriter output = spec.commandLine().getOut();
    output.println();
    output.print(
        SummaryText.render(run.verdicts(), run.timings(), run.tradeoffs(), screen.colour()));
    output.println("written to " + folder);
    PlanFindings findings = PlanFindings.of(plan, run);
    findings.lines().forEach(output::println);
    output.flush();
    PrintWriter err = spec.commandLine().getErr();
    if (execution.strayCalls() > 0) {
      err.println(
          "steelyard: "
              + execution.strayCalls()
              + " calls never returned and kept processors busy, so times may be too high");
    }
    if (!execution.complete()) {
      err.println("steelyard: " + execution.shortfall() + "; what was finished is in " + folder);
      return ExitCode.INCOMPLETE;
    }
    return findings.lines().isEmpty() ? ExitCode.DONE : ExitCode.FINDING;
  }

  private Plan plan() {
    List<Addition> additions = bring.additions();
    Plan plan =
        new PlanReader(Catalogue.of(Tasks.all()).with(additions), Bringing::expanded)
            .find(planName)
            .with(additions);
    if (seed != null) {
      plan = plan.withSeed(seed);
    }
    if (only != null) {
      plan = plan.only(only);
    }
    requireWeighed(additions, plan);
    return noTiming ? plan.withoutTiming() : plan;
  }

  private static void requireWeighed(List<Addition> additions, Plan plan) {
    for (Addition addition : additions) {
      if (plan.weighings().stream().noneMatch(each -> each.task().equals(addition.task()))) {
        throw new BadInputException(
            "--add "
                + addition.task()
                + ":"
                + addition.id()
                + ": nothing that is to be run weighs the task '"
                + addition.task()
                + "'");
      }
    }
  }

  private int workers() {
    int wanted = Optional.ofNullable(threads).orElse(Runtime.getRuntime().availableProcessors());
    if (wanted < 1 || wanted > MAX_THREADS) {
      throw new BadInputException(
          "--threads must be from 1 to " + MAX_THREADS + ", found " + wanted);
    }
    return wanted;
  }

  private static String folderName(String planName) {
    String name = planName.strip().replaceAll("[^A-Za-z0-9._-]+", "-");
    return List.of("", ".", "..").contains(name) ? "run" : name;
  }
}
