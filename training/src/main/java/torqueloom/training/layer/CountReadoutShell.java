package torqueloom.training.layer;

import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.gradient.Gradient;
import org.deeplearning4j.nn.workspace.ArrayType;
import org.deeplearning4j.nn.workspace.LayerWorkspaceMgr;
import org.nd4j.common.primitives.Pair;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;

/** The weighted-sum output inside the deep-learning library. */
final class CountReadoutShell extends PairLayerShell<CountReadout> {
  private static final long serialVersionUID = 1L;

  private transient INDArray meanCounts;
  private transient INDArray weights;

  CountReadoutShell(NeuralNetConfiguration conf, DataType dataType) {
    super(conf, dataType);
  }

  @Override
  public INDArray activate(boolean training, LayerWorkspaceMgr workspaces) {
    assertInputSet(false);
    final CountReadout c = layerConf();
    meanCounts = input.mean(2).muli(c.getGain());
    weights = Nd4j.create(effectiveWeights(training), new long[] {c.getNIn(), c.getNOut()}, 'c');
    final INDArray bias = Nd4j.create(offsets(), new long[] {1, c.getNOut()}, 'c');
    return workspaces.leverageTo(
        ArrayType.ACTIVATIONS, meanCounts.mmul(weights).addiRowVector(bias));
  }

  @Override
  public Pair<Gradient, INDArray> backpropGradient(INDArray epsilon, LayerWorkspaceMgr workspaces) {
    final CountReadout c = layerConf();
    final Gradient result =
        pairGradient(meanCounts.transpose().mmul(epsilon), epsilon.sum(true, 0));
    final INDArray each = epsilon.mmul(weights.transpose()).muli(c.getGain() / c.getSlots());
    final INDArray slots =
        Nd4j.createUninitialized(
            DataType.FLOAT, new long[] {c.getSlots(), each.size(0), each.size(1)}, 'c');
    for (int s = 0; s < c.getSlots(); s++) {
      slots.slice(s).assign(each);
    }
    return new Pair<>(
        result, workspaces.leverageTo(ArrayType.ACTIVATION_GRAD, slots.permute(1, 2, 0)));
  }
}
