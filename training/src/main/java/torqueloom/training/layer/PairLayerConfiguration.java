package torqueloom.training.layer;

import org.deeplearning4j.nn.api.ParamInitializer;
import org.deeplearning4j.nn.conf.InputPreProcessor;
import org.deeplearning4j.nn.conf.inputs.InputType;
import org.deeplearning4j.nn.conf.layers.FeedForwardLayer;
import org.deeplearning4j.nn.conf.memory.LayerMemoryReport;

/**
 * Configuration shared by the layers whose weights are pairs of detunings. A Java bean, because the
 * deep-learning library reads and writes it as JSON; nothing else should set its properties.
 *
 * <p>Parameters of the layer: {@code P} and {@code M}, normalized detunings in [0, 1], [inputs,
 * outputs]; {@code b}, offsets over {@code offsetScale}, [1, outputs].
 */
public abstract class PairLayerConfiguration extends FeedForwardLayer {
  private int schema = 1;
  private long seed;
  private int layerNumber;
  private int slots = 1;
  private float[] curve = new float[0];
  private double writeError;
  private double mismatch;
  private boolean variationAware;
  private double offsetScale = 1;

  /** For the library's JSON reader. */
  protected PairLayerConfiguration() {}

  @Override
  public ParamInitializer initializer() {
    return PairParameters.INSTANCE;
  }

  @Override
  public InputPreProcessor getPreProcessorForInputType(InputType inputType) {
    return null;
  }

  @Override
  public boolean isPretrainParam(String name) {
    return false;
  }

  @Override
  public LayerMemoryReport getMemoryReport(InputType inputType) {
    final long parameters = initializer().numParams(this);
    return new LayerMemoryReport.Builder(
            layerName, getClass(), inputType, getOutputType(layerNumber, inputType))
        .standardMemory(parameters, 2 * parameters)
        .workingMemory(0, 0, 0, getNOut() * slots)
        .cacheMemory(0, 0)
        .build();
  }

  /** Version of this configuration's fields. */
  public int getSchema() {
    return schema;
  }

  public void setSchema(int schema) {
    this.schema = schema;
  }

  /** Study seed. */
  public long getSeed() {
    return seed;
  }

  public void setSeed(long seed) {
    this.seed = seed;
  }

  /** Number of the layer of synapses, from 0. */
  public int getLayerNumber() {
    return layerNumber;
  }

  public void setLayerNumber(int layerNumber) {
    this.layerNumber = layerNumber;
  }

  /** Number of slots. */
  public int getSlots() {
    return slots;
  }

  public void setSlots(int slots) {
    this.slots = slots;
  }

  /** Normalized weight at each level, see {@link torqueloom.training.evaluation.PairWeights}. */
  public float[] getCurve() {
    return curve;
  }

  public void setCurve(float[] curve) {
    this.curve = curve;
  }

  /** Standard deviation of a weight's residual after programming (full-scale weights). */
  public double getWriteError() {
    return writeError;
  }

  public void setWriteError(double writeError) {
    this.writeError = writeError;
  }

  /** Standard deviation of a pair's mismatch (full-scale weights). */
  public double getMismatch() {
    return mismatch;
  }

  public void setMismatch(double mismatch) {
    this.mismatch = mismatch;
  }

  /** Whether each training step draws new devices and write errors. */
  public boolean isVariationAware() {
    return variationAware;
  }

  public void setVariationAware(boolean variationAware) {
    this.variationAware = variationAware;
  }

  /** Offset for a parameter b of one. */
  public double getOffsetScale() {
    return offsetScale;
  }

  public void setOffsetScale(double offsetScale) {
    this.offsetScale = offsetScale;
  }
}
