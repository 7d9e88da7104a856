package torqueloom.model.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.magnet.EquilibriumPlane;

/** Plain-language warnings about a ferromagnet, in order of weight. */
final class FerromagnetWarnings {
  /** m_z at rest from about ten degrees on. */
  private static final double TILT = 0.17;

  /** Below this Delta a rest hops by itself within some 100 microseconds at attempts of 1 GHz. */
  private static final double LOW_STABILITY = 12;

  /** Read torque over threshold. */
  private static final double READ_RATIO = 0.05;

  /** Counts by noise in a quiet slot. */
  private static final double FALSE_COUNTS = 0.01;

  /** Common practice for heavy-metal strips, no single source: nanosecond pulses (A/m²). */
  private static final double PEAK_DENSITY = 1e12;

  /** Common practice for heavy-metal strips, no single source: mean over time (A/m²). */
  private static final double MEAN_DENSITY = 1e11;

  /** Integration steps of a slot beyond which a look at the counts would take longer than seconds. */
  private static final long LONGEST_SLOT = 300_000;

  private static final double PULSE_RISE = 100;
  private static final double MEAN_RISE = 25;

  /** Share of the breakdown field. */
  private static final double NEAR_BREAKDOWN = 0.7;

  private final EasyPlaneFerromagnet device;
  private final FerromagnetState state;
  private final DriveProtocol protocol;
  private final ElectricalQuantities electrical;
  private final List<DeviceWarning> list = new ArrayList<>();

  FerromagnetWarnings(EasyPlaneFerromagnet device, FerromagnetState state, DriveProtocol protocol) {
    this.device = device;
    this.state = state;
    this.protocol = protocol;
    this.electrical = new ElectricalQuantities(device, state, protocol);
  }

  List<DeviceWarning> list() {
    magnetic();
    drive();
    readout();
    currentDensity();
    heating();
    gateField(device.gate(), device.trimShift()).ifPresent(list::add);
    return list;
  }

  private void magnetic() {
    final double[] rest = state.restDirections()[0];
    if (Math.abs(rest[2]) > TILT) {
      warn(
          "rest-out-of-film",
          "The moment rests %.0f degrees out of the film (imbalance %.2f mT,"
              + " bias field %.2f mT): a spike starts from a tilted level.",
          Math.toDegrees(StrictMath.asin(Math.min(1, Math.abs(rest[2])))),
          1e3 * state.fields().imbalance(),
          1e3 * device.biasField());
    }
    if (!state.fields().hardAxis().equals("y")) {
      warn(
          "hard-axis-not-along-p",
          "The hard axis is %s, not y, along which the strip's spins"
              + " point: the moment does not turn in the plane the readout sees (axis fields %.1f,"
              + " %.1f, %.1f mT).",
          state.fields().hardAxis(),
          1e3 * state.fields().x(),
          1e3 * state.fields().y(),
          1e3 * state.fields().z());
    }
    final double delta = state.thermalStability();
    if (delta < LOW_STABILITY) {
      warn(
          "low-thermal-stability",
          "Thermal stability Delta is %.1f at %.0f K, below %.0f: the" + " device hops by itself.",
          delta,
          state.temperature(),
          LOW_STABILITY);
    }
  }

  private void drive() {
    final double most =
        Math.abs(state.torquePerDrive()) * (protocol.maximumDrive() + Math.abs(protocol.bias()));
    final double threshold = state.plane().threshold();
    final double limit =
        EquilibriumPlane.maximumDriveRatio(
            device.film().damping(),
            state.fields().hardField(),
            state.fields().easyField(),
            threshold);
    final double longest = 2 / (PhysicalConstants.GYROMAGNETIC_RATIO * most);
    if (most > limit * threshold && protocol.pulse() > longest) {
      warn(
          "pulse-beyond-upper-limit",
          "The maximum drive is %.1f times the threshold, above the"
              + " upper limit of %.2f, and lasts %.2f ns, longer than %.2f ns: the moment locks at"
              + " the pole and gives no counts there.",
          most / threshold,
          limit,
          1e9 * protocol.pulse(),
          1e9 * longest);
    }
    final long steps = FerromagnetSlots.steps(device, state, protocol);
    if (steps > LONGEST_SLOT) {
      warn(
          "long-simulation",
          "One slot takes up to %.2g integration steps, so the short simulation"
              + " that looks for counts was left out, and a calibration may take very long. Strong fields,"
              + " a wide readout bandwidth and a long slot cost steps.",
          (double) steps);
    } else if (!FerromagnetSlots.countsSomewhere(device, state, protocol)) {
      warn(
          "no-counts-in-drive-range",
          "No drive up to the maximum of %.3g A/m^2 (%.2f mT) gives a"
              + " count in half of the slots of a short simulation.",
          protocol.maximumDrive(),
          1e3 * most);
    }
  }

  private void readout() {
    final ReadChain read = electrical.read();
    final double ratio = read.torqueField() / state.plane().threshold();
    if (ratio > READ_RATIO && Double.isFinite(ratio)) {
      warn(
          "read-disturbs",
          "The read current's own torque is %.3f mT, %.0f %% of the threshold.",
          1e3 * read.torqueField(),
          100 * ratio);
    }
    final double counts = electrical.falseCounts();
    if (counts > FALSE_COUNTS) {
      warn(
          "weak-signal",
          "The noise of the readout is %.0f %% of the half swing; it alone makes"
              + " about %.2g counts in a quiet slot.",
          100 * read.relativeNoise(),
          counts);
    }
  }

  private void currentDensity() {
    final double peak = protocol.maximumDrive() + Math.abs(protocol.bias());
    final double mean =
        protocol.maximumDrive() * protocol.pulse() / protocol.slot() + Math.abs(protocol.bias());
    if (peak > PEAK_DENSITY || mean > MEAN_DENSITY) {
      warn(
          "electromigration-current-density",
          "The current density reaches %.2g A/m^2 in a pulse"
              + " and %.2g A/m^2 on average; common practice stays below %.0e and %.0e.",
          peak,
          mean,
          PEAK_DENSITY,
          MEAN_DENSITY);
    }
    final double volts =
        peak * electrical.strip().currentPerDrive() * electrical.strip().resistance();
    if (volts > device.drive().supplyVoltage()) {
      warn(
          "supply-voltage-exceeded",
          "The maximum drive needs %.2f V, more than the supply's" + " %.2f V.",
          volts,
          device.drive().supplyVoltage());
    }
  }

  private void heating() {
    final StripChain strip = electrical.strip();
    final double most = protocol.maximumDrive();
    final double pulse = strip.pulseRise(most, protocol.pulse());
    if (pulse > PULSE_RISE) {
      warn(
          "pulse-heating",
          "A pulse of maximum drive heats the device by about %.0f K while it"
              + " lasts (one time constant of %.2f ns); the simulation keeps the temperature.",
          pulse,
          1e9 * strip.thermalResistance() * strip.heatCapacity());
    }
    final double mean = strip.meanRise(most, protocol);
    if (mean > MEAN_RISE) {
      warn(
          "mean-heating",
          "With the maximum drive in every slot the device is %.0f K warmer than"
              + " its surroundings.",
          mean);
    }
  }

  static Optional<DeviceWarning> gateField(Gate gate, double shift) {
    final double field = Math.abs(gate.voltageFor(shift)) / gate.dielectricThickness();
    if (field <= NEAR_BREAKDOWN * gate.breakdownField()) {
      return Optional.empty();
    }
    return Optional.of(
        new DeviceWarning(
            "gate-field-near-breakdown",
            String.format(
                Locale.ROOT,
                "The gate needs %.2f V, a field of %.2f V/nm, for a shift of %.3g mJ/m^2; breakdown is"
                    + " at %.2f V/nm.",
                gate.voltageFor(shift),
                1e-9 * field,
                1e3 * shift,
                1e-9 * gate.breakdownField())));
  }

  private void warn(String code, String format, Object... values) {
    list.add(new DeviceWarning(code, String.format(Locale.ROOT, format, values)));
  }
}
