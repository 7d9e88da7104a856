package torqueloom.model.table;

import java.io.IOException;
import java.lang.reflect.Array;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.work.AtomicFiles;

/**
 * JSON whose bytes depend on nothing but the values.
 *
 * <p>Written are maps (in their order, keys are strings), records (components in order), iterables,
 * arrays, strings, enum constants by name, booleans, whole and floating numbers and null. A double stands in the shortest
 * form that reads back to the same double, {@code 300} for 300.0; NaN, infinity and null all become
 * {@code null}, the value that is not known. An array without objects or arrays in it stands on one
 * line. The text is UTF-8 with LF ends.
 */
public final class CanonicalJson {
  private final StringBuilder out = new StringBuilder();
  private final boolean sorted;
  private final boolean compact;

  private CanonicalJson(boolean sorted, boolean compact) {
    this.sorted = sorted;
    this.compact = compact;
  }

  /**
   * The document, indented by two blanks, with one newline at its end.
   *
   * @throws IllegalArgumentException if a value is of another type than those of this class's text
   */
  public static String text(Object value) {
    return new CanonicalJson(false, false).document(value) + "\n";
  }

  /** The document on one line without any blank or newline, for lines of a store. */
  public static String line(Object value) {
    return new CanonicalJson(false, true).document(value);
  }

  /** As {@link #line}, the keys of every object sorted by their characters: for digests. */
  public static String sortedLine(Object value) {
    return new CanonicalJson(true, true).document(value);
  }

  /** {@link #text} in UTF-8. */
  public static byte[] bytes(Object value) {
    return text(value).getBytes(StandardCharsets.UTF_8);
  }

  /**
   * Writes {@link #text} to a file, whole or not at all.
   *
   * @throws IOException if the file cannot be written
   */
  public static void write(Path path, Object value) throws IOException {
    AtomicFiles.write(path, bytes(value));
  }

  /** One number as it stands in the JSON; {@code null} for NaN and infinity. */
  public static String number(double value) {
    return Double.isFinite(value) ? ShortestDecimal.of(value) : "null";
  }

  private String document(Object value) {
    append(value, 0);
    return out.toString();
  }

  private void append(Object value, int depth) {
    if (value == null || value instanceof Boolean) {
      out.append(value);
    } else if (value instanceof Number number) {
      out.append(numberText(number));
    } else if (value instanceof CharSequence text) {
      JsonText.appendQuoted(out, text);
    } else if (value instanceof Enum<?> constant) {
      JsonText.appendQuoted(out, constant.name());
    } else if (value instanceof Map<?, ?> map) {
      appendObject(map, depth);
    } else if (value instanceof Record record) {
      appendObject(components(record), depth);
    } else if (value instanceof Iterable<?> items) {
      appendArray(listOf(items), depth);
    } else if (value.getClass().isArray()) {
      appendArray(listOfArray(value), depth);
    } else {
      throw new IllegalArgumentException(
          "no JSON form for a value of type " + value.getClass().getName());
    }
  }

  private static String numberText(Number number) {
    if (number instanceof Double value) {
      return number(value);
    }
    if (number instanceof Float value) {
      return Float.isFinite(value) ? ShortestDecimal.of(value.floatValue()) : "null";
    }
    if (number instanceof Integer
        || number instanceof Long
        || number instanceof Short
        || number instanceof Byte) {
      return number.toString();
    }
    throw new IllegalArgumentException("no JSON form for a " + number.getClass().getName());
  }

  private void appendObject(Map<?, ?> map, int depth) {
    final Map<String, Object> entries = sorted ? new TreeMap<>() : new LinkedHashMap<>();
    for (final Map.Entry<?, ?> entry : map.entrySet()) {
      if (!(entry.getKey() instanceof String key)) {
        throw new IllegalArgumentException("a JSON key must be text, got " + entry.getKey());
      }
      entries.put(key, entry.getValue());
    }
    out.append('{');
    boolean first = true;
    for (final Map.Entry<String, Object> entry : entries.entrySet()) {
      separate(first, depth + 1);
      first = false;
      JsonText.appendQuoted(out, entry.getKey());
      out.append(compact ? ":" : ": ");
      append(entry.getValue(), depth + 1);
    }
    close(first, depth, '}');
  }

  private void appendArray(List<?> items, int depth) {
    final boolean oneLine = items.stream().allMatch(CanonicalJson::isScalar);
    out.append('[');
    boolean first = true;
    for (final Object item : items) {
      if (oneLine) {
        out.append(first ? "" : compact ? "," : ", ");
      } else {
        separate(first, depth + 1);
      }
      first = false;
      append(item, depth + 1);
    }
    close(oneLine || first, depth, ']');
  }

  private void separate(boolean first, int depth) {
    out.append(first ? "" : ",");
    newLine(depth);
  }

  private void close(boolean sameLine, int depth, char bracket) {
    if (!sameLine) {
      newLine(depth);
    }
    out.append(bracket);
  }

  private void newLine(int depth) {
    if (!compact) {
      out.append('\n').append("  ".repeat(depth));
    }
  }

  private static boolean isScalar(Object value) {
    return value == null
        || value instanceof Boolean
        || value instanceof Number
        || value instanceof CharSequence
        || value instanceof Enum<?>;
  }

  private static Map<String, Object> components(Record record) {
    final Map<String, Object> values = new LinkedHashMap<>();
    for (final RecordComponent component : record.getClass().getRecordComponents()) {
      values.put(component.getName(), read(record, component));
    }
    return values;
  }

  private static Object read(Record record, RecordComponent component) {
    try {
      component.getAccessor().setAccessible(true);
      return component.getAccessor().invoke(record);
    } catch (final IllegalAccessException | InvocationTargetException e) {
      throw new IllegalArgumentException(
          "cannot read " + component + " of " + record.getClass(), e);
    }
  }

  private static List<Object> listOf(Iterable<?> items) {
    final List<Object> list = new ArrayList<>();
    items.forEach(list::add);
    return list;
  }

  private static List<Object> listOfArray(Object array) {
    final int length = Array.getLength(array);
    final List<Object> list = new ArrayList<>(length);
    for (int i = 0; i < length; i++) {
      list.add(Array.get(array, i));
    }
    return list;
  }
}
