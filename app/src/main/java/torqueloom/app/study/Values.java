package torqueloom.app.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The values of a study by dotted key, SI: Double, Long, Boolean, String or a List of them. Filled by
 * the reader, defaults included; a key with a fault is absent.
 */
final class Values {
  private final NavigableMap<String, Object> values = new TreeMap<>();
  private final Map<String, Place> places = new HashMap<>();

  /** A place in the file, both numbers from 1. */
  record Place(int line, int column) {}

  void put(String key, Object value) {
    values.put(key, value);
  }

  void place(String key, Place place) {
    places.put(key, place);
  }

  void remove(String key) {
    values.remove(key);
  }

  /** Where a key's value stands; where its block stands for a default. */
  Place placeOf(String key) {
    String at = key;
    while (!places.containsKey(at)) {
      final int dot = at.lastIndexOf('.');
      if (dot < 0) {
        return new Place(1, 1);
      }
      at = at.substring(0, dot);
    }
    return places.get(at);
  }

  /** Whether the user wrote the key. */
  boolean isWritten(String key) {
    return places.containsKey(key);
  }

  /** Whether a key, or any key of a block, has a value. */
  boolean has(String key) {
    if (values.containsKey(key)) {
      return true;
    }
    final String next = values.ceilingKey(key + ".");
    return next != null && next.startsWith(key + ".");
  }

  Optional<Object> find(String key) {
    return Optional.ofNullable(values.get(key));
  }

  Optional<Double> findNumber(String key) {
    return find(key).filter(Double.class::isInstance).map(Double.class::cast);
  }

  double number(String key) {
    return (Double) required(key);
  }

  int whole(String key) {
    return Math.toIntExact(longWhole(key));
  }

  long longWhole(String key) {
    return (Long) required(key);
  }

  boolean flag(String key) {
    return (Boolean) required(key);
  }

  String text(String key) {
    return (String) required(key);
  }

  Optional<String> findText(String key) {
    return find(key).filter(String.class::isInstance).map(String.class::cast);
  }

  List<Double> numbers(String key) {
    final List<Double> numbers = new ArrayList<>();
    for (final Object each : (List<?>) required(key)) {
      numbers.add((Double) each);
    }
    return numbers;
  }

  int[] wholes(String key) {
    return ((List<?>) required(key)).stream().mapToInt(v -> Math.toIntExact((Long) v)).toArray();
  }

  /** All values, keys sorted. */
  NavigableMap<String, Object> all() {
    return values;
  }

  private Object required(String key) {
    final Object value = values.get(key);
    if (value == null) {
      throw new IllegalStateException("no value for " + key);
    }
    return value;
  }
}
