package torqueloom.model.synapse;

import java.util.Map;
import java.util.Optional;

/**
 * How a programmed pair of elements becomes a weight. A weight is curve(plus) - curve(minus) of two
 * normalized detunings in [0, 1], in units of one full-scale weight. Immutable; the methods are
 * plain arithmetic for hot loops.
 *
 * <p>Programming: a pair has a conductance mismatch e (units of one full-scale weight) from the
 * device part of the junction's tolerances. With write-verify the pair is measured and corrected
 * until a residual of one write error is left; only targets out of reach, outside [-1 + e, 1 + e],
 * are clipped. Blind programming keeps the mismatch, the chip's gain error and the write errors of
 * both elements.
 */
public final class SynapseModel {
  private final SynapseSettings settings;
  private final double temperature;
  private final TuningCurve curve;
  private final Optional<ConductanceModel> conductance;
  private final Map<String, Double> mismatchParts;
  private final double pairMismatch;
  private final double chipGainError;
  private final int steps;

  private SynapseModel(SynapseSettings settings, double temperature) {
    this.settings = settings;
    this.temperature = temperature;
    this.curve = StraightTuningCurve.INSTANCE;
    this.conductance =
        settings.kind() == SynapseSettings.Kind.JUNCTION
            ? settings
                .junction()
                .map(j -> new ConductanceModel(j, settings.tuningRange(), temperature))
            : Optional.empty();
    this.mismatchParts = conductance.map(ConductanceModel::mismatchParts).orElse(Map.of());
    this.pairMismatch =
        Math.sqrt(mismatchParts.values().stream().mapToDouble(part -> part * part).sum());
    this.chipGainError = conductance.map(ConductanceModel::gainError).orElse(0.0);
    this.steps = limited() ? settings.levels() - 1 : 0;
  }

  /**
   * @param settings the synapse as a study states it
   * @param referenceTemperature temperature of the thermal average of the conductance (K), &gt; 0
   */
  public static SynapseModel of(SynapseSettings settings, double referenceTemperature) {
    if (!(referenceTemperature > 0 && Double.isFinite(referenceTemperature))) {
      throw new IllegalArgumentException(
          "referenceTemperature must be positive, got " + referenceTemperature + " K");
    }
    return new SynapseModel(settings, referenceTemperature);
  }

  /** The settings it was made from. */
  public SynapseSettings settings() {
    return settings;
  }

  /** Temperature of the thermal average (K). */
  public double temperature() {
    return temperature;
  }

  /** Whether levels, write errors and mismatch exist; false for the unlimited synapse. */
  public boolean limited() {
    return settings.kind() != SynapseSettings.Kind.UNLIMITED;
  }

  /** Normalized detuning to normalized conductance. */
  public TuningCurve curve() {
    return curve;
  }

  /** Nearest of the levels to a detuning, clipped to [0, 1]; only clipped when unlimited. */
  public double quantize(double detuning) {
    final double inside = Math.max(0, Math.min(1, detuning));
    return steps == 0 ? inside : Math.rint(inside * steps) / steps;
  }

  /** Weight of a pair of detunings (1), in [-1, 1]. */
  public double weight(double plus, double minus) {
    return curve.value(plus) - curve.value(minus);
  }

  /** Standard deviation of a pair's mismatch, in units of one full-scale weight (1). */
  public double pairMismatch() {
    return pairMismatch;
  }

  /** The same by tolerance, in the order of their names; they add in squares. */
  public Map<String, Double> mismatchParts() {
    return mismatchParts;
  }

  /** Standard deviation of the gain error that all weights of a chip share (1). */
  public double chipGainError() {
    return chipGainError;
  }

  /** Standard deviation of the residual of one programming (units of one full-scale weight). */
  public double writeError() {
    return limited() ? settings.writeError() : 0;
  }

  /**
   * Weight that programming leaves, on a chip without gain error.
   *
   * @param targetWeight wanted weight (1)
   * @param mismatch of this pair (units of one full-scale weight)
   * @param writeNormal a standard normal number
   */
  public double programmed(double targetWeight, double mismatch, double writeNormal) {
    return programmed(targetWeight, 1, mismatch, writeNormal);
  }

  /**
   * Weight that programming leaves. With write-verify the gain only moves the reach; blind
   * programming keeps it in the weight.
   *
   * @param targetWeight wanted weight (1)
   * @param gain the chip's gain, 1 + {@link #chipGainError()} times a normal number (1)
   * @param mismatch of this pair (units of one full-scale weight)
   * @param writeNormal a standard normal number
   */
  public double programmed(double targetWeight, double gain, double mismatch, double writeNormal) {
    if (!limited()) {
      return targetWeight;
    }
    if (settings.writeVerify()) {
      return clip(targetWeight, gain, mismatch) + settings.writeError() * writeNormal;
    }
    return gain * targetWeight + mismatch + Math.sqrt(2) * settings.writeError() * writeNormal;
  }

  /** Whether write-verify cannot reach a target, so that it is clipped. */
  public boolean outOfReach(double targetWeight, double gain, double mismatch) {
    return limited()
        && settings.writeVerify()
        && clip(targetWeight, gain, mismatch) != targetWeight;
  }

  private static double clip(double target, double gain, double mismatch) {
    return Math.max(-gain + mismatch, Math.min(gain + mismatch, target));
  }

  /**
   * Energy that one count draws through one pair at the read voltage (J): V² (G_plus + G_minus)
   * t_read, both elements at the middle of their range; 0 for the unlimited synapse. The supply of
   * the input stage is not in it.
   */
  public double readEnergyPerCount() {
    if (conductance.isEmpty()) {
      return 0;
    }
    final double voltage = settings.junction().orElseThrow().readVoltage();
    return voltage * voltage * 2 * conductance.get().conductance(0.5) * settings.readWindow();
  }

  /**
   * Derived quantities and warnings.
   *
   * @param stripCurrentPerDrive current into the neuron's strip per current density (A per A/m²)
   */
  public SynapseSummary summary(double stripCurrentPerDrive) {
    return new SynapseReport(this, conductance, stripCurrentPerDrive).summary();
  }
}
