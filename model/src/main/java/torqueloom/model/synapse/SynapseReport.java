package torqueloom.model.synapse;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import torqueloom.model.constants.PhysicalConstants;
import torqueloom.model.device.DerivedQuantity;
import torqueloom.model.device.DeviceWarning;
import torqueloom.model.device.Gate;

/** Derived quantities and warnings of a synapse, in printing order. */
final class SynapseReport {
  /** Share of the breakdown field from which on a gate is warned of (1). */
  private static final double NEAR_BREAKDOWN = 0.8;

  /** Share of the instability threshold from which on a read current is warned of (1). */
  private static final double DISTURBING = 0.5;

  private final SynapseModel model;
  private final SynapseSettings settings;
  private final Optional<ConductanceModel> conductance;
  private final double stripCurrentPerDrive;
  private final List<DerivedQuantity> quantities = new ArrayList<>();
  private final List<DeviceWarning> warnings = new ArrayList<>();

  SynapseReport(
      SynapseModel model, Optional<ConductanceModel> conductance, double stripCurrentPerDrive) {
    this.model = model;
    this.settings = model.settings();
    this.conductance = conductance;
    this.stripCurrentPerDrive = stripCurrentPerDrive;
  }

  SynapseSummary summary() {
    add(
        "unitDrive",
        "drive of one full-scale weight for one count",
        "",
        settings.unitDrive(),
        "A/m^2");
    if (conductance.isPresent()) {
      final JunctionParameters junction = settings.junction().orElseThrow();
      tuning(junction, settings.gate());
      weights(conductance.get());
      line(LineEstimate.of(model, conductance.get()));
      read(junction);
    }
    return new SynapseSummary(quantities, warnings);
  }

  private void tuning(JunctionParameters junction, Gate gate) {
    final double span = settings.tuningRange() * junction.anisotropyField();
    final double energy = span * junction.saturationMagnetization() * junction.thickness() / 2;
    final double volts = -gate.voltageFor(energy);
    final double field = volts / 2 / gate.dielectricThickness();
    final double share = field / gate.breakdownField();
    add(
        "tuningRangePercent",
        "tuning range, full span, of the junction's net anisotropy field B_k",
        "",
        100 * settings.tuningRange(),
        "%");
    add("tuningRangeTesla", "the same as a field", "ΔB", span, "T");
    add(
        "tuningRangeJoulesPerSquareMeter",
        "the same as interfacial anisotropy, ΔB Ms t/2",
        "ΔK_i",
        energy,
        "J/m^2");
    add("gateSpanVolts", "the same on its gate, centered on zero", "", volts, "V");
    add("gateFieldOverBreakdown", "largest gate field over breakdown field", "", share, "1");
    add("levelStepTesla", "step between levels", "", span / (settings.levels() - 1), "T");
    add(
        "levelStepWeight",
        "step between levels, of one full-scale weight",
        "",
        1.0 / (settings.levels() - 1),
        "1");
    warnIf(
        share >= NEAR_BREAKDOWN,
        "synapse-gate-near-breakdown",
        "The tuning range needs %.2f V/nm on the synapse's gate, %.0f %% of its breakdown field.",
        field * 1e-9,
        100 * share);
    warnIf(
        junction.anisotropyField() - span / 2 <= junction.biasField(),
        "synapse-tilt-saturates",
        "At the soft end the anisotropy field of %.1f mT is not above the bias field of %.1f mT: "
            + "the moment lies in the film and further tuning does nothing.",
        1e3 * (junction.anisotropyField() - span / 2),
        1e3 * junction.biasField());
  }

  private void weights(ConductanceModel model) {
    add(
        "meanConductance",
        "conductance at the middle of the range",
        "G",
        model.conductance(0.5),
        "S");
    add(
        "fullScaleConductance",
        "conductance change of one full-scale weight",
        "ΔG",
        model.fullScale(),
        "S");
    add(
        "curveDeparture",
        "largest departure of the junction's curve from the straight line used, " + "of full scale",
        "",
        model.departureFromStraight(),
        "1");
    add(
        "writeErrorWeight",
        "write error, standard deviation, in full-scale weights",
        "",
        this.model.writeError(),
        "1");
    add(
        "pairMismatch",
        "mismatch of a pair, standard deviation, in full-scale weights",
        "",
        this.model.pairMismatch(),
        "1");
    for (final Map.Entry<String, Double> part : this.model.mismatchParts().entrySet()) {
      add(
          "pairMismatch." + part.getKey(),
          "its part from the " + part.getKey() + " tolerance",
          "",
          part.getValue(),
          "1");
    }
    add(
        "chipGainError",
        "gain error shared by a chip, standard deviation",
        "",
        this.model.chipGainError(),
        "1");
    warnIf(
        this.model.pairMismatch() > 0.5,
        "synapse-pair-mismatch",
        "The mismatch of a pair is %.2f full-scale weights (one standard deviation): many weights "
            + "are out of reach.",
        this.model.pairMismatch());
    warnIf(
        2 * settings.writeError() * (settings.levels() - 1) > 1,
        "synapse-levels-below-write-error",
        "A write error of %.1f %% of the range blurs neighboring levels, which lie %.1f %% apart.",
        100 * settings.writeError(),
        100.0 / (settings.levels() - 1));
  }

  private void line(LineEstimate line) {
    add("lineCurrent", "current of one line at full fan-in", "", line.lineCurrent(), "A");
    add(
        "commonModeWeights",
        "common-mode current at full fan-in, in full-scale weights",
        "",
        line.commonMode(),
        "1");
    add(
        "lineDropWeights",
        "current change by one line's voltage drop, in full-scale weights",
        "",
        line.drop(),
        "1");
    add(
        "lineGainLoss",
        "weights lost by the voltage drop at full fan-in",
        "",
        line.gainLoss(),
        "1");
    add(
        "lineNoiseWeights",
        "shot and Johnson noise over the read window, in full-scale weights",
        "",
        line.noise(),
        "1");
    final double needed = settings.unitDrive() * stripCurrentPerDrive / line.fullScaleCurrent();
    add("inputGain", "current gain of the input stage that unit-drive implies", "", needed, "1");
    warnIf(
        line.commonMode() > 1,
        "synapse-common-mode",
        "At full fan-in (%.0f) both lines carry a common current of %.0f full-scale weights; the "
            + "input stage must reject it.",
        settings.fanIn(),
        line.commonMode());
    warnIf(
        line.drop() > 1,
        "synapse-line-drop",
        "At full fan-in the voltage drop on a line changes its current by %.1f full-scale weights "
            + "(%.1f %% of every weight): it must be equal on both lines.",
        line.drop(),
        100 * line.gainLoss());
    warnIf(
        line.noise() > 1,
        "synapse-line-noise",
        "Shot and Johnson noise at full fan-in is %.1f full-scale weights.",
        line.noise());
    settings
        .gain()
        .ifPresent(
            given ->
                warnIf(
                    Math.abs(given / needed - 1) > 0.05,
                    "synapse-gain",
                    "The study's gain of %.3g is not the %.3g that unit-drive needs; unit-drive is used.",
                    given,
                    needed));
  }

  /** Read disturb: the damping-like torque of the junction's own current against damping. */
  private void read(JunctionParameters junction) {
    final double density = junction.readVoltage() / junction.resistanceArea();
    final double torque =
        PhysicalConstants.REDUCED_PLANCK
            * junction.polarization()
            * density
            / (2
                * PhysicalConstants.ELEMENTARY_CHARGE
                * junction.saturationMagnetization()
                * junction.thickness());
    final double threshold = junction.damping() * junction.anisotropyField();
    final double voltageShift =
        2
            * settings.gate().voltageCoefficient()
            * junction.readVoltage()
            / junction.barrier()
            / (junction.saturationMagnetization() * junction.thickness());
    add("readTorqueTesla", "spin-torque field of the read current", "", torque, "T");
    add(
        "readTorqueOverThreshold",
        "the same over damping times B_k, about where it would " + "unsettle the moment",
        "",
        torque / threshold,
        "1");
    add(
        "readVoltageShiftTesla",
        "shift of B_k by the read voltage itself, the gate's coefficient "
            + "over the barrier; alike in both elements",
        "",
        voltageShift,
        "T");
    add(
        "readEnergyJoules",
        "energy of one count through one pair",
        "",
        model.readEnergyPerCount(),
        "J");
    warnIf(
        torque / threshold > DISTURBING,
        "synapse-read-disturb",
        "The read current's spin torque is %.0f %% of damping times anisotropy field.",
        100 * torque / threshold);
    quantities.add(
        new DerivedQuantity(
            "notModeled",
            "not modeled",
            "",
            "fluctuation of the conductance within a read window; telegraph hops between +mz and -mz, "
                + "which mx does not show; drift of the weights with temperature; power of the input "
                + "stage",
            ""));
  }

  private void add(String key, String label, String symbol, double value, String unit) {
    quantities.add(new DerivedQuantity(key, label, symbol, value, unit));
  }

  private void warnIf(boolean condition, String code, String format, Object... values) {
    if (condition) {
      final Object[] numbers = new Object[values.length];
      for (int i = 0; i < values.length; i++) {
        numbers[i] = ((Number) values[i]).doubleValue();
      }
      warnings.add(new DeviceWarning(code, String.format(Locale.ROOT, format, numbers)));
    }
  }
}
