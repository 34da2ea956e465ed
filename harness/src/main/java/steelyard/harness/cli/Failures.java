package steelyard.harness.cli;

import java.io.PrintWriter;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import steelyard.harness.bring.BringException;
import steelyard.harness.export.ExportException;
import steelyard.harness.input.InputException;
import steelyard.harness.plan.PlanException;
import steelyard.problems.UncertifiedException;
import steelyard.problems.UnreachableException;
import steelyard.results.choice.RequirementException;
import steelyard.results.run.RunException;
import steelyard.results.table.TableException;

/** Turns whatever goes wrong into one sentence and an exit code. */
final class Failures {

  /** What these say is one sentence about what the user gave. */
  private static final List<Class<? extends RuntimeException>> BAD_INPUT =
      List.of(
          BadInputException.class,
          BringException.class,
          PlanException.class,
          ExportException.class,
          InputException.class,
          UnreachableException.class,
          UncertifiedException.class,
          RequirementException.class,
          RunException.class,
          TableException.class);

  private Failures() {}

  static int badUsage(ParameterException wrong, String[] arguments) {
    CommandLine commandLine = wrong.getCommandLine();
    String sentence = wrong.getMessage().lines().findFirst().orElse("bad usage");
    String command = commandLine.getCommandSpec().qualifiedName();
    String hint = sentence.contains("--help") ? "" : "; see '" + command + " --help'";
    say(commandLine.getErr(), sentence + hint);
    return ExitCode.BAD_INPUT;
  }

  static int failed(Exception failure, CommandLine commandLine, CommandLine.ParseResult parsed) {
    if (BAD_INPUT.stream().anyMatch(kind -> kind.isInstance(failure))) {
      say(commandLine.getErr(), failure.getMessage());
      return ExitCode.BAD_INPUT;
    }
    say(
        commandLine.getErr(),
        "internal error: "
            + failure
            + "; please report it, with the stack trace that --debug prints");
    if (debug(commandLine)) {
      failure.printStackTrace(commandLine.getErr());
    }
    return ExitCode.INTERNAL_ERROR;
  }

  private static boolean debug(CommandLine commandLine) {
    return commandLine.getCommandSpec().root().userObject() instanceof Main main && main.debug();
  }

  private static void say(PrintWriter err, String sentence) {
    err.println("steelyard: " + sentence.strip());
    err.flush();
  }
}
