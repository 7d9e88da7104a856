package torqueloom.model.work;

import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.json.JsonFactory;

/** Lines of the store: one JSON object of texts each, UTF-8, ended by LF. */
final class StoreLines {
  private static final JsonFactory FACTORY = new JsonFactory();

  private StoreLines() {}

  /** The line of a result, its LF included. */
  static byte[] encode(StoredUnit unit) {
    final StringWriter out = new StringWriter();
    try (JsonGenerator json = FACTORY.createGenerator(ObjectWriteContext.empty(), out)) {
      json.writeStartObject();
      json.writeStringProperty("stage", unit.stage());
      json.writeStringProperty("digest", unit.digest());
      json.writeStringProperty("key", unit.key());
      json.writeStringProperty("payload", unit.payload());
      json.writeEndObject();
    }
    return (out + "\n").getBytes(StandardCharsets.UTF_8);
  }

  /** The result in a line without its LF; empty if the line is damaged. */
  static Optional<StoredUnit> decode(byte[] line, int length) {
    try (JsonParser json =
        FACTORY.createParser(
            ObjectReadContext.empty(), new String(line, 0, length, StandardCharsets.UTF_8))) {
      if (json.nextToken() != JsonToken.START_OBJECT) {
        return Optional.empty();
      }
      final Map<String, String> fields = new HashMap<>();
      while (json.nextToken() == JsonToken.PROPERTY_NAME) {
        final String name = json.currentName();
        if (json.nextToken() != JsonToken.VALUE_STRING) {
          return Optional.empty();
        }
        fields.put(name, json.getString());
      }
      if (json.currentToken() != JsonToken.END_OBJECT || json.nextToken() != null) {
        return Optional.empty();
      }
      return unit(fields);
    } catch (final JacksonException e) {
      return Optional.empty();
    }
  }

  private static Optional<StoredUnit> unit(Map<String, String> fields) {
    if (fields.keySet().equals(Set.of("stage", "digest", "key", "payload"))) {
      return Optional.of(
          new StoredUnit(
              fields.get("stage"), fields.get("digest"), fields.get("key"), fields.get("payload")));
    }
    return Optional.empty();
  }
}
