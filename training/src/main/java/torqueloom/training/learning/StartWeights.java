package torqueloom.training.learning;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;

/**
 * First values of a network: weights small enough that drives spread over a good part of one count,
 * offsets that put each neuron somewhere between its first and its second count on average inputs,
 * so that no neuron starts silent or saturated.
 */
final class StartWeights {
  /** Wanted standard deviation of the drive over the rows, of the drive per count (1). */
  private static final double DRIVE_SPREAD = 0.4;

  private static final double COUNT_MEAN = 0.7;
  private static final double COUNT_DEVIATION = 0.6;
  private static final double READOUT_RANGE = 0.5;

  private StartWeights() {}

  /**
   * @param settings shape
   * @param x encoded training rows, [rows][inputs] flattened
   * @param inputs number of inputs
   * @param classes number of classes
   * @param bank responses
   * @param seed study seed
   */
  static List<PairLayer> of(
      NetworkSettings settings, float[] x, int inputs, int classes, NeuronBank bank, long seed) {
    final List<PairLayer> layers = new ArrayList<>();
    double[] mean = new double[inputs];
    double[] deviation = new double[inputs];
    moments(x, inputs, mean, deviation);
    for (int layer = 0; layer < settings.deviceLayers(); layer++) {
      final int outputs = layer < settings.hidden().length ? settings.hidden()[layer] : classes;
      layers.add(device(layer, mean, deviation, outputs, bank, seed));
      mean = filled(outputs, COUNT_MEAN);
      deviation = filled(outputs, COUNT_DEVIATION);
    }
    if (settings.output() == NetworkSettings.Output.WEIGHTED_SUM) {
      layers.add(readout(layers.size(), mean.length, classes, seed));
    }
    return layers;
  }

  private static PairLayer device(
      int layer, double[] mean, double[] deviation, int outputs, NeuronBank bank, long seed) {
    final int inputs = mean.length;
    final double first = bank.driveAtMean(0, 0.5f);
    final double second = bank.driveAtMean(0, 1.5f);
    double power = 1e-12;
    for (final double d : deviation) {
      power += d * d;
    }
    // A uniform weight in [-r, r] has variance r²/3.
    final double range =
        Math.min(1, DRIVE_SPREAD * Math.max(1, second - first) * Math.sqrt(3 / power));
    final long key = Streams.key(seed, Purpose.WEIGHT_START, layer);
    final float[] weight = new float[inputs * outputs];
    final float[] offset = new float[outputs];
    for (int j = 0; j < outputs; j++) {
      double sum = 0;
      for (int i = 0; i < inputs; i++) {
        final double w = range * (2 * Streams.uniform(key, (long) i * outputs + j) - 1);
        weight[i * outputs + j] = (float) w;
        sum += w * mean[i];
      }
      final double place = Streams.uniform(Streams.subKey(key, -1), j);
      offset[j] = (float) (first + (second - first) * (place - 0.25) - sum);
    }
    return pair(inputs, outputs, weight, offset);
  }

  private static PairLayer readout(int layer, int inputs, int outputs, long seed) {
    final long key = Streams.key(seed, Purpose.WEIGHT_START, layer);
    final float[] weight = new float[inputs * outputs];
    for (int i = 0; i < weight.length; i++) {
      weight[i] = (float) (READOUT_RANGE * (2 * Streams.uniform(key, i) - 1));
    }
    return pair(inputs, outputs, weight, new float[outputs]);
  }

  private static PairLayer pair(int inputs, int outputs, float[] weight, float[] offset) {
    final float[] plus = new float[weight.length];
    final float[] minus = new float[weight.length];
    for (int i = 0; i < weight.length; i++) {
      plus[i] = 0.5f + 0.5f * weight[i];
      minus[i] = 0.5f - 0.5f * weight[i];
    }
    return new PairLayer(inputs, outputs, plus, minus, offset);
  }

  private static void moments(float[] x, int inputs, double[] mean, double[] deviation) {
    final int rows = x.length / inputs;
    for (int i = 0; i < inputs; i++) {
      double sum = 0;
      double square = 0;
      for (int r = 0; r < rows; r++) {
        final double value = x[r * inputs + i];
        sum += value;
        square += value * value;
      }
      mean[i] = sum / rows;
      deviation[i] = Math.sqrt(Math.max(0, square / rows - mean[i] * mean[i]));
    }
  }

  private static double[] filled(int n, double value) {
    final double[] array = new double[n];
    java.util.Arrays.fill(array, value);
    return array;
  }
}
