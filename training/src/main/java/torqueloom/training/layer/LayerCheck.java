package torqueloom.training.layer;

import java.nio.file.Path;
import java.util.List;
import org.deeplearning4j.nn.conf.MultiLayerConfiguration;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.layers.FeedForwardLayer;
import org.deeplearning4j.nn.conf.layers.Layer;
import org.deeplearning4j.nn.conf.layers.LossLayer;

/** Checks the fields of a foreign configuration before anything is built from it. */
final class LayerCheck {
  private static final int MOST_SLOTS = 65_536;
  private static final int MOST_LEVELS = 65_536;
  private static final long MOST_NEURONS = 1_000_000;

  /** 64 million values, 256 MB. */
  private static final long MOST_PARAMETERS = 64L << 20;

  private LayerCheck() {}

  /**
   * @param configuration as the library reads it
   * @param path file named in messages
   * @return number of parameters that the configuration asks for
   * @throws NetworkFileException naming the first layer that is not sound
   */
  static int check(MultiLayerConfiguration configuration, Path path) throws NetworkFileException {
    final List<NeuralNetConfiguration> layers = configuration.getConfs();
    if (layers == null || layers.isEmpty()) {
      throw new NetworkFileException(path, "the configuration has no layers");
    }
    long parameters = 0;
    long senders = -1;
    for (int i = 0; i < layers.size(); i++) {
      final Layer layer = layers.get(i) == null ? null : layers.get(i).getLayer();
      require(layer != null, path, i, "no kind");
      // A loss layer counts as feed-forward but has no sizes.
      if (layer instanceof FeedForwardLayer shape && !(layer instanceof LossLayer)) {
        require(inside(shape.getNIn()) && inside(shape.getNOut()), path, i, "its sizes");
        require(
            senders < 0 || senders == shape.getNIn(), path, i, "inputs unlike the layer before");
        senders = shape.getNOut();
      }
      if (layer instanceof PairLayerConfiguration pair) {
        pair(pair, path, i);
      }
      if (layer instanceof CountSum sum) {
        require(positive(sum.getGain()), path, i, "its gain");
      }
      parameters += layer.initializer().numParams(layers.get(i));
      require(parameters <= MOST_PARAMETERS, path, i, "more parameters than are allowed");
    }
    return (int) parameters;
  }

  private static boolean inside(long neurons) {
    return neurons >= 1 && neurons <= MOST_NEURONS;
  }

  private static void pair(PairLayerConfiguration layer, Path path, int number)
      throws NetworkFileException {
    require(layer.getSchema() == 1, path, number, "another schema than 1");
    require(layer.getSlots() >= 1 && layer.getSlots() <= MOST_SLOTS, path, number, "its slots");
    require(positive(layer.getOffsetScale()), path, number, "its offset scale");
    require(spread(layer.getWriteError()), path, number, "its write error");
    require(spread(layer.getMismatch()), path, number, "its mismatch");
    final float[] curve = layer.getCurve();
    require(curve != null && curve.length <= MOST_LEVELS, path, number, "its tuning curve");
    for (final float weight : curve) {
      require(weight >= 0 && weight <= 1, path, number, "its tuning curve");
    }
    if (layer instanceof CountReadout readout) {
      require(positive(readout.getGain()), path, number, "its gain");
    }
    if (layer instanceof DeviceLayer device) {
      device(device, path, number);
    }
  }

  private static void device(DeviceLayer device, Path path, int number)
      throws NetworkFileException {
    require(positive(device.getClip()), path, number, "its largest drive");
    require(positive(device.getSurrogateWidth()), path, number, "its surrogate width");
    require(positive(device.getGridDrive()), path, number, "its grid of drives");
    require(device.getLibraryDigest() != null, path, number, "its library's digest");
    require(device.getCumulative() != null && device.getMean() != null, path, number, "its tables");
    for (final float mean : device.getMean()) {
      require(Float.isFinite(mean), path, number, "its mean counts");
    }
    try {
      device.bank();
    } catch (RuntimeException e) {
      throw new NetworkFileException(path, "layer " + number + ": " + e.getMessage());
    }
  }

  private static boolean spread(double value) {
    return value >= 0 && Double.isFinite(value);
  }

  private static boolean positive(double value) {
    return value > 0 && Double.isFinite(value);
  }

  private static void require(boolean sound, Path path, int layer, String what)
      throws NetworkFileException {
    if (!sound) {
      throw new NetworkFileException(path, "layer " + layer + " has unsound values: " + what);
    }
  }
}
