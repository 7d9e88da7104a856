package torqueloom.training.layer;

import java.util.Map;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.gradient.DefaultGradient;
import org.deeplearning4j.nn.gradient.Gradient;
import org.deeplearning4j.nn.layers.BaseLayer;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.api.ops.impl.transforms.clip.ClipByValue;
import org.nd4j.linalg.factory.Nd4j;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.training.evaluation.PairWeights;

/**
 * What the pair layers share: effective weights from the pair of detunings with their levels
 * (straight-through rounding: Y. Bengio, N. Léonard, A. Courville, arXiv:1308.3432, from memory),
 * drawn write errors, gradients of the pair, and the clip of detunings to their range.
 *
 * @param <C> the layer's configuration
 */
abstract class PairLayerShell<C extends PairLayerConfiguration> extends BaseLayer<C> {
  private static final long serialVersionUID = 1L;

  PairLayerShell(NeuralNetConfiguration conf, DataType dataType) {
    super(conf, dataType);
  }

  @Override
  public boolean isPretrainLayer() {
    return false;
  }

  /** Number of the training step's stream below a purpose. */
  final long stepKey(Purpose purpose) {
    final PairLayerConfiguration c = layerConf();
    return Streams.subKey(
        Streams.key(c.getSeed(), purpose, getEpochCount(), getIterationCount()),
        c.getLayerNumber());
  }

  /** Weights [inputs][outputs] flattened that this pass works with. */
  final float[] effectiveWeights(boolean training) {
    final PairLayerConfiguration c = layerConf();
    final float[] weight =
        PairWeights.atLevels(
            values(getParam(PairParameters.PLUS)),
            values(getParam(PairParameters.MINUS)),
            c.getCurve());
    if (training && c.isVariationAware()) {
      final long key = stepKey(Purpose.TRAINING_VARIATION);
      for (int i = 0; i < weight.length; i++) {
        final double reach = c.getMismatch() * Streams.normal(key, 2L * i);
        final double reached = Math.max(-1 + reach, Math.min(1 + reach, weight[i]));
        weight[i] = (float) (reached + c.getWriteError() * Streams.normal(key, 2L * i + 1));
      }
    }
    return weight;
  }

  /** Offsets [outputs] in their own unit. */
  final float[] offsets() {
    final float[] offset = values(getParam(PairParameters.OFFSET));
    for (int i = 0; i < offset.length; i++) {
      offset[i] *= (float) layerConf().getOffsetScale();
    }
    return offset;
  }

  /**
   * Writes gradients (sums over the batch) into the network's views.
   *
   * @param weightGradient of the signed weight, [inputs, outputs]
   * @param offsetGradient of the offset, [1, outputs]
   */
  final Gradient pairGradient(INDArray weightGradient, INDArray offsetGradient) {
    final Map<String, INDArray> views = gradientViews;
    final INDArray plus = views.get(PairParameters.PLUS);
    final INDArray minus = views.get(PairParameters.MINUS);
    final INDArray offset = views.get(PairParameters.OFFSET);
    plus.assign(weightGradient);
    minus.assign(weightGradient).negi();
    offset.assign(offsetGradient).muli(layerConf().getOffsetScale());
    final Gradient result = new DefaultGradient(gradientsFlattened);
    result.setGradientFor(PairParameters.PLUS, plus);
    result.setGradientFor(PairParameters.MINUS, minus);
    result.setGradientFor(PairParameters.OFFSET, offset);
    return result;
  }

  /** Keeps the detunings inside the tuning range after each update. */
  @Override
  public void applyConstraints(int iteration, int epoch) {
    super.applyConstraints(iteration, epoch);
    clip(getParam(PairParameters.PLUS));
    clip(getParam(PairParameters.MINUS));
  }

  private static void clip(INDArray detuning) {
    detuning.assign(Nd4j.exec(new ClipByValue(detuning, 0.0, 1.0))[0]);
  }

  /** A copy of an array's values in row-major order. */
  static float[] values(INDArray array) {
    return array.dup('c').data().asFloat();
  }
}
