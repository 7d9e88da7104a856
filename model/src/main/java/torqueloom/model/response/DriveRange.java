package torqueloom.model.response;

import java.util.Map;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.tolerance.Spread;
import torqueloom.model.tolerance.Tolerances;

/**
 * The torque fields that a library covers. A drawn neuron turns a drive into another torque field
 * than the nominal device does, so the library reaches beyond the largest drive by the margin
 *
 * <pre>  min(4 s, 25 %),   s² = sum over tolerances p of (d ln torque/d ln p)² (s_chip² + s_device²)</pre>
 *
 * and every instance is calibrated over the same torque fields, from 0 to that end: nothing is ever
 * extrapolated, and drive index d means the same torque field for all.
 */
final class DriveRange {
  /** Largest margin (1). */
  static final double LARGEST_MARGIN = 0.25;

  /** Step of the relative derivative (1). */
  private static final double STEP = 1e-3;

  private DriveRange() {}

  /** Share by which the range exceeds the largest drive (1). */
  static double margin(DeviceKind nominal, double temperature, Tolerances tolerances) {
    double squares = 0;
    for (final Map.Entry<String, Spread> entry : tolerances.spreads().entrySet()) {
      final double above = nominal.scaled(entry.getKey(), 1 + STEP).torquePerDrive(temperature);
      final double below = nominal.scaled(entry.getKey(), 1 - STEP).torquePerDrive(temperature);
      final double slope = (above - below) / (2 * STEP) / nominal.torquePerDrive(temperature);
      final Spread spread = entry.getValue();
      squares +=
          slope * slope * (spread.chip() * spread.chip() + spread.device() * spread.device());
    }
    return Math.min(Tolerances.LIMIT * Math.sqrt(squares), LARGEST_MARGIN);
  }

  /**
   * Drives of one instance.
   *
   * @param end last drive of the nominal device (drive unit)
   * @param torqueRatio torque of the nominal device over that of the instance (1)
   * @param points number of drives, the first at 0
   */
  static double[] drives(double end, double torqueRatio, int points) {
    final double[] drives = new double[points];
    for (int d = 0; d < points; d++) {
      drives[d] = end * torqueRatio * d / (points - 1);
    }
    return drives;
  }
}
