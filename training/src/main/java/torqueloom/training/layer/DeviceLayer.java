package torqueloom.training.layer;

import java.util.Collection;
import java.util.Map;
import org.deeplearning4j.nn.api.Layer;
import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.conf.inputs.InputType;
import org.deeplearning4j.optimize.api.TrainingListener;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import torqueloom.training.evaluation.NeuronBank;

/**
 * Configuration of a layer of device neurons. The responses travel inside it, so that a network
 * file is complete in itself. A Java bean for the library's JSON; make one with {@link
 * NetworkBuilder}.
 *
 * <p>Input: levels [batch, inputs] held in every slot for the first layer, else counts [batch,
 * inputs, slots]. Output: counts [batch, outputs, slots].
 */
public final class DeviceLayer extends PairLayerConfiguration {
  private boolean constantInput;
  private int instances;
  private int points;
  private int maximumCount;
  private float gridDrive;
  private float[] cumulative = new float[0];
  private float[] mean = new float[0];
  private float clip;
  private float surrogateWidth;
  private String libraryDigest = "";

  /** For the library's JSON reader. */
  public DeviceLayer() {}

  @Override
  public Layer instantiate(
      NeuralNetConfiguration conf,
      Collection<TrainingListener> listeners,
      int layerIndex,
      INDArray parametersView,
      boolean initialize,
      DataType networkDataType) {
    final DeviceLayerShell layer = new DeviceLayerShell(conf, networkDataType);
    layer.setListeners(listeners);
    layer.setIndex(layerIndex);
    layer.setParamsViewArray(parametersView);
    final Map<String, INDArray> table = initializer().init(conf, parametersView, initialize);
    layer.setParamTable(table);
    layer.setConf(conf);
    return layer;
  }

  @Override
  public InputType getOutputType(int layerIndex, InputType inputType) {
    return InputType.recurrent(getNOut(), getSlots());
  }

  @Override
  public void setNIn(InputType inputType, boolean override) {
    if (getNIn() <= 0 || override) {
      setNIn(
          inputType instanceof InputType.InputTypeRecurrent recurrent
              ? recurrent.getSize()
              : ((InputType.InputTypeFeedForward) inputType).getSize());
    }
  }

  /** Takes over the responses of a bank. */
  void takeBank(NeuronBank bank) {
    instances = bank.instances();
    points = bank.points();
    maximumCount = bank.maximumCount();
    gridDrive = bank.maximumDrive();
    cumulative = bank.cumulative();
    mean = bank.mean();
  }

  /** The responses as the kernels read them. */
  NeuronBank bank() {
    return new NeuronBank(instances, points, maximumCount, gridDrive, cumulative, mean);
  }

  /** Whether the input is held in every slot. */
  public boolean isConstantInput() {
    return constantInput;
  }

  public void setConstantInput(boolean constantInput) {
    this.constantInput = constantInput;
  }

  /** Number of device instances in the tables. */
  public int getInstances() {
    return instances;
  }

  public void setInstances(int instances) {
    this.instances = instances;
  }

  /** Grid points of the tables. */
  public int getPoints() {
    return points;
  }

  public void setPoints(int points) {
    this.points = points;
  }

  /** Largest count in the tables. */
  public int getMaximumCount() {
    return maximumCount;
  }

  public void setMaximumCount(int maximumCount) {
    this.maximumCount = maximumCount;
  }

  /** Drive of the last grid point (unit drives). */
  public float getGridDrive() {
    return gridDrive;
  }

  public void setGridDrive(float gridDrive) {
    this.gridDrive = gridDrive;
  }

  /** P(count &lt;= k), [instances][points][maximumCount] flattened. */
  public float[] getCumulative() {
    return cumulative;
  }

  public void setCumulative(float[] cumulative) {
    this.cumulative = cumulative;
  }

  /** Mean counts, [instances][points] flattened. */
  public float[] getMean() {
    return mean;
  }

  public void setMean(float[] mean) {
    this.mean = mean;
  }

  /** Largest drive (unit drives). */
  public float getClip() {
    return clip;
  }

  public void setClip(float clip) {
    this.clip = clip;
  }

  /** Width of the surrogate slope (unit drives). */
  public float getSurrogateWidth() {
    return surrogateWidth;
  }

  public void setSurrogateWidth(float surrogateWidth) {
    this.surrogateWidth = surrogateWidth;
  }

  /** Digest of the response library. */
  public String getLibraryDigest() {
    return libraryDigest;
  }

  public void setLibraryDigest(String libraryDigest) {
    this.libraryDigest = libraryDigest;
  }
}
