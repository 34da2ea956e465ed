package steelyard.harness.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import steelyard.algorithms.Candidate;
import steelyard.harness.bring.Bringing;
import steelyard.harness.execution.Execution;
import steelyard.harness.execution.FileWeighing;
import steelyard.harness.execution.PlanExecution;
import steelyard.harness.execution.PlanFindings;
import steelyard.harness.execution.Workbench;
import steelyard.harness.input.DataFiles;
import steelyard.harness.input.OwnFamily;
import steelyard.harness.plan.Addition;
import steelyard.harness.plan.Catalogue;
import steelyard.harness.plan.Plan;
import steelyard.harness.run.Interruption;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.harness.timing.JmhStopwatch;
import steelyard.problems.Data;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;
import steelyard.problems.UncertifiedException;
import steelyard.results.attainment.Attainment;
import steelyard.results.attainment.AttainmentText;
import steelyard.results.text.NearestName;

/** Weighs every candidate of a task on one problem from a user's files. */
@Command(
    name = "weigh",
    description = {
      "Weigh the candidates of a task on your own data: how accurate any algorithm can be there, who",
      "gets there, and who is the fastest of them. Files: .csv or .tsv (with --column), .mtx (Matrix",
      "Market), anything else is plain text with white space between numbers; each also gzipped."
    },
    mixinStandardHelpOptions = true)
final class WeighCommand implements Callable<Integer> {

  private static final Duration PATIENCE = Duration.ofMinutes(10);

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(
      arity = "1..*",
      paramLabel = "FILE",
      description = {
        "The files of one problem: for sum one; for dot the two vectors, or one .csv with both as",
        "columns; for solve the matrix (.mtx) and the right-hand side."
      })
  private List<Path> files;

  @Option(names = "--task", required = true, paramLabel = "TASK", description = "Such as sum.")
  private String taskId;

  @Option(
      names = "--column",
      split = ",",
      paramLabel = "COLUMN",
      description = "The columns of a .csv or .tsv file, by name or by number from 1.")
  private List<String> columns = List.of();

  @Option(
      names = "--candidates",
      split = ",",
      paramLabel = "CANDIDATE",
      description = "Only these candidates; default: all of the task.")
  private List<String> candidates = List.of();

  @Option(names = "--no-timing", description = "Measure errors alone.")
  private boolean noTiming;

  @Option(
      names = "--timeout-ms",
      paramLabel = "MS",
      defaultValue = "10000",
      description = "The longest that one call may take; default: ${DEFAULT-VALUE}.")
  private int timeoutMs;

  @CommandLine.Mixin private BringOptions bring;

  WeighCommand() {}

  @Override
  public Integer call() throws IOException {
    if (timeoutMs < 1) {
      throw new BadInputException("--timeout-ms must be at least 1, found " + timeoutMs);
    }
    List<Addition> additions =
        bring.additions().stream().filter(each -> each.task().equals(taskId)).toList();
    Catalogue.of(Tasks.all()).with(additions);
    // The watch is closed last: until then an interrupt waits for what candidates run in to end.
    try (InterruptWatch watch = new InterruptWatch();
        Bringing bringing = new Bringing(Tasks.all(), additions, bring.isolation(), 1)) {
      return weigh(new Workbench(bringing.tasks()).task(taskId), additions, watch.interruption());
    }
  }

  private <K, D extends Data> int weigh(
      Task<K, D> task, List<Addition> additions, Interruption interruption) throws IOException {
    List<String> chosen = chosen(task);
    DataFiles source = new DataFiles(files, columns);
    OwnFamily<D> family = OwnFamily.read(task, source);
    PrintWriter output = spec.commandLine().getOut();
    new ProblemSheet(id(task, family), source.words(), certified(family, source), family.inexact())
        .lines()
        .forEach(output::println);
    output.flush();
    Plan plan = new FileWeighing(chosen, additions, !noTiming, timeoutMs).plan(task, family);
    PrintWriter err = spec.commandLine().getErr();
    Execution execution =
        new PlanExecution(
                List.of(task.withFamilies(List.of(family))),
                new JmhStopwatch(PATIENCE, additions),
                1,
                new ProgressReport(err, Screen.ofProcess().terminal(), System::currentTimeMillis),
                interruption)
            .execute(plan);
    return report(execution, output, err);
  }

  private static int report(Execution execution, PrintWriter output, PrintWriter err) {
    output.println();
    output.print(
        AttainmentText.render(Attainment.of(execution.observations(), execution.timings())));
    List<String> findings = PlanFindings.brokenBounds(execution.observations());
    findings.forEach(output::println);
    output.flush();
    if (!execution.complete()) {
      err.println("steelyard: " + execution.shortfall());
      return ExitCode.INCOMPLETE;
    }
    return findings.isEmpty() ? ExitCode.DONE : ExitCode.FINDING;
  }

  private <K> List<String> chosen(Task<K, ?> task) {
    List<String> known = task.candidates().stream().map(Candidate::id).toList();
    for (String wanted : candidates) {
      if (!known.contains(wanted)) {
        throw new BadInputException(
            "task '"
                + task.id()
                + "' has no candidate '"
                + wanted
                + "'; "
                + NearestName.hint(wanted, known));
      }
    }
    return candidates.isEmpty() ? known : candidates;
  }

  private static <D extends Data> Problem<D> certified(OwnFamily<D> family, DataFiles source) {
    try {
      return family.problem();
    } catch (UncertifiedException none) {
      throw new BadInputException(source.words() + ": " + none.getMessage());
    }
  }

  private static String id(Task<?, ?> task, OwnFamily<?> family) {
    return new ProblemId(
            task.id(),
            family.profile().id(),
            OptionalDouble.empty(),
            family.size(),
            1,
            ProblemId.DEFAULT_SEED)
        .toString();
  }
}
