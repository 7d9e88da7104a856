package torqueloom.training.layer;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.WorkspaceMode;
import org.deeplearning4j.nn.conf.layers.LossLayer;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.nd4j.linalg.activations.Activation;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;
import org.nd4j.linalg.learning.config.IUpdater;
import org.nd4j.linalg.lossfunctions.LossFunctions;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.ReadoutKernel;
import torqueloom.training.evaluation.TrainedNetwork;

/**
 * Makes a network of the deep-learning library from plain values, and plain values from a network.
 *
 * @param settings shape
 * @param inputs number of inputs
 * @param classes number of classes
 * @param bank responses at the training temperature
 * @param libraryDigest digest of the response library
 * @param clip largest drive (unit drives)
 * @param surrogateWidth width of the surrogate slope (unit drives)
 * @param curve normalized weight at each level
 * @param writeError residual of a weight after programming (full-scale weights), one sigma
 * @param mismatch of a pair (full-scale weights), one sigma
 * @param variationAware whether training draws devices and write errors
 * @param seed study seed
 */
public record NetworkBuilder(
    NetworkSettings settings,
    int inputs,
    int classes,
    NeuronBank bank,
    String libraryDigest,
    float clip,
    float surrogateWidth,
    float[] curve,
    double writeError,
    double mismatch,
    boolean variationAware,
    long seed) {

  /**
   * A network with parameters of its own, not shared with anything.
   *
   * @param start first values, one a layer of synapses
   * @param updater rule that turns gradients into steps
   */
  public MultiLayerNetwork build(List<PairLayer> start, IUpdater updater) {
    NativeCheck.ensure();
    final NeuralNetConfiguration.ListBuilder list =
        new NeuralNetConfiguration.Builder()
            .seed(seed)
            .updater(updater)
            .trainingWorkspaceMode(WorkspaceMode.NONE)
            .inferenceWorkspaceMode(WorkspaceMode.NONE)
            .list();
    configurations().forEach(list::layer);
    list.layer(
        new LossLayer.Builder(LossFunctions.LossFunction.MCXENT)
            .activation(Activation.SOFTMAX)
            .build());
    final MultiLayerNetwork network = new MultiLayerNetwork(list.build());
    network.init();
    for (int layer = 0; layer < start.size(); layer++) {
      set(network, layer, start.get(layer));
    }
    return network;
  }

  /** Sets one layer's parameters. */
  public static void set(MultiLayerNetwork network, int layer, PairLayer values) {
    final Map<String, INDArray> table = network.getLayer(layer).paramTable();
    final long[] shape = {values.inputs(), values.outputs()};
    final double scale =
        ((PairLayerConfiguration) network.getLayer(layer).conf().getLayer()).getOffsetScale();
    table.get(PairParameters.PLUS).assign(Nd4j.create(values.plus(), shape, 'c'));
    table.get(PairParameters.MINUS).assign(Nd4j.create(values.minus(), shape, 'c'));
    table
        .get(PairParameters.OFFSET)
        .assign(Nd4j.create(values.offset(), new long[] {1, values.outputs()}, 'c').div(scale));
  }

  /**
   * The plain values of a network made by {@link #build} or read from a network file.
   *
   * @throws IllegalArgumentException if the network's slots, hidden layers or output are not those
   *     of the settings
   */
  public static TrainedNetwork plain(MultiLayerNetwork network, NetworkSettings settings) {
    final List<PairLayer> layers = new ArrayList<>();
    PairLayerConfiguration last = null;
    String digest = "";
    for (final org.deeplearning4j.nn.api.Layer layer : network.getLayers()) {
      if (layer.conf().getLayer() instanceof PairLayerConfiguration c) {
        layers.add(plain(layer, c));
        last = c;
        digest = c instanceof DeviceLayer device ? device.getLibraryDigest() : digest;
      }
    }
    if (last == null) {
      throw new IllegalArgumentException("the network has no layer of pair weights");
    }
    requireShape(layers, last, settings);
    final float gain =
        last instanceof CountReadout readout ? readout.getGain() : ReadoutKernel.deviceGain();
    return new TrainedNetwork(settings, layers, last.getCurve(), gain, digest);
  }

  private static void requireShape(
      List<PairLayer> layers, PairLayerConfiguration last, NetworkSettings settings) {
    final boolean sum = settings.output() == NetworkSettings.Output.WEIGHTED_SUM;
    final int[] hidden = settings.hidden();
    boolean fits =
        last.getSlots() == settings.slots()
            && last instanceof CountReadout == sum
            && layers.size() == hidden.length + 1;
    for (int layer = 0; fits && layer < hidden.length; layer++) {
      fits = layers.get(layer).outputs() == hidden[layer];
    }
    if (!fits) {
      throw new IllegalArgumentException("the network's shape is not that of the settings");
    }
  }

  private static PairLayer plain(org.deeplearning4j.nn.api.Layer layer, PairLayerConfiguration c) {
    final float[] offset = PairLayerShell.values(layer.getParam(PairParameters.OFFSET));
    for (int j = 0; j < offset.length; j++) {
      offset[j] *= (float) c.getOffsetScale();
    }
    return new PairLayer(
        (int) c.getNIn(),
        (int) c.getNOut(),
        PairLayerShell.values(layer.getParam(PairParameters.PLUS)),
        PairLayerShell.values(layer.getParam(PairParameters.MINUS)),
        offset);
  }

  private List<org.deeplearning4j.nn.conf.layers.Layer> configurations() {
    final List<org.deeplearning4j.nn.conf.layers.Layer> result = new ArrayList<>();
    int senders = inputs;
    for (int layer = 0; layer < settings.deviceLayers(); layer++) {
      final int neurons = layer < settings.hidden().length ? settings.hidden()[layer] : classes;
      result.add(device(layer, senders, neurons));
      senders = neurons;
    }
    if (settings.output() == NetworkSettings.Output.DEVICE) {
      final CountSum sum = new CountSum();
      sum.setGain(ReadoutKernel.deviceGain());
      result.add(sum);
    } else {
      final CountReadout readout = new CountReadout();
      shared(readout, result.size(), senders, classes);
      readout.setGain(ReadoutKernel.gain(senders));
      result.add(readout);
    }
    return result;
  }

  private DeviceLayer device(int number, int senders, int neurons) {
    final DeviceLayer layer = new DeviceLayer();
    shared(layer, number, senders, neurons);
    layer.takeBank(bank);
    layer.setConstantInput(number == 0);
    layer.setClip(clip);
    layer.setSurrogateWidth(surrogateWidth);
    layer.setLibraryDigest(libraryDigest);
    // Offsets span tens of unit drives while detunings span one: one step of the updater moves an
    // offset by this factor more.
    layer.setOffsetScale(0.4 * clip);
    return layer;
  }

  private void shared(PairLayerConfiguration layer, int number, int senders, int receivers) {
    layer.setNIn(senders);
    layer.setNOut(receivers);
    layer.setLayerNumber(number);
    layer.setSlots(settings.slots());
    layer.setCurve(curve);
    layer.setWriteError(writeError);
    layer.setMismatch(mismatch);
    layer.setVariationAware(variationAware);
    layer.setSeed(seed);
  }
}
