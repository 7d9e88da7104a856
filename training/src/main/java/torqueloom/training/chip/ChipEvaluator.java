package torqueloom.training.chip;

import java.util.ArrayList;
import java.util.List;
import torqueloom.model.device.DeviceKind;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.training.evaluation.CountKernel;
import torqueloom.training.evaluation.ForwardPass;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.NeuronLayer;
import torqueloom.training.evaluation.TrainedNetwork;

/**
 * Runs the test rows through drawn chips. Thermal noise is drawn anew in every slot, keyed by
 * (chip, temperature, pass), so chips that differ only in a tolerance see the same noise.
 *
 * @param factory draws the chips
 * @param network trained network
 * @param banks responses by temperature index of the library
 * @param temperatureIndices temperatures to run, as indices into the library's
 * @param clip largest drive (unit drives)
 * @param x encoded test rows, [rows][inputs] flattened
 * @param labels class of each test row, [rows]
 * @param passes noise passes
 */
public record ChipEvaluator(
    ChipFactory factory,
    TrainedNetwork network,
    List<NeuronBank> banks,
    List<Integer> temperatureIndices,
    float clip,
    float[] x,
    int[] labels,
    int passes) {

  /**
   * One chip at every temperature asked for.
   *
   * @param chip chip number
   * @return one outcome a temperature
   */
  public List<ChipOutcome> evaluate(int chip) {
    final List<List<DeviceKind>> devices = new ArrayList<>();
    for (int layer = 0; layer < network.settings().deviceLayers(); layer++) {
      devices.add(factory.devices(chip, layer, network.layers().get(layer).outputs()));
    }
    final List<float[]> weights = factory.weights(chip, network);
    final List<ChipOutcome> outcomes = new ArrayList<>();
    float[] firstDrive = null;
    for (final int temperature : temperatureIndices) {
      final List<NeuronLayer> neurons =
          devices.stream().map(layer -> factory.neurons(layer, temperature)).toList();
      final ForwardPass pass =
          new ForwardPass(banks.get(temperature), network, weights, neurons, clip);
      // Weights do not depend on the temperature, so neither does the first layer's drive.
      firstDrive = firstDrive == null ? pass.firstDrive(x, labels.length) : firstDrive;
      outcomes.add(run(pass, firstDrive, chip, factory.temperatures().get(temperature)));
    }
    return outcomes;
  }

  private ChipOutcome run(ForwardPass chip, float[] firstDrive, int number, double temperature) {
    final byte[] correct = new byte[labels.length];
    final int[] perPass = new int[passes];
    final CountKernel.Tally[] tallies = chip.tallies();
    for (int pass = 0; pass < passes; pass++) {
      final long key =
          Streams.key(
              factory.seed(),
              Purpose.CHIP_COUNTS,
              number,
              Double.doubleToLongBits(temperature),
              pass);
      final int[] predicted = chip.predictFrom(firstDrive, labels.length, key, tallies);
      for (int row = 0; row < labels.length; row++) {
        if (predicted[row] == labels[row]) {
          correct[row]++;
          perPass[pass]++;
        }
      }
    }
    return new ChipOutcome(correct, perPass, CountKernel.Tally.clippedShare(tallies));
  }
}
