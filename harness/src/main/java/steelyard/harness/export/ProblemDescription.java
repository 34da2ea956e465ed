package steelyard.harness.export;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.util.RawValue;
import java.util.Collection;
import java.util.OptionalDouble;
import java.util.TreeSet;
import steelyard.harness.data.DataDigest;
import steelyard.harness.data.DoubleText;
import steelyard.problems.Problem;
import steelyard.problems.Reference;

/**
 * Renders what is known of a problem as JSON. JSON has no infinity: an infinite number stands as
 * the text {@code "Infinity"}, one that does not apply as null.
 */
final class ProblemDescription {

  private static final ObjectMapper MAPPER = new ObjectMapper();

  private ProblemDescription() {}

  static String json(ExportedProblem exported, Collection<String> files) {
    Problem<?> problem = exported.problem();
    ObjectNode root = MAPPER.createObjectNode();
    root.put("id", exported.id());
    root.put("task", exported.task());
    root.put("family", exported.family());
    root.put("size", problem.size());
    root.put("seed", exported.seed());
    put(root, "target_condition", exported.targetCondition());
    put(root, "condition", OptionalDouble.of(problem.condition().kappa()));
    put(root, "componentwise_condition", problem.condition().componentwise());
    new TreeSet<>(problem.traits()).forEach(root.putArray("traits")::add);
    Reference reference = problem.reference();
    root.put("reference_route", reference.route());
    put(root, "reference_bound", OptionalDouble.of(reference.relativeBound()));
    root.put("data_digest", DataDigest.of(problem.data()));
    files.forEach(root.putArray("files")::add);
    return text(root);
  }

  /** Numbers are spelled here: the digits that Jackson prints would depend on the JDK. */
  private static void put(ObjectNode node, String key, OptionalDouble value) {
    if (value.isEmpty()) {
      node.putNull(key);
    } else if (Double.isFinite(value.getAsDouble())) {
      node.putRawValue(key, new RawValue(DoubleText.shortest(value.getAsDouble())));
    } else {
      node.put(key, DoubleText.shortest(value.getAsDouble()));
    }
  }

  private static String text(ObjectNode root) {
    Separators separators =
        Separators.createDefaultInstance()
            .withObjectFieldValueSpacing(Separators.Spacing.AFTER)
            .withArrayEmptySeparator("");
    DefaultPrettyPrinter printer = new DefaultPrettyPrinter(separators);
    printer.indentObjectsWith(new DefaultIndenter("  ", "\n"));
    try {
      return MAPPER.writer(printer).writeValueAsString(root) + "\n";
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a tree of plain values could not be written as JSON", e);
    }
  }
}
