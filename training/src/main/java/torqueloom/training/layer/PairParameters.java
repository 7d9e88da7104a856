package torqueloom.training.layer;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.deeplearning4j.nn.api.ParamInitializer;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.layers.FeedForwardLayer;
import org.deeplearning4j.nn.conf.layers.Layer;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.indexing.NDArrayIndex;

/**
 * Places the parameters of a pair layer in the network's flat vector: P, M (each [inputs, outputs],
 * row-major) and b ([1, outputs]). The trainer sets their first values; a network that is only
 * initialized starts with every detuning in the middle, that is with weights of zero.
 */
final class PairParameters implements ParamInitializer {
  static final PairParameters INSTANCE = new PairParameters();
  static final String PLUS = "P";
  static final String MINUS = "M";
  static final String OFFSET = "b";

  private PairParameters() {}

  @Override
  public long numParams(NeuralNetConfiguration conf) {
    return numParams(conf.getLayer());
  }

  @Override
  public long numParams(Layer layer) {
    final FeedForwardLayer shape = (FeedForwardLayer) layer;
    return 2 * shape.getNIn() * shape.getNOut() + shape.getNOut();
  }

  @Override
  public List<String> paramKeys(Layer layer) {
    return List.of(PLUS, MINUS, OFFSET);
  }

  @Override
  public List<String> weightKeys(Layer layer) {
    return List.of(PLUS, MINUS);
  }

  @Override
  public List<String> biasKeys(Layer layer) {
    return List.of(OFFSET);
  }

  @Override
  public boolean isWeightParam(Layer layer, String key) {
    return PLUS.equals(key) || MINUS.equals(key);
  }

  @Override
  public boolean isBiasParam(Layer layer, String key) {
    return OFFSET.equals(key);
  }

  @Override
  public Map<String, INDArray> init(
      NeuralNetConfiguration conf, INDArray paramsView, boolean initializeParams) {
    final Map<String, INDArray> views = views(conf, paramsView);
    if (initializeParams) {
      views.get(PLUS).assign(0.5);
      views.get(MINUS).assign(0.5);
      views.get(OFFSET).assign(0);
    }
    views.keySet().forEach(conf::addVariable);
    return views;
  }

  @Override
  public Map<String, INDArray> getGradientsFromFlattened(
      NeuralNetConfiguration conf, INDArray gradientView) {
    return views(conf, gradientView);
  }

  private static Map<String, INDArray> views(NeuralNetConfiguration conf, INDArray flat) {
    final FeedForwardLayer shape = (FeedForwardLayer) conf.getLayer();
    final long inputs = shape.getNIn();
    final long outputs = shape.getNOut();
    final long weights = inputs * outputs;
    final INDArray row = flat.reshape(flat.length());
    final Map<String, INDArray> views = new LinkedHashMap<>();
    views.put(PLUS, part(row, 0, weights).reshape('c', inputs, outputs));
    views.put(MINUS, part(row, weights, 2 * weights).reshape('c', inputs, outputs));
    views.put(OFFSET, part(row, 2 * weights, 2 * weights + outputs).reshape('c', 1, outputs));
    return views;
  }

  private static INDArray part(INDArray row, long from, long to) {
    return row.get(NDArrayIndex.interval(from, to));
  }
}
