package steelyard.harness.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;

/** The program. */
@Command(
    name = "steelyard",
    description = "Weighs the accuracy of numerical kernels against their running time.",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    synopsisSubcommandLabel = "COMMAND",
    footer = {
      "",
      "Exit codes: 0 done, 1 finding (a requirement that no candidate meets, a broken bound),",
      "2 bad usage or bad input, 3 internal error, 4 incomplete (interrupted).",
      "",
      "Start with: steelyard run tour"
    })
public final class Main implements Runnable {

  private static final Map<String, Supplier<Object>> COMMANDS = commands();

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Option(
      names = "--debug",
      scope = ScopeType.INHERIT,
      description = "Print the stack trace of an internal error.")
  private boolean debug;

  Main() {}

  /** Runs the program and exits with its exit code. */
  public static void main(String[] args) {
    PrintWriter out = utf8(FileDescriptor.out);
    PrintWriter err = utf8(FileDescriptor.err);
    int code = execute(out, err, args);
    out.flush();
    err.flush();
    System.exit(code);
  }

  /** Runs a command and returns its exit code. */
  static int execute(PrintWriter out, PrintWriter err, String... args) {
    return commandLine(args).setOut(out).setErr(err).execute(args);
  }

  private static Map<String, Supplier<Object>> commands() {
    Map<String, Supplier<Object>> commands = new LinkedHashMap<>();
    commands.put("list", ListCommand::new);
    commands.put("run", RunCommand::new);
    commands.put("weigh", WeighCommand::new);
    commands.put("choose", ChooseCommand::new);
    commands.put("problems", ProblemsCommand::new);
    return commands;
  }

  // To read the annotations of a command takes as long as a bare JVM's start, so that a command
  // that
  // is named first is the only one that is read.
  private static CommandLine commandLine(String... args) {
    CommandLine commandLine = new CommandLine(new Main());
    if (args.length > 0 && COMMANDS.containsKey(args[0])) {
      commandLine.addSubcommand(args[0], COMMANDS.get(args[0]).get());
    } else {
      COMMANDS.forEach((name, command) -> commandLine.addSubcommand(name, command.get()));
    }
    commandLine.setParameterExceptionHandler(Failures::badUsage);
    commandLine.setExecutionExceptionHandler(Failures::failed);
    commandLine.setCaseInsensitiveEnumValuesAllowed(true);
    commandLine.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
    commandLine.setUsageHelpWidth(100);
    return commandLine;
  }

  /** Streams in UTF-8 whatever the locale says, so that the output is the same everywhere. */
  private static PrintWriter utf8(FileDescriptor descriptor) {
    return new PrintWriter(
        new OutputStreamWriter(new FileOutputStream(descriptor), StandardCharsets.UTF_8), true);
  }

  boolean debug() {
    return debug;
  }

  @Override
  public void run() {
    throw new CommandLine.ParameterException(
        spec.commandLine(), "a command is missing; see 'steelyard --help'");
  }
}
