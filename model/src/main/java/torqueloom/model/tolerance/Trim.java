package torqueloom.model.tolerance;

import torqueloom.model.device.DeviceKind;

/**
 * Trim of a neuron's imbalance through its gate, in its simple form: the interfacial anisotropy is
 * shifted by the level nearest to the shift that restores the nominal imbalance.
 *
 * @param range largest shift of the interfacial anisotropy, plus and minus (J/m²), &gt; 0
 * @param levels number of levels over the whole range, &gt;= 2
 * @param temperature at which a trim made once is settled (K)
 * @param retrim whether the trim is made anew at each temperature
 */
public record Trim(double range, int levels, double temperature, boolean retrim) {
  /** @throws IllegalArgumentException naming the first value out of range */
  public Trim {
    if (!(range > 0 && Double.isFinite(range))) {
      throw new IllegalArgumentException("range must be positive, got " + range + " J/m²");
    }
    if (levels < 2) {
      throw new IllegalArgumentException("levels must be at least 2, got " + levels);
    }
    if (!(temperature > 0)) {
      throw new IllegalArgumentException("temperature must be positive, got " + temperature + " K");
    }
  }

  /** Shift given to a device that works at a temperature (J/m²), one of the levels. */
  public double shift(DeviceKind device, double workingTemperature, double target) {
    final double at = retrim ? workingTemperature : temperature;
    final double wanted = device.balancingShift(at, target);
    final double step = 2 * range / (levels - 1);
    final double level = Math.rint((wanted + range) / step);
    return Math.max(0, Math.min(levels - 1, level)) * step - range;
  }

  /** The device after trim for work at a temperature. */
  public DeviceKind apply(DeviceKind device, double workingTemperature, double target) {
    return device.trimmed(shift(device, workingTemperature, target));
  }
}
