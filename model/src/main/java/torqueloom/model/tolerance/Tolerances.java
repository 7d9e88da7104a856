package torqueloom.model.tolerance;

import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;

/**
 * Tolerances of a device by parameter, and the draw of one device. Draws are standard normals keyed
 * by (parameter, chip, layer, row, column), truncated at 4 sigma and scaled by the spread, so that
 * adding a tolerance or changing a width moves no other draw and comparisons are paired.
 *
 * @param spreads by parameter name, sorted
 */
public record Tolerances(Map<String, Spread> spreads) {
  /** Truncation of the normal draws (sigma). */
  public static final double LIMIT = 4;

  /** No tolerances at all. */
  public static final Tolerances NONE = new Tolerances(Map.of());

  /** Sorts and copies the map. */
  public Tolerances {
    spreads = Collections.unmodifiableMap(new TreeMap<>(spreads));
  }

  /**
   * One drawn device.
   *
   * @param nominal the device without spread
   * @param seed study seed
   * @param purpose {@link Purpose#CHIP_NEURON} or {@link Purpose#LIBRARY_INSTANCE}
   * @param chip chip number (the instance number for the library)
   * @param layer layer number
   * @param column neuron number
   */
  public DeviceKind draw(
      DeviceKind nominal, long seed, Purpose purpose, long chip, long layer, long column) {
    DeviceKind device = nominal;
    for (final Map.Entry<String, Spread> entry : spreads.entrySet()) {
      final long parameter = parameterCode(entry.getKey());
      final Spread spread = entry.getValue();
      final double shared =
          Streams.truncatedNormal(
              Streams.key(seed, purpose, parameter, chip, -1, -1, -1), 0, LIMIT);
      final double own =
          Streams.truncatedNormal(
              Streams.key(seed, purpose, parameter, chip, layer, 0, column), 0, LIMIT);
      final double factor = 1 + spread.chip() * shared + spread.device() * own;
      device = device.scaled(entry.getKey(), Math.max(factor, SMALLEST_FACTOR));
    }
    return device;
  }

  /** A factor never reaches zero, however wide the spread (1). */
  private static final double SMALLEST_FACTOR = 1e-3;

  /** A number for a parameter name that depends on nothing but the name. */
  private static long parameterCode(String name) {
    long code = 0;
    for (int i = 0; i < name.length(); i++) {
      code = code * 131 + name.charAt(i);
    }
    return code;
  }
}
