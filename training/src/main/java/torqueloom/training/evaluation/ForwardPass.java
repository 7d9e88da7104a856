package torqueloom.training.evaluation;

import java.util.List;
import torqueloom.model.random.Streams;

/**
 * A whole network on one chip: encoded rows in, scores and predictions out. Immutable; each call
 * uses its own buffers, so threads may share an instance.
 *
 * <p>Rows are worked through in blocks of {@value #BLOCK}, which keeps the buffers in the cache;
 * the counts of a row do not depend on its block.
 */
public final class ForwardPass {
  private static final int BLOCK = 256;

  private final NeuronBank bank;
  private final NetworkSettings settings;
  private final List<float[]> weights;
  private final List<float[]> offsets;
  private final List<NeuronLayer> neurons;
  private final float clip;
  private final float readoutGain;

  /**
   * @param bank responses at the chip's temperature
   * @param network shape and trained offsets
   * @param weights weights as programmed on the chip, one array a layer of synapses
   * @param neurons neurons of each device layer
   * @param clip largest drive (unit drives)
   */
  public ForwardPass(
      NeuronBank bank,
      TrainedNetwork network,
      List<float[]> weights,
      List<NeuronLayer> neurons,
      float clip) {
    this.bank = bank;
    this.settings = network.settings();
    this.weights = List.copyOf(weights);
    this.offsets = network.layers().stream().map(PairLayer::offset).toList();
    this.neurons = List.copyOf(neurons);
    this.clip = clip;
    this.readoutGain = network.readoutGain();
    if (neurons.size() != settings.deviceLayers()) {
      throw new IllegalArgumentException(
          "one set of neurons a device layer is needed, got " + neurons.size());
    }
  }

  /** The network without spread: nominal neurons, weights at their levels. */
  public static ForwardPass ideal(NeuronBank bank, TrainedNetwork network, float clip) {
    final NetworkSettings settings = network.settings();
    final List<NeuronLayer> neurons =
        network.layers().subList(0, settings.deviceLayers()).stream()
            .map(layer -> NeuronLayer.nominal(layer.outputs()))
            .toList();
    return new ForwardPass(bank, network, network.weights(), neurons, clip);
  }

  /**
   * Predicted classes of all rows. Ties go to the lowest class.
   *
   * @param x encoded rows (counts per slot), [rows][inputs] flattened
   * @param rows number of rows
   * @param key key of the noise pass
   * @param tallies one a device layer, added to
   * @return predicted class of each row, [rows]
   */
  public int[] predict(float[] x, int rows, long key, CountKernel.Tally[] tallies) {
    final int[] predicted = new int[rows];
    for (int from = 0; from < rows; from += BLOCK) {
      final int size = Math.min(BLOCK, rows - from);
      final float[] scores = scores(x, from, size, key, tallies);
      final int classes = scores.length / size;
      for (int r = 0; r < size; r++) {
        int best = 0;
        for (int c = 1; c < classes; c++) {
          if (scores[r * classes + c] > scores[r * classes + best]) {
            best = c;
          }
        }
        predicted[from + r] = best;
      }
    }
    return predicted;
  }

  /** Fresh tallies, one a device layer. */
  public CountKernel.Tally[] tallies() {
    final CountKernel.Tally[] tallies = new CountKernel.Tally[neurons.size()];
    for (int layer = 0; layer < tallies.length; layer++) {
      tallies[layer] = new CountKernel.Tally();
    }
    return tallies;
  }

  private float[] scores(float[] x, int from, int size, long key, CountKernel.Tally[] tallies) {
    final int slots = settings.slots();
    final int[] rows = new int[size];
    for (int r = 0; r < size; r++) {
      rows[r] = from + r;
    }
    float[] counts = x;
    int inputs = x.length == 0 ? 0 : weights.get(0).length / offsets.get(0).length;
    for (int layer = 0; layer < neurons.size(); layer++) {
      final float[] offset = offsets.get(layer);
      final int outputs = offset.length;
      final int products = layer == 0 ? size : size * slots;
      final float[] drive = new float[products * outputs];
      final int start = layer == 0 ? from * inputs : 0;
      DenseKernel.multiply(counts, start, products, inputs, weights.get(layer), offset, drive);
      final float[] next = new float[slots * size * outputs];
      final long layerKey = Streams.subKey(key, layer);
      if (layer == 0) {
        CountKernel.constantDrive(
            bank, neurons.get(0), drive, clip, rows, slots, layerKey, next, tallies[layer]);
      } else {
        CountKernel.slotDrive(
            bank, neurons.get(layer), drive, clip, rows, slots, layerKey, next, tallies[layer]);
      }
      counts = next;
      inputs = outputs;
    }
    return readout(counts, size, inputs);
  }

  private float[] readout(float[] counts, int size, int inputs) {
    final float[] summed = ReadoutKernel.meanCounts(counts, settings.slots(), size * inputs);
    for (int i = 0; i < summed.length; i++) {
      summed[i] *= readoutGain;
    }
    if (settings.output() == NetworkSettings.Output.DEVICE) {
      return summed;
    }
    final int last = weights.size() - 1;
    final float[] scores = new float[size * offsets.get(last).length];
    DenseKernel.multiply(summed, 0, size, inputs, weights.get(last), offsets.get(last), scores);
    return scores;
  }
}
