package torqueloom.model.device;

import java.util.ArrayList;
import java.util.List;

/** Electrical chain of the ferromagnet: strip, readout, gate, in printing order. */
final class ElectricalQuantities {
  private final EasyPlaneFerromagnet device;
  private final FerromagnetState state;
  private final DriveProtocol protocol;
  private final StripChain strip;
  private final ReadChain read;

  ElectricalQuantities(
      EasyPlaneFerromagnet device, FerromagnetState state, DriveProtocol protocol) {
    this.device = device;
    this.state = state;
    this.protocol = protocol;
    this.strip = StripChain.of(device);
    this.read = ReadChain.of(device, state, strip);
  }

  StripChain strip() {
    return strip;
  }

  ReadChain read() {
    return read;
  }

  ElectricalChain chain() {
    return new ElectricalChain(
        strip.resistance(),
        strip.currentPerDrive(),
        device.drive().supplyVoltage(),
        protocol.pulse(),
        read.power() * protocol.slot(),
        device.readout().electronicsEnergy(),
        Math.abs(protocol.bias()) * strip.currentPerDrive() * device.drive().supplyVoltage());
  }

  List<DerivedQuantity> list() {
    final List<DerivedQuantity> list = new ArrayList<>();
    addStrip(list);
    addHeat(list);
    addReadout(list);
    addSignal(list);
    addGate(list);
    list.removeIf(q -> q.value() instanceof Double number && !Double.isFinite(number));
    return list;
  }

  private void addStrip(List<DerivedQuantity> list) {
    final double threshold = state.plane().threshold() / Math.abs(state.torquePerDrive());
    final double most = Math.abs(protocol.maximumDrive()) + Math.abs(protocol.bias());
    final double current = most * strip.currentPerDrive();
    add(
        list,
        "stripResistanceOhms",
        "strip with film and contacts",
        "R",
        strip.resistance(),
        "ohm");
    add(
        list,
        "shuntedShare",
        "share of the current that flows in the film",
        "",
        strip.shuntRatio() / (1 + strip.shuntRatio()),
        "1");
    add(
        list,
        "thresholdCurrentAmperes",
        "current at the threshold",
        "I_c",
        threshold * strip.currentPerDrive(),
        "A");
    add(
        list,
        "maximumCurrentAmperes",
        "current at the maximum drive, bias included",
        "I_max",
        current,
        "A");
    add(
        list,
        "maximumVoltageVolts",
        "voltage at the maximum drive",
        "",
        current * strip.resistance(),
        "V");
    add(list, "supplyVoltageVolts", "supply voltage", "", device.drive().supplyVoltage(), "V");
    add(
        list,
        "pulsePowerWatts",
        "power from the supply during a pulse of maximum drive",
        "",
        current * device.drive().supplyVoltage(),
        "W");
    add(
        list,
        "pulseEnergyJoules",
        "energy from the supply for a pulse of maximum drive",
        "",
        chain().pulseEnergy(protocol.maximumDrive()),
        "J");
    add(
        list,
        "thresholdPulseEnergyJoules",
        "energy from the supply for a pulse at threshold",
        "",
        chain().pulseEnergy(threshold),
        "J");
  }

  private void addHeat(List<DerivedQuantity> list) {
    final double most = protocol.maximumDrive();
    add(
        list,
        "pulseHeatJoules",
        "heat in strip, film and contacts by a pulse of maximum drive",
        "",
        chain().pulseHeat(most),
        "J");
    add(
        list,
        "meanTemperatureRiseKelvin",
        "mean temperature rise, maximum drive in every slot",
        "",
        strip.meanRise(most, protocol),
        "K");
    add(
        list,
        "biasTemperatureRiseKelvin",
        "mean temperature rise by the continuous bias alone",
        "",
        strip.meanRise(0, protocol),
        "K");
    add(
        list,
        "pulseTemperatureRiseKelvin",
        "temperature rise at the end of a pulse of maximum drive",
        "",
        strip.pulseRise(most, protocol.pulse()),
        "K");
  }

  private void addReadout(List<DerivedQuantity> list) {
    final double t = device.film().thickness();
    add(
        list,
        "sensorResistanceOhms",
        "mean resistance of the sensor",
        "",
        read.sensorResistance(),
        "ohm");
    add(list, "readCurrentAmperes", "mean read current", "I_read", read.current(), "A");
    add(list, "readPowerWatts", "power in the sensor", "", read.power(), "W");
    add(
        list,
        "readEnergyPerSlotJoules",
        "energy of the read in one slot",
        "",
        read.power() * protocol.slot(),
        "J");
    add(list, "readTorqueTesla", "torque field of the read current", "", read.torqueField(), "T");
    add(
        list,
        "readTorqueRatio",
        "read torque over threshold",
        "",
        read.torqueField() / state.plane().threshold(),
        "1");
    add(
        list,
        "readTemperatureRiseKelvin",
        "temperature rise by the read current",
        "",
        read.power() * device.drive().thermalResistance(),
        "K");
    add(
        list,
        "readAnisotropyShift",
        "shift of the interfacial anisotropy by the read voltage (the stated value includes it)",
        "",
        read.anisotropyShift(),
        "J/m^2");
    add(
        list,
        "readImbalanceShiftTesla",
        "the same as a shift of the imbalance",
        "",
        -2 * read.anisotropyShift() / (state.magnetization() * t),
        "T");
  }

  private void addSignal(List<DerivedQuantity> list) {
    add(
        list,
        "signalHalfSwingAmperes",
        "half swing of the signal current",
        "",
        read.halfSwing(),
        "A");
    add(
        list,
        "readBandwidthHertz",
        "-3 dB frequency of amplifier and input",
        "",
        read.bandwidth(),
        "Hz");
    add(
        list,
        "noiseCurrentAmperes",
        "noise current in the band, standard deviation",
        "",
        read.relativeNoise() * read.halfSwing(),
        "A");
    add(list, "relativeNoise", "noise over half swing", "", read.relativeNoise(), "1");
    add(
        list,
        "signalToNoiseDecibels",
        "half swing over noise",
        "SNR",
        -20 * StrictMath.log10(read.relativeNoise()),
        "dB");
    add(
        list,
        "falseCountsPerSlot",
        "counts by amplifier noise alone in a quiet slot",
        "",
        falseCounts(),
        "1");
    add(
        list,
        "electronicsEnergyJoules",
        "comparator, counter and pulse driver, a neuron and slot",
        "",
        device.readout().electronicsEnergy(),
        "J");
  }

  double falseCounts() {
    final Readout readout = device.readout();
    final double mx = state.restDirections()[0][0];
    final double rest =
        readout.kind() == Readout.Kind.TUNNEL_JUNCTION ? Math.abs(mx) : 2 * mx * mx - 1;
    final double level =
        readout.kind() == Readout.Kind.TUNNEL_JUNCTION && mx < 0
            ? -readout.countHigh()
            : readout.countLow();
    return read.falseCounts(rest, level, protocol.slot());
  }

  private void addGate(List<DerivedQuantity> list) {
    final Gate gate = device.gate();
    final double perVolt = gate.voltageCoefficient() / gate.dielectricThickness();
    final double breakdown = gate.breakdownField() * gate.dielectricThickness();
    final double toField = 2 / (state.magnetization() * device.film().thickness());
    add(
        list,
        "gateAnisotropyPerVolt",
        "anisotropy shift per gate volt, downward for plus",
        "",
        perVolt,
        "J/(V m^2)");
    add(
        list,
        "gateImbalancePerVolt",
        "imbalance shift per gate volt",
        "",
        perVolt * toField,
        "T/V");
    add(list, "gateBreakdownVolts", "gate voltage at breakdown", "", breakdown, "V");
    add(
        list,
        "gateRangeTesla",
        "imbalance shift at breakdown, plus and minus",
        "",
        perVolt * breakdown * toField,
        "T");
    add(
        list,
        "gateVoltageVolts",
        "gate voltage of this device's trim",
        "",
        gate.voltageFor(device.trimShift()),
        "V");
    add(
        list,
        "gateFieldVoltsPerMeter",
        "gate field of this device's trim",
        "",
        Math.abs(gate.voltageFor(device.trimShift())) / gate.dielectricThickness(),
        "V/m");
  }

  private static void add(
      List<DerivedQuantity> list,
      String key,
      String label,
      String symbol,
      double value,
      String unit) {
    list.add(new DerivedQuantity(key, label, symbol, value + 0.0, unit));
  }
}
