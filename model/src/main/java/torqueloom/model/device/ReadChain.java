package torqueloom.model.device;

import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.magnet.SpinTorque;

/**
 * The readout at work: current, its side effects on the film, signal and noise.
 *
 * <p>Noise of a tunnel junction: S_I = 2 e I coth(eV/(2 k T)) for shot and Johnson noise together,
 * plus 4 k T_amp R_load/(R + R_load)² for the input stage (white, one-sided). The input stage senses
 * current: its input resistance is the load, and its Johnson noise is a voltage in series with the
 * sensor R, which therefore holds it down (J. B. Johnson and H. Nyquist, Phys. Rev. 32, 97 and 110
 * (1928), from memory). A voltage amplifier across the same load would see the load's noise in full,
 * 4 k T_amp/R_load, some 40 dB more. The amplifier is a second-order
 * Butterworth low pass; the input's time constant (load parallel to the sensor, times capacitance)
 * lowers its -3 dB frequency as 1/f² = 1/f_amp² + 1/f_RC², a fair account as long as the input is
 * the faster of the two.
 *
 * @param current mean read current (A)
 * @param power in the sensor (W)
 * @param sensorResistance mean resistance of the sensor (ohm)
 * @param halfSwing half the change of the current between the signal's ends +1 and -1 (A)
 * @param noiseDensity S_I (A²/Hz)
 * @param bandwidth -3 dB frequency of amplifier and input together (Hz)
 * @param torqueField spin-torque field of the read current itself (T)
 * @param anisotropyShift shift of K_i by the read voltage (J/m²)
 */
record ReadChain(
    double current,
    double power,
    double sensorResistance,
    double halfSwing,
    double noiseDensity,
    double bandwidth,
    double torqueField,
    double anisotropyShift) {

  /** Noise bandwidth of a second-order Butterworth low pass over its -3 dB frequency (1). */
  private static final double NOISE_BANDWIDTH = Math.PI / (2 * Math.sqrt(2));

  static ReadChain of(EasyPlaneFerromagnet device, FerromagnetState state, StripChain strip) {
    return device.readout().kind() == Readout.Kind.TUNNEL_JUNCTION
        ? junction(device, state)
        : anisotropic(device, state, strip);
  }

  private static ReadChain junction(EasyPlaneFerromagnet device, FerromagnetState state) {
    final Readout read = device.readout();
    final double area = device.outline().area();
    final double parallel = area / read.resistanceArea();
    final double antiparallel = parallel / (1 + read.magnetoresistance());
    final double mean = 0.5 * (parallel + antiparallel);
    final double v = read.readVoltage();
    final double current = v * mean;
    final double e = PhysicalConstants.ELEMENTARY_CHARGE;
    final double argument = e * v / (2 * PhysicalConstants.BOLTZMANN * state.temperature());
    final double density = 2 * e * current / StrictMath.tanh(argument) + inputNoise(read, 1 / mean);
    final double torque =
        SpinTorque.fieldPerCurrentDensity(
                read.polarization(), state.magnetization(), device.film().thickness())
            * current
            / area;
    return new ReadChain(
        current,
        v * current,
        1 / mean,
        0.5 * v * (parallel - antiparallel),
        density,
        bandwidth(read, 1 / mean),
        torque,
        -device.gate().voltageCoefficient() * v / read.barrier());
  }

  /** The film's own resistance: a probe current through the strip, the change shunted by the strip. */
  private static ReadChain anisotropic(
      EasyPlaneFerromagnet device, FerromagnetState state, StripChain strip) {
    final Readout read = device.readout();
    final double share = strip.shuntRatio() / (1 + strip.shuntRatio());
    final double change = strip.sectionResistance() * share * read.anisotropicRatio();
    final double loop = strip.resistance() + read.loadResistance();
    final double thermal =
        4 * PhysicalConstants.BOLTZMANN * state.temperature() / strip.resistance();
    return new ReadChain(
        read.probeCurrent(),
        read.probeCurrent() * read.probeCurrent() * strip.resistance(),
        strip.resistance(),
        0.5 * read.probeCurrent() * change / loop,
        thermal + inputNoise(read, strip.resistance()),
        bandwidth(read, strip.resistance()),
        Math.abs(state.torquePerDrive()) * read.probeCurrent() / strip.currentPerDrive(),
        0);
  }

  /** Current noise of the input stage (A²/Hz): its Johnson voltage over the loop's resistance. */
  private static double inputNoise(Readout read, double sensor) {
    final double loop = sensor + read.loadResistance();
    return 4
        * PhysicalConstants.BOLTZMANN
        * read.amplifierTemperature()
        * read.loadResistance()
        / (loop * loop);
  }

  private static double bandwidth(Readout read, double sensor) {
    final double parallel = 1 / (1 / sensor + 1 / read.loadResistance());
    final double perInput = 2 * Math.PI * parallel * read.capacitance();
    final double perAmplifier = 1 / read.bandwidth();
    return 1 / Math.sqrt(perAmplifier * perAmplifier + perInput * perInput);
  }

  /** Noise density in units of the half swing, squared (1/Hz). */
  double relativeDensity() {
    return noiseDensity / (halfSwing * halfSwing);
  }

  /** Noise of the filtered signal, standard deviation in units of the half swing (1). */
  double relativeNoise() {
    return Math.sqrt(relativeDensity() * bandwidth * NOISE_BANDWIDTH);
  }

  /**
   * Counts that noise alone makes in a slot of quiet: Rice's rate of falls through a level,
   * f exp(-d²/2) with d the distance from the rest level in standard deviations and f the filter's
   * -3 dB frequency, which for white noise through a two-pole filter is the exact mean frequency (S.
   * O. Rice, Bell Syst. Tech. J. 24, 46 (1945), from memory). The moment's own motion is left out.
   */
  double falseCounts(double restSignal, double low, double slot) {
    final double d = (restSignal - low) / relativeNoise();
    return d <= 0 ? bandwidth * slot : bandwidth * slot * StrictMath.exp(-0.5 * d * d);
  }
}
