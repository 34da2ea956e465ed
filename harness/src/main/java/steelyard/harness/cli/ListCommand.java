package steelyard.harness.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import steelyard.algorithms.Candidate;
import steelyard.harness.data.DoubleText;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Reach;
import steelyard.results.text.NearestName;

/** Lists what there is to weigh. */
@Command(
    name = "list",
    description = "List the tasks, the families with what they are for, and the candidates.",
    mixinStandardHelpOptions = true)
final class ListCommand implements Callable<Integer> {

  private static final int NAME_WIDTH = 24;
  private static final int LINE_WIDTH = 100;

  @CommandLine.Spec private CommandLine.Model.CommandSpec spec;

  @Parameters(
      arity = "0..1",
      paramLabel = "TASK",
      description = "Only this task, such as sum; default: all.")
  private String task;

  ListCommand() {}

  @Override
  public Integer call() {
    PrintWriter out = spec.commandLine().getOut();
    boolean first = true;
    for (Task<?, ?> each : chosen()) {
      if (!first) {
        out.println();
      }
      print(out, each);
      first = false;
    }
    return ExitCode.DONE;
  }

  private List<Task<?, ?>> chosen() {
    if (task == null) {
      return Tasks.all();
    }
    List<String> known = Tasks.all().stream().<String>map(Task::id).toList();
    return List.of(
        Tasks.find(task)
            .orElseThrow(
                () ->
                    new BadInputException(
                        "there is no task '" + task + "'; " + NearestName.hint(task, known))));
  }

  private static <K, D extends Data> void print(PrintWriter out, Task<K, D> task) {
    out.println(task.id() + ": " + task.description());
    out.println();
    out.println("  Families of problems");
    for (Family<D> family : task.families()) {
      Family.Profile profile = family.profile();
      entry(out, profile.id(), profile.purpose());
      continuation(out, knob(profile, family.reach()));
    }
    out.println();
    out.println("  Candidates");
    for (Candidate<K> candidate : task.candidates()) {
      entry(out, candidate.id(), candidate.description());
      continuation(out, "source: " + candidate.source());
      candidate.bound().ifPresent(bound -> continuation(out, "bound: " + bound.text()));
    }
  }

  private static String knob(Family.Profile profile, Reach reach) {
    String sizes = "n from " + reach.minSize() + " to " + reach.maxSize();
    return reach.controlled()
        ? "knob: "
            + profile.knob()
            + ", up to "
            + DoubleText.shortest(reach.maxCondition())
            + "; "
            + sizes
        : "no knob; " + sizes;
  }

  private static void entry(PrintWriter out, String name, String text) {
    StringBuilder head = new StringBuilder("    ").append(name);
    do {
      head.append(' ');
    } while (head.length() < NAME_WIDTH + 4);
    wrapped(out, head.toString(), text);
  }

  private static void continuation(PrintWriter out, String text) {
    wrapped(out, " ".repeat(NAME_WIDTH + 4), text);
  }

  private static void wrapped(PrintWriter out, String head, String text) {
    StringBuilder line = new StringBuilder(head);
    boolean empty = true;
    for (String word : text.split(" ", -1)) {
      if (!empty && line.length() + 1 + word.length() > LINE_WIDTH) {
        out.println(line);
        line = new StringBuilder(" ".repeat(NAME_WIDTH + 4));
        empty = true;
      }
      line.append(empty ? "" : " ").append(word);
      empty = false;
    }
    out.println(line);
  }
}
