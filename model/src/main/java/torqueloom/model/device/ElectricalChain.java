package torqueloom.model.device;

/**
 * What one neuron costs electrically. All values are SI.
 *
 * @param stripResistance resistance of the driven strip with magnet and contacts (ohm)
 * @param currentPerDrive current into the device per current density in the strip (A per A/m²)
 * @param supplyVoltage supply that delivers the current (V); energy drawn counts the supply
 * @param pulse pulse length (s)
 * @param readEnergyPerSlot energy of the readout junction or probe in one slot (J)
 * @param electronicsEnergyPerSlot comparator, counter and pulse driver, a neuron and slot (J)
 * @param biasPower static power of a continuous bias current (W)
 */
public record ElectricalChain(
    double stripResistance,
    double currentPerDrive,
    double supplyVoltage,
    double pulse,
    double readEnergyPerSlot,
    double electronicsEnergyPerSlot,
    double biasPower) {

  /** Energy drawn from the supply by one pulse of a drive (J): I V t. */
  public double pulseEnergy(double drive) {
    return Math.abs(drive) * currentPerDrive * supplyVoltage * pulse;
  }

  /** Heat in the device by one pulse of a drive (J): I² R t. */
  public double pulseHeat(double drive) {
    final double current = drive * currentPerDrive;
    return current * current * stripResistance * pulse;
  }
}
