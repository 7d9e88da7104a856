package torqueloom.training.evaluation;

/**
 * Trained values of one layer of synapses.
 *
 * @param inputs number of senders
 * @param outputs number of receivers
 * @param plus normalized detunings of the plus elements in [0, 1], [inputs][outputs] flattened
 * @param minus the same of the minus elements
 * @param offset pulse offset (unit drives) of a device layer, or bias of a weighted sum (nat),
 *     [outputs]
 */
public record PairLayer(int inputs, int outputs, float[] plus, float[] minus, float[] offset) {
  /** @throws IllegalArgumentException if an array length does not fit */
  public PairLayer {
    if (plus.length != inputs * outputs
        || minus.length != inputs * outputs
        || offset.length != outputs) {
      throw new IllegalArgumentException("array lengths do not fit a layer's inputs and outputs");
    }
  }
}
