package torqueloom.training.evaluation;

import java.util.List;

/**
 * A trained network as plain values.
 *
 * @param settings shape
 * @param layers layers of synapses: one a hidden layer, then the output's
 * @param curve normalized weight at each level, see {@link PairWeights}
 * @param readoutGain scores (nat) per mean count and full-scale weight
 * @param libraryDigest digest of the response library it was trained with
 */
public record TrainedNetwork(
    NetworkSettings settings,
    List<PairLayer> layers,
    float[] curve,
    float readoutGain,
    String libraryDigest) {
  /** Copies the list. */
  public TrainedNetwork {
    layers = List.copyOf(layers);
  }

  /** Weights at their levels, one array a layer. */
  public List<float[]> weights() {
    return layers.stream()
        .map(layer -> PairWeights.atLevels(layer.plus(), layer.minus(), curve))
        .toList();
  }
}
