package steelyard.results.table;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/**
 * The schemas of all tables of a run, and {@code tables.json}, which tells them to other programs:
 * a data package whose resources each have a Table Schema.
 *
 * <p>References: Frictionless Standards, "Table Schema" and "Data Package", version 1. The unit of
 * a column and the version of the schema are properties of our own, which the standard permits.
 */
public final class TableSchemas {
  /** Changes whenever a column is added, removed, renamed or gets another meaning. */
  public static final int VERSION = 1;

  /** Every table of a run. */
  public static final List<TableSchema<?>> ALL =
      List.of(ErrorsTable.SCHEMA, TimingsTable.SCHEMA, TradeoffsTable.SCHEMA, VerdictsTable.SCHEMA);

  private TableSchemas() {}

  /** Returns the text of {@code tables.json}. */
  public static String json() {
    ObjectNode root = JsonNodeFactory.instance.objectNode();
    root.put("profile", "tabular-data-package");
    root.put("name", "steelyard-run");
    root.put("schema_version", VERSION);
    for (TableSchema<?> table : ALL) {
      describe(table, root.withArray("/resources").addObject());
    }
    return StableJson.text(root);
  }

  private static void describe(TableSchema<?> table, ObjectNode resource) {
    resource.put("profile", "tabular-data-resource");
    resource.put("name", table.name());
    resource.put("path", table.fileName());
    resource.put("description", table.meaning());
    resource.put("format", "csv");
    resource.put("encoding", "utf-8");
    ObjectNode schema = resource.putObject("schema");
    for (Column<?> column : table.columns()) {
      describe(column, schema.withArray("/fields").addObject());
    }
    schema.putArray("missingValues").add("");
  }

  private static void describe(Column<?> column, ObjectNode field) {
    field.put("name", column.name());
    field.put("type", column.type().schemaType());
    field.put("unit", column.unit());
    field.put("description", column.meaning());
    ObjectNode constraints = field.putObject("constraints");
    constraints.put("required", column.required());
    if (!column.values().isEmpty()) {
      column.values().forEach(constraints.putArray("enum")::add);
    }
  }
}
