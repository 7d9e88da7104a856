package torqueloom.model.response;

import java.util.List;
import java.util.Optional;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.device.DriveProtocol;
import torqueloom.model.random.Purpose;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;

/**
 * Everything that a response library depends on. All values are SI.
 *
 * @param nominal the device without spread
 * @param protocol how it is driven
 * @param tolerances spreads from which the instances are drawn
 * @param trim how drawn devices are trimmed, if at all
 * @param settings how finely
 * @param temperatures at which the responses are wanted (K), distinct, at least one
 * @param seed study seed
 */
public record Calibration(
    DeviceKind nominal,
    DriveProtocol protocol,
    Tolerances tolerances,
    Optional<Trim> trim,
    CalibrationSettings settings,
    List<Double> temperatures,
    long seed) {

  /** @throws IllegalArgumentException for a bipolar protocol or bad temperatures */
  public Calibration {
    temperatures = List.copyOf(temperatures);
    if (protocol.bipolar()) {
      throw new IllegalArgumentException("polarity: this version calibrates unipolar drives only");
    }
    if (temperatures.isEmpty() || temperatures.stream().distinct().count() < temperatures.size()) {
      throw new IllegalArgumentException("temperatures must be distinct, got " + temperatures);
    }
    for (final double temperature : temperatures) {
      if (!(temperature > 0 && Double.isFinite(temperature))) {
        throw new IllegalArgumentException("a temperature must be positive, got " + temperature);
      }
    }
  }

  /**
   * One instance as it works at a temperature, after trim. The draw does not know the temperature, so
   * an instance is the same device at all of them. Trim restores the nominal imbalance of the
   * reference temperature; the nominal device is itself trimmed only away from that temperature, and
   * only by a trim that is made anew there.
   *
   * @param instance 0 for the nominal device
   * @param temperature (K)
   */
  public DeviceKind device(int instance, double temperature) {
    final double target = nominal.imbalance(nominal.referenceTemperature());
    if (instance == 0) {
      final boolean settled = temperature == nominal.referenceTemperature();
      return trim.filter(t -> t.retrim() && !settled)
          .map(t -> t.apply(nominal, temperature, target))
          .orElse(nominal);
    }
    final DeviceKind drawn =
        tolerances.draw(nominal, seed, Purpose.LIBRARY_INSTANCE, instance, 0, 0);
    return trim.map(t -> t.apply(drawn, temperature, target)).orElse(drawn);
  }

  /** Last drive of the nominal device (drive unit), see {@link DriveRange}. */
  double driveEnd() {
    final double margin = DriveRange.margin(nominal, nominal.referenceTemperature(), tolerances);
    return protocol.maximumDrive() * (1 + margin);
  }

  /** The temperature of the list that is nearest to the nominal device's reference (K). */
  double referenceTemperature() {
    double best = temperatures.get(0);
    for (final double temperature : temperatures) {
      if (Math.abs(temperature - nominal.referenceTemperature())
          < Math.abs(best - nominal.referenceTemperature())) {
        best = temperature;
      }
    }
    return best;
  }
}
