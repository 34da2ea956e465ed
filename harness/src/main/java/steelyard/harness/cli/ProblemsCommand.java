package steelyard.harness.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import steelyard.harness.execution.Workbench;
import steelyard.harness.export.ExportedProblem;
import steelyard.harness.export.ProblemExport;
import steelyard.harness.task.Tasks;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.ProblemId;

/** Writes problems to files that other tools can read. */
@Command(
    name = "problems",
    description = {
      "Write problems to files: vectors as CSV, matrices in Matrix Market form, the certified answer,",
      "and the achieved condition number, so that any other program can recompute the figures."
    },
    mixinStandardHelpOptions = true)
final class ProblemsCommand implements Callable<Integer> {

  private static final int ID_SEGMENTS = 4;

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(
      arity = "1..*",
      paramLabel = "PROBLEM",
      description = {
        "A problem's id, such as sum/cancelling/k1e12/n1000/r3, as every row of a run names it;",
        "or a task and a family, such as sum/cancelling."
      })
  private List<String> wanted;

  @Option(
      names = "--out",
      paramLabel = "DIR",
      defaultValue = "problems",
      description = "The folder to write to; default: ${DEFAULT-VALUE}.")
  private Path out;

  @Option(
      names = "--condition",
      split = ",",
      paramLabel = "K",
      description = "For a family with a knob, the target condition numbers; default: 1e8.")
  private List<Double> conditions = List.of(1e8);

  @Option(
      names = "--size",
      split = ",",
      paramLabel = "N",
      description = "For a family, the sizes; default: 100.")
  private List<Integer> sizes = List.of(100);

  @Option(
      names = "--repeats",
      paramLabel = "R",
      defaultValue = "1",
      description = "For a family, problems of each kind; default: ${DEFAULT-VALUE}.")
  private int repeats;

  @Option(
      names = "--seed",
      paramLabel = "SEED",
      defaultValue = "1",
      description = "For a family, the seed; default: ${DEFAULT-VALUE}.")
  private long seed;

  @Option(names = "--overwrite", description = "Replace problems that are already there.")
  private boolean overwrite;

  private final Workbench workbench = new Workbench(Tasks.all());

  ProblemsCommand() {}

  @Override
  public Integer call() {
    List<ProblemId> ids = new ArrayList<>();
    for (String text : wanted) {
      ids.addAll(ids(text));
    }
    PrintWriter output = spec.commandLine().getOut();
    ProblemExport export = new ProblemExport(out, overwrite);
    for (ProblemId id : ids) {
      Problem<?> problem = workbench.problem(id);
      Path folder =
          export.write(
              new ExportedProblem(
                  id.toString(), id.task(), id.family(), id.condition(), id.seed(), problem));
      output.println(folder);
    }
    return ExitCode.DONE;
  }

  private List<ProblemId> ids(String text) {
    String[] segments = text.split("/", -1);
    try {
      return segments.length >= ID_SEGMENTS ? List.of(ProblemId.parse(text)) : family(segments);
    } catch (IllegalArgumentException wrong) {
      throw new BadInputException(wrong.getMessage());
    }
  }

  private List<ProblemId> family(String[] segments) {
    if (segments.length != 2) {
      throw new BadInputException(
          "'"
              + String.join("/", segments)
              + "' is neither a problem's id, such as sum/cancelling/k1e12/n1000/r3,"
              + " nor a task and a family, such as sum/cancelling");
    }
    if (repeats < 1) {
      throw new BadInputException("--repeats must be at least 1, found " + repeats);
    }
    Family<?> family = workbench.family(workbench.task(segments[0]), segments[1]);
    List<OptionalDouble> targets =
        family.reach().controlled()
            ? conditions.stream().map(OptionalDouble::of).toList()
            : List.of(OptionalDouble.empty());
    List<ProblemId> ids = new ArrayList<>();
    for (OptionalDouble target : targets) {
      for (int size : sizes) {
        for (int repeat = 1; repeat <= repeats; repeat++) {
          ids.add(new ProblemId(segments[0], segments[1], target, size, repeat, seed));
        }
      }
    }
    return ids;
  }
}
