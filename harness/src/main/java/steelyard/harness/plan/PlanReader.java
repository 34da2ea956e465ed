package steelyard.harness.plan;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.dataformat.toml.TomlMapper;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import steelyard.harness.task.Task;
import steelyard.harness.task.Tasks;
import steelyard.results.text.NearestName;

/** Reads plans, fills in what they leave to a default, and holds them against a catalogue. */
public final class PlanReader {

  /** The seed of a plan that names none. */
  public static final long DEFAULT_SEED = 1;

  private static final long MAX_PROBLEMS = 1_000_000;
  private static final int MAX_ITERATIONS = 1000;
  private static final int MAX_ITERATION_MS = 60_000;

  /** Fewer measurements give no confidence interval. */
  private static final int MIN_MEASUREMENTS = 3;

  private final Catalogue catalogue;
  private final UnaryOperator<List<Addition>> expansion;
  private final List<? extends Task<?, ?>> tasks;

  /** Makes a reader of plans about these tasks, whose files are read for the tasks of the house. */
  public PlanReader(Catalogue catalogue) {
    this(catalogue, UnaryOperator.identity());
  }

  /**
   * Makes a reader of plans about these tasks.
   *
   * @param expansion replaces an addition that stands for several by those
   */
  public PlanReader(Catalogue catalogue, UnaryOperator<List<Addition>> expansion) {
    this.catalogue = catalogue;
    this.expansion = expansion;
    this.tasks = Tasks.all();
  }

  /**
   * Reads a built-in plan or else a file. A file that has the name of a built-in plan is reached by
   * a path, such as {@code ./tour}.
   *
   * @throws PlanException if there is neither, or something is wrong with it
   */
  public Plan find(String nameOrFile) {
    Optional<String> builtIn = BuiltInPlans.find(nameOrFile);
    if (builtIn.isPresent()) {
      return read(nameOrFile, builtIn.get());
    }
    Path file;
    try {
      file = Path.of(nameOrFile);
    } catch (InvalidPathException e) {
      throw unknown(nameOrFile, e);
    }
    if (!Files.exists(file)) {
      throw unknown(nameOrFile, null);
    }
    return read(file);
  }

  /**
   * Reads a file.
   *
   * @throws PlanException if it cannot be read, or something is wrong with it
   */
  public Plan read(Path file) {
    return read(file.toString(), PlanText.of(file));
  }

  /**
   * Reads a text.
   *
   * @param name the name of the file that it came from, for messages; a plan without a name gets it
   *     too
   * @param text TOML
   * @throws PlanException if something is wrong with it
   */
  public Plan read(String name, String text) {
    PlanSource source = new PlanSource(name, new KeyLocator(text));
    PlanTable root = new PlanTable(source, parsed(source, text), "", 0);
    root.allowOnly(List.of("name", "seed", "timing", "add", "weigh", "require"));
    AdditionReader additionReader = new AdditionReader(catalogue, name, expansion);
    List<Addition> additions = additionReader.read(root.entries("add"));
    WeighingReader weighingReader =
        new WeighingReader(catalogue.with(additions), new FileShareReader(tasks, folderOf(name)));
    List<Weighing> weighings = root.entries("weigh").stream().map(weighingReader::read).toList();
    if (weighings.isEmpty()) {
      throw root.fail("weigh", "the plan weighs nothing: it needs at least one [[weigh]] entry");
    }
    long problems = weighings.stream().mapToLong(Weighing::problemCount).sum();
    if (problems > MAX_PROBLEMS) {
      throw root.fail(
          "weigh", "the plan asks for " + problems + " problems, of at most " + MAX_PROBLEMS);
    }
    return new Plan(
        root.has("name") ? root.text("name") : nameOf(name),
        root.anyLong("seed", DEFAULT_SEED),
        additions,
        root.section("timing").map(section -> timing(section, weighings)),
        weighings,
        requirements(root, weighings));
  }

  private TimingEffort timing(PlanTable table, List<Weighing> weighings) {
    table.allowOnly(List.of("forks", "warmup", "measurement", "iteration_ms", "sizes"));
    TimingEffort effort =
        new TimingEffort(
            table.wholeNumber("forks", 1, 1, 100),
            table.wholeNumber("warmup", 3, 0, MAX_ITERATIONS),
            table.wholeNumber("measurement", 5, 1, MAX_ITERATIONS),
            table.wholeNumber("iteration_ms", 100, 1, MAX_ITERATION_MS),
            table.has("sizes") ? table.wholeNumbers("sizes", 1, ShareReader.MAX_SIZE) : List.of());
    if (effort.forks() * effort.measurement() < MIN_MEASUREMENTS) {
      throw table.fail(
          "measurement",
          "a confidence interval needs forks times measurement to be at least "
              + MIN_MEASUREMENTS
              + ", found "
              + effort.forks() * effort.measurement());
    }
    for (Weighing weighing : weighings) {
      weighing
          .time()
          .filter(family -> weighing.share(family).generated())
          .ifPresent(family -> checkReach(table, effort, weighing.task(), family));
    }
    return effort;
  }

  private void checkReach(PlanTable table, TimingEffort effort, String task, String family) {
    Catalogue.FamilyEntry entry = catalogue.task(task).family(family);
    for (int size : effort.sizes()) {
      if (!entry.makes(size)) {
        throw table.fail("sizes", ShareReader.sizeOutOfReach(task, entry, size));
      }
    }
  }

  private static List<Requirement> requirements(PlanTable root, List<Weighing> weighings) {
    List<String> weighed = weighings.stream().map(Weighing::task).distinct().toList();
    List<Requirement> requirements = new ArrayList<>();
    for (PlanTable table : root.entries("require")) {
      Requirement requirement = requirement(table, weighed);
      if (requirements.contains(requirement)) {
        throw table.fail("", "this requirement stands in the plan twice: once is enough");
      }
      requirements.add(requirement);
    }
    return requirements;
  }

  private static Requirement requirement(PlanTable table, List<String> weighed) {
    table.allowOnly(List.of("task", "error", "condition_up_to", "size"));
    String task = table.text("task");
    if (!weighed.contains(task)) {
      throw table.failAtWord(
          "task",
          task,
          "a requirement on '"
              + task
              + "', which no [[weigh]] entry weighs; "
              + NearestName.hint(task, weighed));
    }
    double error = table.number("error");
    if (error <= 0) {
      throw table.fail("error", "'error' must be a relative error above 0");
    }
    double condition = table.number("condition_up_to");
    if (condition < 1) {
      throw table.fail("condition_up_to", "'condition_up_to' must be 1 or more");
    }
    return new Requirement(
        task, error, condition, table.wholeNumber("size", 1, ShareReader.MAX_SIZE));
  }

  private static JsonNode parsed(PlanSource source, String text) {
    try {
      return new TomlMapper().readTree(text);
    } catch (StreamConstraintsException e) {
      throw new PlanException(
          source.name() + ": this is no plan: it nests too deep, or a number has too many digits",
          e);
    } catch (JsonProcessingException e) {
      String reason = e.getOriginalMessage().replaceFirst("(?s)(\\R|, problem:).*", "");
      Optional<KeyLocator.Place> place =
          Optional.ofNullable(e.getLocation()).map(PlanReader::place);
      throw new PlanException(source.fail(place, "this is not TOML: " + reason).getMessage(), e);
    }
  }

  private static KeyLocator.Place place(JsonLocation at) {
    return new KeyLocator.Place(at.getLineNr(), at.getColumnNr());
  }

  private static PlanException unknown(String name, Throwable cause) {
    return new PlanException(
        "there is neither a built-in plan nor a file '"
            + name
            + "'; "
            + NearestName.hint(name, BuiltInPlans.names()),
        cause);
  }

  /** Files in a plan are named from where the plan stands. */
  private static Path folderOf(String name) {
    Path folder = Path.of(name).toAbsolutePath().getParent();
    return folder == null ? Path.of("").toAbsolutePath() : folder;
  }

  private static String nameOf(String file) {
    String last = file.substring(Math.max(file.lastIndexOf('/'), file.lastIndexOf('\\')) + 1);
    String plain = last.endsWith(".toml") ? last.substring(0, last.length() - 5) : last;
    return plain.isBlank() ? "plan" : plain;
  }
}
