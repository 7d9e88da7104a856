package torqueloom.training.layer;

import org.deeplearning4j.nn.conf.NeuralNetConfiguration;
import org.deeplearning4j.nn.gradient.Gradient;
import org.deeplearning4j.nn.workspace.ArrayType;
import org.deeplearning4j.nn.workspace.LayerWorkspaceMgr;
import org.nd4j.common.primitives.Pair;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.training.evaluation.CountKernel;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.NeuronLayer;
import torqueloom.training.evaluation.SlopeKernel;
import torqueloom.training.evaluation.SurrogateTable;

/**
 * A layer of device neurons inside the deep-learning library: one matrix product over batch and
 * slots, then the kernels on plain arrays. The backward pass reuses the drives and the drawn
 * devices of the forward pass; running the forward again would draw other counts.
 */
final class DeviceLayerShell extends PairLayerShell<DeviceLayer> {
  private static final long serialVersionUID = 1L;

  private transient NeuronBank bank;
  private transient SurrogateTable surrogate;
  private transient INDArray rows;
  private transient INDArray weights;
  private transient float[] drive;
  private transient NeuronLayer neurons;
  private transient double clippedShare;

  DeviceLayerShell(NeuralNetConfiguration conf, DataType dataType) {
    super(conf, dataType);
  }

  /** Share of pulses clipped at the largest drive in the last forward pass (1). */
  double clippedShare() {
    return clippedShare;
  }

  @Override
  public INDArray activate(boolean training, LayerWorkspaceMgr workspaces) {
    assertInputSet(false);
    if (maskArray != null) {
      throw new UnsupportedOperationException(
          "the device layer does not take masks: every row has the same number of slots");
    }
    final DeviceLayer c = layerConf();
    prepare(c);
    final int outputs = (int) c.getNOut();
    final int batch = (int) input.size(0);
    rows = slotRows(input, c);
    weights = Nd4j.create(effectiveWeights(training), new long[] {c.getNIn(), outputs}, 'c');
    drive = PairLayerShell.values(rows.mmul(weights));
    addOffsets(drive, offsets());
    neurons = neurons(training, outputs);
    final float[] counts = new float[c.getSlots() * batch * outputs];
    final CountKernel.Tally tally = new CountKernel.Tally();
    final int[] numbers = new int[batch];
    for (int b = 0; b < batch; b++) {
      numbers[b] = b;
    }
    final long key = stepKey(training ? Purpose.TRAINING_COUNTS : Purpose.IDEAL_COUNTS);
    if (c.isConstantInput()) {
      CountKernel.constantDrive(
          bank, neurons, drive, 0, c.getClip(), numbers, c.getSlots(), key, counts, tally);
    } else {
      CountKernel.slotDrive(
          bank, neurons, drive, c.getClip(), numbers, c.getSlots(), key, counts, tally);
    }
    clippedShare = (double) tally.clipped / tally.pulses;
    final INDArray slotMajor = Nd4j.create(counts, new long[] {c.getSlots(), batch, outputs}, 'c');
    return workspaces.leverageTo(ArrayType.ACTIVATIONS, slotMajor.permute(1, 2, 0));
  }

  @Override
  public Pair<Gradient, INDArray> backpropGradient(INDArray epsilon, LayerWorkspaceMgr workspaces) {
    final DeviceLayer c = layerConf();
    final int outputs = (int) c.getNOut();
    final int batch = (int) epsilon.size(0);
    final float[] error = values(epsilon.permute(2, 0, 1));
    final float[] slope =
        SlopeKernel.driveGradient(
            surrogate, neurons, drive, error, c.getSlots(), batch, c.isConstantInput());
    final INDArray driveGradient = Nd4j.create(slope, new long[] {rows.size(0), outputs}, 'c');
    final INDArray weightGradient = rows.transpose().mmul(driveGradient);
    final Gradient result = pairGradient(weightGradient, driveGradient.sum(true, 0));
    final INDArray inputGradient = driveGradient.mmul(weights.transpose());
    final INDArray shaped =
        c.isConstantInput()
            ? inputGradient
            : inputGradient.reshape('c', c.getSlots(), batch, c.getNIn()).permute(1, 2, 0);
    return new Pair<>(result, workspaces.leverageTo(ArrayType.ACTIVATION_GRAD, shaped));
  }

  private void prepare(DeviceLayer c) {
    if (bank == null) {
      bank = c.bank();
      surrogate = SurrogateTable.of(bank, c.getSurrogateWidth());
    }
  }

  /** Input as rows of the matrix product: [batch, inputs], or [slots * batch, inputs]. */
  private static INDArray slotRows(INDArray input, DeviceLayer c) {
    if (c.isConstantInput()) {
      return input.rank() == 2 ? input : input.tensorAlongDimension(0, 0, 1);
    }
    return input.permute(2, 0, 1).dup('c').reshape('c', c.getSlots() * input.size(0), c.getNIn());
  }

  private static void addOffsets(float[] drive, float[] offset) {
    for (int i = 0; i < drive.length; i++) {
      drive[i] += offset[i % offset.length];
    }
  }

  /** Nominal neurons, or newly drawn library instances in variation-aware training. */
  private NeuronLayer neurons(boolean training, int outputs) {
    final NeuronLayer nominal = NeuronLayer.nominal(outputs);
    if (training && layerConf().isVariationAware() && bank.instances() > 1) {
      final long key = Streams.subKey(stepKey(Purpose.TRAINING_VARIATION), -1);
      for (int j = 0; j < outputs; j++) {
        // Instance 0 is the nominal device; the others are the sample of the tolerances.
        nominal.instance()[j] = 1 + Streams.below(key, j, bank.instances() - 1);
      }
    }
    return nominal;
  }
}
