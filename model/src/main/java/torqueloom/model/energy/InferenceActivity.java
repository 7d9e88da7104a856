package torqueloom.model.energy;

/**
 * What one inference does, averaged over the rows it was counted on.
 *
 * @param absoluteDrive sum of |drive| over all pulses of all device neurons (drive unit)
 * @param neurons device neurons (1)
 * @param neuronSlots device neurons times the slots in which they and their readout are on (1)
 * @param counts counts of all device neurons (1)
 * @param synapseReads reads of one pair by one count: sum over senders of counts times fan-out (1);
 *     an encoder's level counts as its fraction of a full-scale count
 * @param multiplyAccumulates weights times slots, what a digital network of the same shape would do
 * @param latency time from the first pulse to the last count (s)
 */
public record InferenceActivity(
    double absoluteDrive,
    int neurons,
    double neuronSlots,
    double counts,
    double synapseReads,
    double multiplyAccumulates,
    double latency) {

  /** @throws IllegalArgumentException naming the first value that is negative or NaN */
  public InferenceActivity {
    require("absoluteDrive", absoluteDrive);
    require("neurons", neurons);
    require("neuronSlots", neuronSlots);
    require("counts", counts);
    require("synapseReads", synapseReads);
    require("multiplyAccumulates", multiplyAccumulates);
    require("latency", latency);
    if (latency == 0) {
      throw new IllegalArgumentException("latency must be positive");
    }
  }

  private static void require(String name, double value) {
    if (!(value >= 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(name + " must not be negative, got " + value);
    }
  }
}
