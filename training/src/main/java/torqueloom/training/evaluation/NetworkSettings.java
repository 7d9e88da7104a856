package torqueloom.training.evaluation;

/**
 * Shape of the network.
 *
 * @param hidden neurons of each hidden layer, [layers], at least one layer
 * @param slots number of slots S, &gt;= 1
 * @param output how the output is read
 * @param inputLevels number of levels of the amplitude encoder, 0 for continuous
 * @param inputFullScale counts per slot that a feature at its upper end stands for (1), &gt; 0
 */
public record NetworkSettings(
    int[] hidden, int slots, Output output, int inputLevels, double inputFullScale) {
  /** Kinds of output. */
  public enum Output {
    /** Counts of the last hidden layer weighted and summed by the electronics. */
    WEIGHTED_SUM,
    /** Device neurons whose counts are summed over the slots. */
    DEVICE
  }

  /** @throws IllegalArgumentException naming the first value out of range */
  public NetworkSettings {
    hidden = hidden.clone();
    if (hidden.length == 0 || slots < 1) {
      throw new IllegalArgumentException("at least one hidden layer and one slot are needed");
    }
    for (final int neurons : hidden) {
      if (neurons < 1) {
        throw new IllegalArgumentException("a hidden layer needs neurons, got " + neurons);
      }
    }
    if (inputLevels != 0 && inputLevels < 2) {
      throw new IllegalArgumentException("inputLevels must be 0 or at least 2");
    }
    if (!(inputFullScale > 0)) {
      throw new IllegalArgumentException("inputFullScale must be positive, got " + inputFullScale);
    }
  }

  /** Number of layers of device neurons L, the output included where it has devices. */
  public int deviceLayers() {
    return hidden.length + (output == Output.DEVICE ? 1 : 0);
  }
}
