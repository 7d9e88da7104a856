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
   * Drive of the first layer, which holds for all slots, noise passes and temperatures of a chip.
   *
   * @param x encoded rows (counts per slot), [rows][inputs] flattened
   * @param rows number of rows
   * @return drive before the clip (unit drives), [rows][neurons] flattened
   */
  public float[] firstDrive(float[] x, int rows) {
    final float[] offset = offsets.get(0);
    final float[] drive = new float[rows * offset.length];
    DenseKernel.multiply(
        x, 0, rows, weights.get(0).length / offset.length, weights.get(0), offset, drive);
    return drive;
  }

  /** Predicted classes from encoded rows, see {@link #predictFrom}. */
  public int[] predict(float[] x, int rows, long key, CountKernel.Tally[] tallies) {
    return predictFrom(firstDrive(x, rows), rows, key, tallies);
  }

  /**
   * Predicted classes of all rows. Ties go to the lowest class.
   *
   * @param firstDrive as {@link #firstDrive} gives it
   * @param rows number of rows
   * @param key key of the noise pass
   * @param tallies one a device layer, added to
   * @return predicted class of each row, [rows]
   */
  public int[] predictFrom(float[] firstDrive, int rows, long key, CountKernel.Tally[] tallies) {
    final int[] predicted = new int[rows];
    for (int from = 0; from < rows; from += BLOCK) {
      final int size = Math.min(BLOCK, rows - from);
      final float[] scores = scores(firstDrive, from, size, key, tallies);
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

  private float[] scores(
      float[] firstDrive, int from, int size, long key, CountKernel.Tally[] tallies) {
    final int[] rows = new int[size];
    for (int r = 0; r < size; r++) {
      rows[r] = from + r;
    }
    final float[] summed =
        neurons.size() == 1
            ? onlyLayer(firstDrive, rows, key, tallies)
            : layers(firstDrive, rows, key, tallies);
    return readout(summed, size);
  }

  /** Counts of a single device layer summed over the slots. */
  private float[] onlyLayer(float[] firstDrive, int[] rows, long key, CountKernel.Tally[] tallies) {
    final int outputs = offsets.get(0).length;
    final float[] summed = new float[rows.length * outputs];
    CountKernel.constantDriveSum(
        bank,
        neurons.get(0),
        firstDrive,
        rows[0] * outputs,
        clip,
        rows,
        settings.slots(),
        Streams.subKey(key, 0),
        summed,
        tallies[0]);
    return summed;
  }

  /** Counts of the last of several device layers summed over the slots. */
  private float[] layers(float[] firstDrive, int[] rows, long key, CountKernel.Tally[] tallies) {
    final int slots = settings.slots();
    final int size = rows.length;
    int inputs = offsets.get(0).length;
    float[] counts = new float[slots * size * inputs];
    CountKernel.constantDrive(
        bank,
        neurons.get(0),
        firstDrive,
        rows[0] * inputs,
        clip,
        rows,
        slots,
        Streams.subKey(key, 0),
        counts,
        tallies[0]);
    for (int layer = 1; layer < neurons.size(); layer++) {
      final float[] offset = offsets.get(layer);
      final float[] drive = new float[slots * size * offset.length];
      DenseKernel.multiply(counts, 0, slots * size, inputs, weights.get(layer), offset, drive);
      counts = new float[drive.length];
      CountKernel.slotDrive(
          bank,
          neurons.get(layer),
          drive,
          clip,
          rows,
          slots,
          Streams.subKey(key, layer),
          counts,
          tallies[layer]);
      inputs = offset.length;
    }
    return ReadoutKernel.summedCounts(counts, slots, size * inputs);
  }

  private float[] readout(float[] summed, int size) {
    for (int i = 0; i < summed.length; i++) {
      summed[i] = summed[i] / settings.slots() * readoutGain;
    }
    if (settings.output() == NetworkSettings.Output.DEVICE) {
      return summed;
    }
    final int last = weights.size() - 1;
    final float[] scores = new float[size * offsets.get(last).length];
    DenseKernel.multiply(
        summed, 0, size, summed.length / size, weights.get(last), offsets.get(last), scores);
    return scores;
  }
}
