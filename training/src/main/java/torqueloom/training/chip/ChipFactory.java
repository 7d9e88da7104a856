package torqueloom.training.chip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.model.response.NeuronChoice;
import torqueloom.model.response.ResponseMatcher;
import torqueloom.model.synapse.SynapseModel;
import torqueloom.model.tolerance.Tolerances;
import torqueloom.model.tolerance.Trim;
import torqueloom.training.evaluation.NeuronLayer;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.TrainedNetwork;

/**
 * Draws chips: every neuron from the device's tolerances, every synapse pair from the junction's
 * tolerances and the write error. Draws are keyed by (chip, layer, row, column), so factories that
 * differ only in a tolerance or in the trim draw the same chips, and comparisons are paired.
 *
 * @param nominal device without spread
 * @param tolerances of the device
 * @param trim of the neurons, empty when not trimmed
 * @param synapse programming of the weights
 * @param synapseSpread whether the pairs have mismatch and the chip a gain error
 * @param matcher finds the library instance that answers for a drawn neuron
 * @param temperatures temperatures of the library (K)
 * @param seed study seed
 */
public record ChipFactory(
    DeviceKind nominal,
    Tolerances tolerances,
    Optional<Trim> trim,
    SynapseModel synapse,
    boolean synapseSpread,
    ResponseMatcher matcher,
    List<Double> temperatures,
    long seed) {

  /** The devices of one layer of a chip, before trim. */
  public List<DeviceKind> devices(int chip, int layer, int neurons) {
    final List<DeviceKind> devices = new ArrayList<>(neurons);
    for (int column = 0; column < neurons; column++) {
      devices.add(tolerances.draw(nominal, seed, Purpose.CHIP_NEURON, chip, layer, column));
    }
    return devices;
  }

  /** A device as it works at a temperature, after trim if there is one. */
  public DeviceKind working(DeviceKind device, double temperature) {
    if (trim.isEmpty()) {
      return device;
    }
    final double target = nominal.imbalance(nominal.referenceTemperature());
    return trim.get().apply(device, temperature, target);
  }

  /** Library instances and drive factors of a layer's devices at a temperature of the library. */
  public NeuronLayer neurons(List<DeviceKind> devices, int temperatureIndex) {
    final int[] instance = new int[devices.size()];
    final float[] factor = new float[devices.size()];
    for (int j = 0; j < instance.length; j++) {
      if (tolerances.spreads().isEmpty()) {
        factor[j] = 1f;
        continue;
      }
      final DeviceKind working = working(devices.get(j), temperatures.get(temperatureIndex));
      final NeuronChoice choice = matcher.choose(temperatureIndex, working);
      instance[j] = choice.instance();
      factor[j] = (float) choice.driveFactor();
    }
    return new NeuronLayer(instance, factor);
  }

  /** Weights of a chip after programming, one array a layer of synapses. */
  public List<float[]> weights(int chip, TrainedNetwork network) {
    final List<float[]> targets = network.weights();
    final List<float[]> programmed = new ArrayList<>(targets.size());
    final double shared =
        Streams.truncatedNormal(
            Streams.key(seed, Purpose.CHIP_SYNAPSE, chip, -1), 0, Tolerances.LIMIT);
    final double gain = synapseSpread ? 1 + synapse.chipGainError() * shared : 1;
    for (int layer = 0; layer < targets.size(); layer++) {
      programmed.add(program(chip, layer, network.layers().get(layer), targets.get(layer), gain));
    }
    return programmed;
  }

  private float[] program(int chip, int layer, PairLayer shape, float[] target, double gain) {
    if (!synapse.limited()) {
      return target;
    }
    final double deviation = synapseSpread ? synapse.pairMismatch() : 0;
    final long spreadKey = Streams.key(seed, Purpose.CHIP_SYNAPSE, chip, layer);
    final long writeKey = Streams.key(seed, Purpose.WRITE_ERROR, chip, layer);
    final float[] weight = new float[target.length];
    for (int row = 0; row < shape.inputs(); row++) {
      final long spreadRow = Streams.subKey(spreadKey, row);
      final long writeRow = Streams.subKey(writeKey, row);
      for (int column = 0; column < shape.outputs(); column++) {
        final int at = row * shape.outputs() + column;
        final double mismatch =
            deviation == 0
                ? 0
                : deviation * Streams.truncatedNormal(spreadRow, column, Tolerances.LIMIT);
        final double write = Streams.truncatedNormal(writeRow, column, Tolerances.LIMIT);
        weight[at] = (float) synapse.programmed(target[at], gain, mismatch, write);
      }
    }
    return weight;
  }
}
