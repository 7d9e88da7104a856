package torqueloom.model.synapse;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Currents of one pair of lines when all synapses of the fan-in are read at once, every element at
 * the middle of its range. Errors are in units of one full-scale weight.
 *
 * @param lineCurrent current of one line (A)
 * @param fullScaleCurrent current change of one full-scale weight (A)
 * @param commonMode current that both lines carry alike
 * @param drop change of one line's current by its voltage drop, the line's resistance lumped at its
 *     end; it cancels between equal lines except for the gain loss
 * @param gainLoss relative loss of all weights by the drop (1)
 * @param noise standard deviation of shot and Johnson noise of both lines over the read window
 */
record LineEstimate(
    double lineCurrent,
    double fullScaleCurrent,
    double commonMode,
    double drop,
    double gainLoss,
    double noise) {

  /**
   * Noise: S_I = 2 e I coth(eV/2kT) (shot and Johnson noise of a tunnel junction together: e.g. Ya.
   * M. Blanter and M. Büttiker, Phys. Rep. 336, 1 (2000), from memory); the mean over a window T has
   * the variance S_I/(2 T).
   */
  static LineEstimate of(SynapseModel model, ConductanceModel conductance) {
    final SynapseSettings settings = model.settings();
    final double voltage = settings.junction().orElseThrow().readVoltage();
    final double line = settings.fanIn() * conductance.conductance(0.5);
    final double current = line * voltage;
    final double unit = conductance.fullScale() * voltage;
    final double gainLoss = line * settings.lineResistance();
    final double thermal =
        PhysicalConstants.ELEMENTARY_CHARGE
            * voltage
            / (2 * PhysicalConstants.BOLTZMANN * model.temperature());
    final double density =
        2 * PhysicalConstants.ELEMENTARY_CHARGE * 2 * current / StrictMath.tanh(thermal);
    final double noise = Math.sqrt(density / (2 * settings.readWindow()));
    return new LineEstimate(
        current, unit, current / unit, current * gainLoss / unit, gainLoss, noise / unit);
  }
}
