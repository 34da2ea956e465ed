package steelyard.results.run;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import steelyard.results.table.StableJson;
import steelyard.results.table.TableSchemas;

/** {@code run.json}: where a run comes from, and the mark by which a run's folder is known. */
final class ProvenanceJson {
  private static final String MARK = "steelyard";

  private ProvenanceJson() {}

  static String text(Provenance from) {
    ObjectNode root = JsonNodeFactory.instance.objectNode();
    root.put("tool", MARK);
    root.put("tool_version", from.toolVersion());
    root.put("schema_version", TableSchemas.VERSION);
    root.put("plan", from.plan());
    root.put("seed", from.seed());
    root.put("started", from.started().toString());
    root.put("ended", from.ended().map(Instant::toString).orElse(null));
    root.put("complete", from.complete());
    ObjectNode jvm = root.putObject("jvm");
    jvm.put("version", from.jvm().version());
    jvm.put("vendor", from.jvm().vendor());
    jvm.put("name", from.jvm().name());
    from.jvm().flags().forEach(jvm.putArray("flags")::add);
    ObjectNode machine = root.putObject("machine");
    machine.put("cpu", from.machine().cpu());
    machine.put("cores", from.machine().cores());
    machine.put("os", from.machine().os());
    ObjectNode libraries = root.putObject("libraries");
    from.libraries().forEach(libraries::put);
    ObjectNode counts = root.putObject("counts");
    from.counts().forEach(counts::put);
    return StableJson.text(root);
  }

  /** Says whether a text is a {@code run.json} of ours, of whatever version. */
  static boolean isOurs(String text) {
    try {
      return new JsonMapper().readTree(text).path("tool").asText().equals(MARK);
    } catch (JsonProcessingException e) {
      return false;
    }
  }

  /**
   * Reads a text.
   *
   * @throws RunException if it is damaged, or of a version that is not known here
   */
  static Provenance parse(String file, String text) {
    try {
      JsonNode root = new JsonMapper().readTree(text);
      int version = root.required("schema_version").asInt();
      if (version != TableSchemas.VERSION) {
        throw new RunException(
            file
                + ": the run has version "
                + version
                + " of the tables; this program reads version "
                + TableSchemas.VERSION
                + ".");
      }
      return provenance(root);
    } catch (JsonProcessingException | IllegalArgumentException | DateTimeException e) {
      throw new RunException(
          file + ": this is not the record of a run (" + firstLine(e) + "); take a whole copy.", e);
    }
  }

  private static String firstLine(Exception e) {
    return String.valueOf(e.getMessage()).lines().findFirst().orElse("");
  }

  private static Provenance provenance(JsonNode root) {
    JsonNode jvm = root.required("jvm");
    JsonNode machine = root.required("machine");
    List<String> flags = new ArrayList<>();
    jvm.required("flags").forEach(flag -> flags.add(flag.asText()));
    return new Provenance(
        root.required("tool_version").asText(),
        root.required("plan").asText(),
        root.required("seed").asLong(),
        Instant.parse(root.required("started").asText()),
        Optional.of(root.required("ended"))
            .filter(JsonNode::isTextual)
            .map(JsonNode::asText)
            .map(Instant::parse),
        root.required("complete").asBoolean(),
        new Provenance.Jvm(
            jvm.required("version").asText(),
            jvm.required("vendor").asText(),
            jvm.required("name").asText(),
            flags),
        new Provenance.Machine(
            machine.required("cpu").asText(),
            machine.required("cores").asInt(),
            machine.required("os").asText()),
        map(root.required("libraries"), JsonNode::asText),
        map(root.required("counts"), JsonNode::asLong));
  }

  private static <V> SortedMap<String, V> map(JsonNode object, Function<JsonNode, V> value) {
    SortedMap<String, V> map = new TreeMap<>();
    object.properties().forEach(entry -> map.put(entry.getKey(), value.apply(entry.getValue())));
    return map;
  }
}
