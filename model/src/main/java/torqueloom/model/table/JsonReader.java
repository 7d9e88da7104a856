package torqueloom.model.table;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.json.JsonFactory;

/**
 * JSON to plain values: {@code LinkedHashMap<String, Object>}, {@code List<Object>}, {@code
 * String}, {@code Boolean}, {@code Long} for whole numbers that fit, {@code Double} for all others,
 * null. Keys given twice are an error. Nothing in a file chooses a Java type.
 */
public final class JsonReader {
  private static final JsonFactory FACTORY =
      JsonFactory.builder().enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION).build();

  private JsonReader() {}

  /**
   * Reads a file.
   *
   * @throws FileContentException if it is no JSON document
   * @throws IOException if it cannot be read
   */
  public static Object read(Path path) throws IOException {
    final String name = InputFiles.name(path);
    return parse(Utf8.decode(InputFiles.bytes(path), name), name);
  }

  /**
   * Reads a file whose document is an object.
   *
   * @throws FileContentException if it is no JSON object
   * @throws IOException if it cannot be read
   */
  public static JsonFields readObject(Path path) throws IOException {
    return JsonFields.of(read(path), InputFiles.name(path));
  }

  /**
   * Reads a text.
   *
   * @param source what messages call the text
   * @throws FileContentException if it is no JSON document
   */
  public static Object parse(String text, String source) throws FileContentException {
    try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text)) {
      if (parser.nextToken() == null) {
        throw new FileContentException(source, 0, "no content", "a JSON document is needed");
      }
      final Object value = value(parser);
      if (parser.nextToken() != null) {
        final int line = parser.currentTokenLocation().getLineNr();
        throw new FileContentException(
            source, line, "more after the document's end", "one JSON document is needed");
      }
      return value;
    } catch (final JacksonException e) {
      final int line = e.getLocation() == null ? 0 : e.getLocation().getLineNr();
      // The parser appends its own notion of the source, which says nothing here.
      final String fault = e.getOriginalMessage().replaceFirst("\\s*\\(start marker at .*", "");
      throw new FileContentException(
          source, line, "an error in the JSON (" + fault + ")", "valid JSON is needed");
    }
  }

  private static Object value(JsonParser parser) {
    final JsonToken token = parser.currentToken();
    return switch (token) {
      case START_OBJECT -> object(parser);
      case START_ARRAY -> array(parser);
      case VALUE_STRING -> parser.getString();
      case VALUE_NUMBER_INT -> whole(parser.getString());
      case VALUE_NUMBER_FLOAT -> Double.valueOf(parser.getString());
      case VALUE_TRUE -> Boolean.TRUE;
      case VALUE_FALSE -> Boolean.FALSE;
      case VALUE_NULL -> null;
      default -> throw new IllegalStateException("unexpected JSON token " + token);
    };
  }

  private static Map<String, Object> object(JsonParser parser) {
    final Map<String, Object> object = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      final String key = parser.currentName();
      parser.nextToken();
      object.put(key, value(parser));
    }
    return object;
  }

  private static List<Object> array(JsonParser parser) {
    final List<Object> array = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      array.add(value(parser));
    }
    return array;
  }

  /** {@code -0} and numbers beyond 64 bits are doubles, so that they read back as written. */
  private static Object whole(String digits) {
    if (digits.equals("-0")) {
      return -0.0;
    }
    try {
      return Long.valueOf(digits);
    } catch (final NumberFormatException e) {
      return Double.valueOf(digits);
    }
  }
}
