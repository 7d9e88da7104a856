package torqueloom.training.layer;

import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.gradient.DefaultGradient;
import org.deeplearning4j.nn.gradient.Gradient;
import org.deeplearning4j.nn.layers.AbstractLayer;
import org.deeplearning4j.nn.workspace.ArrayType;
import org.deeplearning4j.nn.workspace.LayerWorkspaceMgr;
import org.nd4j.common.primitives.Pair;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;

/** The output of device neurons inside the deep-learning library. */
final class CountSumShell extends AbstractLayer<CountSum> {
  private static final long serialVersionUID = 1L;

  private transient long slots;

  CountSumShell(NeuralNetConfiguration conf, DataType dataType) {
    super(conf, dataType);
  }

  @Override
  public boolean isPretrainLayer() {
    return false;
  }

  @Override
  public void clearNoiseWeightParams() {
    // No parameters.
  }

  @Override
  public INDArray activate(boolean training, LayerWorkspaceMgr workspaces) {
    assertInputSet(false);
    slots = input.size(2);
    return workspaces.leverageTo(ArrayType.ACTIVATIONS, input.mean(2).muli(layerConf().getGain()));
  }

  @Override
  public Pair<Gradient, INDArray> backpropGradient(INDArray epsilon, LayerWorkspaceMgr workspaces) {
    final INDArray each = epsilon.mul(layerConf().getGain() / slots);
    final INDArray out =
        Nd4j.createUninitialized(
            DataType.FLOAT, new long[] {slots, each.size(0), each.size(1)}, 'c');
    for (int s = 0; s < slots; s++) {
      out.slice(s).assign(each);
    }
    return new Pair<>(
        new DefaultGradient(),
        workspaces.leverageTo(ArrayType.ACTIVATION_GRAD, out.permute(1, 2, 0)));
  }

  @Override
  public org.deeplearning4j.nn.api.Layer clone() {
    throw new UnsupportedOperationException("clone the network, not a layer");
  }
}
