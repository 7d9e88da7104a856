package torqueloom.app.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import torqueloom.model.table.CanonicalJson;

/**
 * Writes the study file's JSON Schema (draft 2020-12) from the schema, so that editors complete and
 * check studies. It knows keys, types and words; units and ranges are checked by the reader.
 */
final class JsonSchemaWriter {
  private JsonSchemaWriter() {}

  /** The schema as a document. */
  static String text() {
    final Map<String, Object> root = new LinkedHashMap<>();
    root.put("$schema", "https://json-schema.org/draft/2020-12/schema");
    root.put("title", "Torqueloom study, format version 1");
    root.putAll(type(StudySchema.root()));
    return CanonicalJson.text(root);
  }

  private static Map<String, Object> type(ValueType type) {
    final Map<String, Object> schema = new LinkedHashMap<>();
    if (type instanceof ValueType.Section section) {
      section(schema, section);
    } else if (type instanceof ValueType.Whole whole) {
      schema.put("type", "integer");
      schema.put("minimum", whole.low());
      schema.put("maximum", whole.high());
    } else if (type instanceof ValueType.Flag) {
      schema.put("type", "boolean");
    } else if (type instanceof ValueType.Choice choice) {
      schema.put("enum", choice.supported());
    } else if (type instanceof ValueType.WordOr either) {
      schema.put("anyOf", List.of(Map.of("const", either.word()), type(either.other())));
    } else if (type instanceof ValueType.FileOr either) {
      schema.put("anyOf", List.of(type(either.file()), type(either.block())));
    } else if (type instanceof ValueType.Many many) {
      schema.put("type", "array");
      schema.put("items", type(many.element()));
      schema.put("minItems", many.least());
      schema.put("maxItems", many.most());
    } else {
      text(schema, type);
    }
    return schema;
  }

  private static void text(Map<String, Object> schema, ValueType type) {
    final boolean number =
        type instanceof ValueType.Quantity || type instanceof ValueType.Deviation;
    schema.put("type", number ? List.of("number", "string") : "string");
    if (type instanceof ValueType.Quantity quantity) {
      schema.put("examples", List.of(quantity.example()));
    }
  }

  private static void section(Map<String, Object> schema, ValueType.Section section) {
    final Map<String, Object> properties = new LinkedHashMap<>();
    final List<String> required = new ArrayList<>();
    for (final Key key : section.keys()) {
      final Map<String, Object> property = new LinkedHashMap<>();
      property.put("description", description(key));
      property.putAll(type(key.type()));
      properties.put(key.name(), property);
      if (key.required()) {
        required.add(key.name());
      }
    }
    schema.put("type", "object");
    schema.put("properties", properties);
    schema.put("required", required);
    schema.put("additionalProperties", false);
  }

  private static String description(Key key) {
    final String allowed =
        key.type() instanceof ValueType.Quantity ? "; " + key.type().allowed() : "";
    final String standard =
        key.standard() == null || key.standard().equals("{}") ? "" : "; default " + key.standard();
    final String later = key.use() == Use.LATER ? " (accepted, not used yet)" : "";
    return key.meaning() + allowed + standard + later;
  }
}
