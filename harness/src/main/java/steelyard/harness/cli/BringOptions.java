package steelyard.harness.cli;

import java.io.File;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.Option;
import steelyard.harness.bring.Bringing;
import steelyard.harness.plan.Addition;
import steelyard.problems.ProblemId;

/** The options by which candidates are brought along. */
final class BringOptions {
  private static final Pattern ADDITION = Pattern.compile("([^:=]+):([^:=]+)=(.+)");
  private static final Pattern OTHER_LANGUAGE = Pattern.compile("\\s*(exec|native)\\s*:.*");

  @Option(
      names = "--add",
      paramLabel = "TASK:ID=CODE",
      description = {
        "Add a candidate: a method as sum:mine=com.acme.Totals#net, a class that implements the",
        "task's interface as sum:mine=com.acme.Total, or every one that the jars provide as",
        "services, sum:acme=services. CODE@JAR takes it from that jar alone, so that two versions",
        "can stand side by side. May be given several times."
      })
  private List<String> added = List.of();

  @Option(
      names = "--jar",
      paramLabel = "JAR",
      description = "A jar or folder with classes, for every added candidate; may be repeated.")
  private List<String> jars = List.of();

  @Option(
      names = "--same-jvm",
      description = "Try added candidates in this JVM, not each in a JVM of its own.")
  private boolean sameJvm;

  BringOptions() {}

  /**
   * Returns what is added, one for each candidate.
   *
   * @throws BadInputException if an option is no addition
   */
  List<Addition> additions() {
    return Bringing.expanded(added.stream().map(this::addition).toList());
  }

  Bringing.Isolation isolation() {
    return sameJvm ? Bringing.Isolation.SAME_JVM : Bringing.Isolation.OWN_JVM;
  }

  private Addition addition(String text) {
    Matcher parts = ADDITION.matcher(text);
    if (!parts.matches()) {
      throw new BadInputException(
          "--add '" + text + "' must look like sum:mine=com.acme.Totals#net");
    }
    String id = parts.group(2).strip();
    if (!ProblemId.isName(id)) {
      throw new BadInputException(
          "--add '"
              + text
              + "': the id '"
              + id
              + "' must be lower case letters, digits and hyphens");
    }
    String use = parts.group(3).strip();
    List<String> own = new ArrayList<>();
    if (!OTHER_LANGUAGE.matcher(use).matches()) {
      int at = use.indexOf('@');
      if (at >= 0) {
        String path = use.substring(at + 1);
        own.addAll(Arrays.asList(path.split(Pattern.quote(File.pathSeparator), -1)));
        use = use.substring(0, at).strip();
      }
      own.addAll(jars);
    }
    return new Addition(
        parts.group(1).strip(),
        id,
        use,
        own.stream().map(BringOptions::absolute).distinct().toList());
  }

  private static String absolute(String jar) {
    return Path.of(jar).toAbsolutePath().normalize().toString();
  }
}
