package torqueloom.training.layer;

import java.util.Collection;
import org.deeplearning4j.nn.api.Layer;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.inputs.InputType;
import org.deeplearning4j.optimize.api.TrainingListener;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;

/**
 * Configuration of the weighted-sum output: counts averaged over the slots, times pair weights,
 * plus a bias. Input: counts [batch, inputs, slots]. Output: scores [batch, classes] (nat).
 */
public final class CountReadout extends PairLayerConfiguration {
  private float gain = 1f;

  /** For the library's JSON reader. */
  public CountReadout() {}

  @Override
  public Layer instantiate(
      NeuralNetConfiguration conf,
      Collection<TrainingListener> listeners,
      int layerIndex,
      INDArray parametersView,
      boolean initialize,
      DataType networkDataType) {
    final CountReadoutShell layer = new CountReadoutShell(conf, networkDataType);
    layer.setListeners(listeners);
    layer.setIndex(layerIndex);
    layer.setParamsViewArray(parametersView);
    layer.setParamTable(initializer().init(conf, parametersView, initialize));
    layer.setConf(conf);
    return layer;
  }

  @Override
  public InputType getOutputType(int layerIndex, InputType inputType) {
    return InputType.feedForward(getNOut());
  }

  @Override
  public void setNIn(InputType inputType, boolean override) {
    if (getNIn() <= 0 || override) {
      setNIn(((InputType.InputTypeRecurrent) inputType).getSize());
    }
  }

  /** Scores per mean count and full-scale weight. */
  public float getGain() {
    return gain;
  }

  public void setGain(float gain) {
    this.gain = gain;
  }
}
