package torqueloom.training.evaluation;

/**
 * Shape of the network.
 *
 * @param hidden neurons of each hidden layer, [layers], at least one layer
 * @param slots number of slots S, &gt;= 1
 * @param output how the output is read
 * @param inputLevels number of levels of the amplitude encoder, 0 for continuous
 */
public record NetworkSettings(int[] hidden, int slots, Output output, int inputLevels) {
  /** Kinds of output. */
  public enum Output {
    /** Counts of the last hidden layer weighted and summed by the electronics. */
    WEIGHTED_SUM,
    /** Device neurons whose counts are summed over the slots. */
    DEVICE
  }
}
