package steelyard.harness.plan;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import steelyard.harness.data.DoubleText;
import steelyard.harness.input.DataFiles;

/** Writes a plan as TOML, in one fixed order and with every value spelled out. */
final class PlanWriter {

  private final Plan plan;
  private final StringBuilder out = new StringBuilder();

  PlanWriter(Plan plan) {
    this.plan = plan;
  }

  String toml() {
    line("name", quoted(plan.name()));
    line("seed", plan.seed());
    plan.timing().ifPresent(this::timing);
    plan.additions().forEach(this::addition);
    plan.weighings().forEach(this::weighing);
    plan.requirements().forEach(this::requirement);
    return out.toString();
  }

  private void timing(TimingEffort effort) {
    out.append("\n[timing]\n");
    line("forks", effort.forks());
    line("warmup", effort.warmup());
    line("measurement", effort.measurement());
    line("iteration_ms", effort.iterationMs());
    if (!effort.sizes().isEmpty()) {
      line("sizes", list(effort.sizes(), String::valueOf));
    }
  }

  private void addition(Addition addition) {
    out.append("\n[[add]]\n");
    line("task", quoted(addition.task()));
    line("id", quoted(addition.id()));
    line("use", quoted(addition.use()));
    if (!addition.jars().isEmpty()) {
      line("jars", list(addition.jars(), PlanWriter::quoted));
    }
  }

  private void weighing(Weighing weighing) {
    out.append("\n[[weigh]]\n");
    line("task", quoted(weighing.task()));
    List<FamilyShare> generated =
        weighing.families().stream().filter(FamilyShare::generated).toList();
    if (!generated.isEmpty()) {
      line("families", list(generated, share -> quoted(share.family())));
    }
    files(weighing);
    line("candidates", list(weighing.candidates(), PlanWriter::quoted));
    perFamily(
        "conditions",
        generated.stream().filter(FamilyShare::controlled).toList(),
        share -> list(share.conditions(), DoubleText::shortest));
    perFamily("sizes", generated, share -> list(share.sizes(), String::valueOf));
    line("repeats", weighing.repeats());
    line("time", quoted(weighing.time().orElse(WeighingReader.NOT_TIMED)));
    line("timeout_ms", weighing.timeoutMs());
  }

  private void files(Weighing weighing) {
    List<DataFiles> sources =
        weighing.families().stream()
            .flatMap(share -> share.files().stream())
            .map(OwnFiles::source)
            .toList();
    if (!sources.isEmpty()) {
      line("files", list(sources, PlanWriter::fileList));
      if (!sources.get(0).columns().isEmpty()) {
        line("columns", list(sources.get(0).columns(), PlanWriter::quoted));
      }
    }
  }

  private static String fileList(DataFiles source) {
    List<String> names = source.files().stream().map(file -> quoted(file.toString())).toList();
    return names.size() == 1 ? names.get(0) : list(names, name -> name);
  }

  private void requirement(Requirement requirement) {
    out.append("\n[[require]]\n");
    line("task", quoted(requirement.task()));
    line("error", DoubleText.shortest(requirement.error()));
    line("condition_up_to", DoubleText.shortest(requirement.conditionUpTo()));
    line("size", requirement.size());
  }

  /** One line where the families agree, else one for each. */
  private void perFamily(
      String key, List<FamilyShare> shares, Function<FamilyShare, String> value) {
    if (shares.stream().map(value).distinct().count() == 1) {
      line(key, value.apply(shares.get(0)));
    } else {
      shares.forEach(share -> line(key + "." + share.family(), value.apply(share)));
    }
  }

  private void line(String key, Object value) {
    out.append(key).append(" = ").append(value).append('\n');
  }

  private static <T> String list(Collection<T> items, Function<T, String> text) {
    return items.stream().map(text).collect(Collectors.joining(", ", "[", "]"));
  }

  private static String quoted(String text) {
    StringBuilder quoted = new StringBuilder("\"");
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '"' || c == '\\') {
        quoted.append('\\').append(c);
      } else if (Character.isISOControl(c)) {
        quoted.append(String.format(Locale.ROOT, "\\u%04x", (int) c));
      } else {
        quoted.append(c);
      }
    }
    return quoted.append('"').toString();
  }
}
