package torqueloom.model.device;

import java.util.List;
import java.util.Optional;

/**
 * Derived quantities and warnings of one device at one temperature under one protocol.
 *
 * @param kind the kind's name in a study file
 * @param temperatureKelvin temperature (K)
 * @param device magnetic (or phase) quantities, in printing order
 * @param electrical current, voltage, power, energy, heating, readout, in printing order
 * @param warnings in order of weight
 */
public record DeviceSummary(
    String kind,
    double temperatureKelvin,
    List<DerivedQuantity> device,
    List<DerivedQuantity> electrical,
    List<DeviceWarning> warnings) {

  /** Copies the lists. */
  public DeviceSummary {
    device = List.copyOf(device);
    electrical = List.copyOf(electrical);
    warnings = List.copyOf(warnings);
  }

  /** The value of a numeric quantity by key, from either list; empty when the kind lacks it. */
  public Optional<Double> number(String key) {
    return java.util.stream.Stream.concat(device.stream(), electrical.stream())
        .filter(q -> q.key().equals(key) && q.value() instanceof Double)
        .map(q -> (Double) q.value())
        .findFirst();
  }
}
