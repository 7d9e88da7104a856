package torqueloom.model.response;

import java.lang.reflect.Array;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * SHA-256 of everything that a library depends on: the device's parameters in SI, protocol,
 * tolerances, trim, settings, temperatures, seed, and the version of the algorithm. Doubles enter
 * by their bits. Two calibrations with one digest give the same library.
 */
final class CalibrationDigest {
  /** Raised whenever the same calibration would give other numbers. */
  static final int ALGORITHM = 3;

  private CalibrationDigest() {}

  static String of(Calibration calibration) {
    final StringBuilder text = new StringBuilder("response-library ").append(ALGORITHM);
    append(text, calibration.nominal().kindName());
    append(text, calibration.nominal().parameters());
    append(text, calibration.protocol());
    append(text, calibration.tolerances());
    append(text, calibration.trim());
    append(text, calibration.settings());
    append(text, calibration.temperatures());
    append(text, calibration.seed());
    try {
      final byte[] hash =
          MessageDigest.getInstance("SHA-256")
              .digest(text.toString().getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(hash);
    } catch (final NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  private static void append(StringBuilder text, Object value) {
    text.append('\n');
    if (value == null) {
      text.append("null");
    } else if (value instanceof Double number) {
      text.append(Double.toHexString(number));
    } else if (value instanceof Number || value instanceof Boolean) {
      text.append(value);
    } else if (value instanceof Enum<?> constant) {
      text.append(constant.name());
    } else if (value instanceof CharSequence letters) {
      text.append(letters.length()).append(':').append(letters);
    } else if (value instanceof Optional<?> optional) {
      append(text, optional.orElse(null));
    } else if (value instanceof Map<?, ?> map) {
      appendMap(text, map);
    } else if (value instanceof Iterable<?> items) {
      text.append('[');
      items.forEach(item -> append(text, item));
      text.append("\n]");
    } else if (value.getClass().isArray()) {
      appendArray(text, value);
    } else if (value instanceof Record record) {
      appendRecord(text, record);
    } else {
      throw new IllegalArgumentException("no digest for a value of type " + value.getClass());
    }
  }

  private static void appendMap(StringBuilder text, Map<?, ?> map) {
    final Map<String, Object> sorted = new TreeMap<>();
    map.forEach((key, item) -> sorted.put(String.valueOf(key), item));
    text.append('{');
    sorted.forEach(
        (key, item) -> {
          append(text, key);
          append(text, item);
        });
    text.append("\n}");
  }

  private static void appendArray(StringBuilder text, Object array) {
    text.append('[');
    for (int i = 0; i < Array.getLength(array); i++) {
      append(text, Array.get(array, i));
    }
    text.append("\n]");
  }

  private static void appendRecord(StringBuilder text, Record record) {
    final Map<String, Object> components = new TreeMap<>();
    for (final RecordComponent component : record.getClass().getRecordComponents()) {
      try {
        component.getAccessor().setAccessible(true);
        components.put(component.getName(), component.getAccessor().invoke(record));
      } catch (final IllegalAccessException | InvocationTargetException e) {
        throw new IllegalArgumentException("cannot read " + component, e);
      }
    }
    appendMap(text, components);
  }
}
