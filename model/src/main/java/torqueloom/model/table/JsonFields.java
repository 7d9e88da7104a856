package torqueloom.model.table;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The fields of one JSON object, read by type. Every complaint names the file and the field's path,
 * such as {@code library.json: response[3].drive}.
 */
public final class JsonFields {
  private final Map<?, ?> values;
  private final String file;
  private final String path;

  private JsonFields(Map<?, ?> values, String file, String path) {
    this.values = values;
    this.file = file;
    this.path = path;
  }

  /**
   * Wraps a value of {@link JsonReader}.
   *
   * @param file what messages call the file
   * @throws FileContentException if the value is no object
   */
  public static JsonFields of(Object value, String file) throws FileContentException {
    return of(value, file, "");
  }

  private static JsonFields of(Object value, String file, String path) throws FileContentException {
    if (value instanceof Map<?, ?> map) {
      return new JsonFields(map, file, path);
    }
    throw new FileContentException(
        file, 0, describe(value) + at(path), "an object with named fields is needed");
  }

  /** The names of the fields, in the order of the file. */
  public Set<String> names() {
    final Set<String> names = new LinkedHashSet<>();
    values.keySet().forEach(key -> names.add((String) key));
    return names;
  }

  /** Whether the field is there and not null. */
  public boolean has(String name) {
    return values.get(name) != null;
  }

  /** A number; NaN where the file says null. */
  public double number(String name) throws FileContentException {
    return number(required(name), name);
  }

  /** A whole number that fits 64 bits. */
  public long whole(String name) throws FileContentException {
    if (required(name) instanceof Long value) {
      return value;
    }
    throw wrong(name, "a whole number");
  }

  /** A whole number that fits 32 bits. */
  public int integer(String name) throws FileContentException {
    final long value = whole(name);
    if (value == (int) value) {
      return (int) value;
    }
    throw wrong(name, "a whole number below 2^31");
  }

  /** A text. */
  public String text(String name) throws FileContentException {
    if (required(name) instanceof String value) {
      return value;
    }
    throw wrong(name, "a text");
  }

  /** True or false. */
  public boolean flag(String name) throws FileContentException {
    if (required(name) instanceof Boolean value) {
      return value;
    }
    throw wrong(name, "true or false");
  }

  /** An array of numbers; NaN where the file says null. */
  public double[] numbers(String name) throws FileContentException {
    return numbers(list(name), name);
  }

  /** An array of arrays of numbers; NaN where the file says null. */
  public double[][] matrix(String name) throws FileContentException {
    final List<?> rows = list(name);
    final double[][] matrix = new double[rows.size()][];
    for (int i = 0; i < matrix.length; i++) {
      if (!(rows.get(i) instanceof List<?> row)) {
        throw wrong(name, "an array of arrays of numbers");
      }
      matrix[i] = numbers(row, name + "[" + i + "]");
    }
    return matrix;
  }

  /** An array of whole numbers that fit 32 bits. */
  public int[] integers(String name) throws FileContentException {
    final double[] values = numbers(name);
    final int[] integers = new int[values.length];
    for (int i = 0; i < integers.length; i++) {
      integers[i] = (int) values[i];
      if (integers[i] != values[i]) {
        throw wrong(name, "an array of whole numbers");
      }
    }
    return integers;
  }

  /** An array of texts. */
  public List<String> texts(String name) throws FileContentException {
    final List<String> texts = new ArrayList<>();
    for (final Object item : list(name)) {
      if (!(item instanceof String text)) {
        throw wrong(name, "an array of texts");
      }
      texts.add(text);
    }
    return texts;
  }

  /** An object. */
  public JsonFields object(String name) throws FileContentException {
    return of(required(name), file, pathOf(name));
  }

  /** An array of objects. */
  public List<JsonFields> objects(String name) throws FileContentException {
    final List<?> list = list(name);
    final List<JsonFields> objects = new ArrayList<>(list.size());
    for (int i = 0; i < list.size(); i++) {
      objects.add(of(list.get(i), file, pathOf(name) + "[" + i + "]"));
    }
    return objects;
  }

  /** A complaint about a field of this object, for checks of the caller's own. */
  public FileContentException wrong(String name, String wanted) {
    return new FileContentException(
        file, 0, describe(values.get(name)) + at(pathOf(name)), wanted + " is needed");
  }

  private List<?> list(String name) throws FileContentException {
    if (required(name) instanceof List<?> list) {
      return list;
    }
    throw wrong(name, "an array");
  }

  private double[] numbers(List<?> list, String name) throws FileContentException {
    final double[] numbers = new double[list.size()];
    for (int i = 0; i < numbers.length; i++) {
      numbers[i] = number(list.get(i), name + "[" + i + "]");
    }
    return numbers;
  }

  private double number(Object value, String name) throws FileContentException {
    if (value == null) {
      return Double.NaN;
    }
    if (value instanceof Number number) {
      return number.doubleValue();
    }
    throw new FileContentException(
        file, 0, describe(value) + at(pathOf(name)), "a number is needed");
  }

  private Object required(String name) throws FileContentException {
    if (!values.containsKey(name)) {
      throw new FileContentException(
          file, 0, "no field " + pathOf(name), "the field must be there");
    }
    return values.get(name);
  }

  private String pathOf(String name) {
    return path.isEmpty() ? name : path + "." + name;
  }

  private static String at(String path) {
    return path.isEmpty() ? "" : " at " + path;
  }

  private static String describe(Object value) {
    if (value instanceof Map) {
      return "an object";
    }
    if (value instanceof List) {
      return "an array";
    }
    return value instanceof String ? "\"" + value + "\"" : String.valueOf(value);
  }
}
