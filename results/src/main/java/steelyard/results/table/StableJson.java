package steelyard.results.table;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;

/** JSON whose bytes are the same on every platform. */
public final class StableJson {
  private StableJson() {}

  /** Returns the text of an object, indented, its members in their order, ended by a line feed. */
  public static String text(ObjectNode root) {
    // The default printer would take the line separator of the platform.
    DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer = new DefaultPrettyPrinter();
    printer.indentObjectsWith(indenter);
    printer.indentArraysWith(indenter);
    try {
      return new JsonMapper().writer(printer).writeValueAsString(root) + "\n";
    } catch (JsonProcessingException e) {
      throw new AssertionError("A tree of plain values can always be printed.", e);
    }
  }
}
