package steelyard.harness.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import steelyard.results.choice.Choice;
import steelyard.results.choice.ChoiceText;
import steelyard.results.choice.Chooser;
import steelyard.results.choice.Requirement;
import steelyard.results.run.Run;
import steelyard.results.run.RunFolder;

/** Decides which candidate of a run to ship. */
@Command(
    name = "choose",
    description = {
      "Print which candidate is the fastest that meets a requirement, and why the others are not.",
      "Exits with 1 and the nearest miss when none does."
    },
    mixinStandardHelpOptions = true)
final class ChooseCommand implements Callable<Integer> {

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(paramLabel = "RUN", description = "The folder of a run.")
  private Path folder;

  @Option(
      names = "--task",
      required = true,
      paramLabel = "TASK",
      description = "The task, such as sum.")
  private String task;

  @Option(
      names = "--error",
      required = true,
      paramLabel = "E",
      description = "The largest relative forward error that is acceptable, such as 1e-14.")
  private double error;

  @Option(
      names = "--condition-up-to",
      required = true,
      paramLabel = "K",
      description = "The largest condition number for which it must hold, such as 1e10.")
  private double conditionUpTo;

  @Option(
      names = "--size",
      required = true,
      paramLabel = "N",
      description = "The problem size for which it must hold, such as 1000.")
  private int size;

  @Option(
      names = "--family",
      split = ",",
      paramLabel = "FAMILY",
      description = "Only problems of these families; default: all of the run.")
  private List<String> families = List.of();

  @Option(
      names = "--except",
      split = ",",
      paramLabel = "FAMILY",
      description = "Leave out problems of these families, which cannot occur where you are.")
  private List<String> except = List.of();

  ChooseCommand() {}

  @Override
  public Integer call() {
    Run run = RunFolder.read(folder);
    Requirement requirement = new Requirement(task, error, conditionUpTo, size, families, except);
    Choice choice = Chooser.choose(requirement, run.observations(), run.timings());
    Optional<Choice> spared = Chooser.spared(choice, run.observations(), run.timings());
    spec.commandLine().getOut().print(ChoiceText.render(choice, spared));
    return choice.qualified().isEmpty() ? ExitCode.FINDING : ExitCode.DONE;
  }
}
