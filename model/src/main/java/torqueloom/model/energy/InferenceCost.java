package torqueloom.model.energy;

/**
 * Energy and latency of one inference, averaged over the test rows. All values are SI.
 *
 * @param driveJoules pulses of the device neurons, drawn from the supply
 * @param readJoules readout junctions of the device neurons
 * @param synapseJoules read currents of the synapses
 * @param gateJoules gates (holding leakage neglected, stated in the report)
 * @param electronicsJoules comparators, counters, pulse drivers
 * @param staticJoules continuous bias over the inference
 * @param latencySeconds (S + L) slots
 * @param countsPerInference counts of all device neurons
 * @param multiplyAccumulates weight applications of one inference
 * @param supplyPowerWatts total energy over latency
 */
public record InferenceCost(
    double driveJoules,
    double readJoules,
    double synapseJoules,
    double gateJoules,
    double electronicsJoules,
    double staticJoules,
    double latencySeconds,
    double countsPerInference,
    double multiplyAccumulates,
    double supplyPowerWatts) {

  /** Sum of all parts (J). */
  public double totalJoules() {
    return driveJoules + readJoules + synapseJoules + gateJoules + electronicsJoules + staticJoules;
  }
}
