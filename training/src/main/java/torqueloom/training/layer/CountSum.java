package torqueloom.training.layer;

import java.util.Collection;
import org.deeplearning4j.nn.api.Layer;
import org.deeplearning4j.nn.conf.InputPreProcessor;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.inputs.InputType;
import org.deeplearning4j.nn.conf.layers.NoParamLayer;
import org.deeplearning4j.nn.conf.memory.LayerMemoryReport;
import org.deeplearning4j.nn.conf.memory.MemoryReport;
import org.deeplearning4j.optimize.api.TrainingListener;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;

/**
 * Configuration of the output of device neurons: counts averaged over the slots, times a gain.
 * Input: counts [batch, classes, slots]. Output: scores [batch, classes] (nat).
 */
public final class CountSum extends NoParamLayer {
  private float gain = 1f;

  /** For the library's JSON reader. */
  public CountSum() {}

  @Override
  public Layer instantiate(
      NeuralNetConfiguration conf,
      Collection<TrainingListener> listeners,
      int layerIndex,
      INDArray parametersView,
      boolean initialize,
      DataType networkDataType) {
    final CountSumShell layer = new CountSumShell(conf, networkDataType);
    layer.setListeners(listeners);
    layer.setIndex(layerIndex);
    return layer;
  }

  @Override
  public InputType getOutputType(int layerIndex, InputType inputType) {
    return InputType.feedForward(((InputType.InputTypeRecurrent) inputType).getSize());
  }

  @Override
  public InputPreProcessor getPreProcessorForInputType(InputType inputType) {
    return null;
  }

  @Override
  public LayerMemoryReport getMemoryReport(InputType inputType) {
    return new LayerMemoryReport.Builder(
            layerName, CountSum.class, inputType, getOutputType(0, inputType))
        .standardMemory(0, 0)
        .workingMemory(0, 0, 0, 0)
        .cacheMemory(MemoryReport.CACHE_MODE_ALL_ZEROS, MemoryReport.CACHE_MODE_ALL_ZEROS)
        .build();
  }

  /** Scores per mean count. */
  public float getGain() {
    return gain;
  }

  public void setGain(float gain) {
    this.gain = gain;
  }
}
