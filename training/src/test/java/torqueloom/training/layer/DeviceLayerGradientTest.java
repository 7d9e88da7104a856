package torqueloom.training.layer;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.deeplearning4j.nn.gradient.Gradient;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.deeplearning4j.nn.workspace.LayerWorkspaceMgr;
import org.junit.jupiter.api.Test;
import org.nd4j.common.primitives.Pair;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;
import org.nd4j.linalg.learning.config.Sgd;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.evaluation.NeuronBank;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.PairWeights;
import torqueloom.training.evaluation.SurrogateTable;

/** The layers' backward pass against sums written out term by term. */
class DeviceLayerGradientTest {
  private static final int BATCH = 4;
  private static final int SLOTS = 3;
  private static final float WIDTH = 1.5f;
  private static final NeuronBank BANK =
      new NeuronBank(
          1,
          4,
          2,
          12f,
          new float[] {1f, 1f, .6f, 1f, .1f, .9f, 0f, .3f},
          new float[] {0f, .4f, 1f, 1.7f});

  private static MultiLayerNetwork network() {
    final NetworkBuilder builder =
        new NetworkBuilder(
            new NetworkSettings(new int[] {3, 2}, SLOTS, NetworkSettings.Output.WEIGHTED_SUM, 0, 1),
            2,
            2,
            BANK,
            "",
            10f,
            WIDTH,
            PairWeights.straight(0),
            0,
            0,
            false,
            3);
    final MultiLayerNetwork network =
        builder.build(
            List.of(
                layer(2, 3, new float[] {3f, 5f, 1f}),
                layer(3, 2, new float[] {4f, 2f}),
                layer(2, 2, new float[] {0f, 0.1f})),
            new Sgd(0.1));
    network.initGradientsView();
    return network;
  }

  private static PairLayer layer(int inputs, int outputs, float[] offset) {
    final float[] plus = new float[inputs * outputs];
    final float[] minus = new float[inputs * outputs];
    for (int i = 0; i < plus.length; i++) {
      plus[i] = (i * 7 % 10) / 10f;
      minus[i] = (i * 3 % 10) / 10f;
    }
    return new PairLayer(inputs, outputs, plus, minus, offset);
  }

  private static INDArray random(int seed, long... shape) {
    Nd4j.getRandom().setSeed(seed);
    return Nd4j.rand(DataType.FLOAT, shape).muli(4);
  }

  private static double weight(org.deeplearning4j.nn.api.Layer layer, int i, int j) {
    return layer.getParam("P").getDouble(i, j) - layer.getParam("M").getDouble(i, j);
  }

  private static double offset(org.deeplearning4j.nn.api.Layer layer, int j) {
    return layer.getParam("b").getDouble(0, j)
        * ((DeviceLayer) layer.conf().getLayer()).getOffsetScale();
  }

  /** dL/d(drive) of one neuron, sample and slot. */
  private static double driveGradient(
      org.deeplearning4j.nn.api.Layer layer, double[] x, double error, int j) {
    double drive = offset(layer, j);
    for (int i = 0; i < x.length; i++) {
      drive += x[i] * weight(layer, i, j);
    }
    return error * SurrogateTable.of(BANK, WIDTH).at(0, (float) drive);
  }

  private static double[] inputOf(INDArray x, boolean constant, int b, int s) {
    final double[] values = new double[(int) x.size(1)];
    for (int i = 0; i < values.length; i++) {
      values[i] = constant ? x.getDouble(b, i) : x.getDouble(b, i, s);
    }
    return values;
  }

  private static void check(org.deeplearning4j.nn.api.Layer layer, INDArray x, boolean constant) {
    final LayerWorkspaceMgr plain = LayerWorkspaceMgr.noWorkspaces();
    layer.setInput(x, plain);
    final INDArray counts = layer.activate(true, plain);
    final int inputs = (int) x.size(1);
    final int outputs = (int) counts.size(1);
    assertArrayEquals(new long[] {BATCH, outputs, SLOTS}, counts.shape());
    final INDArray error = random(5, BATCH, outputs, SLOTS).subi(2);
    final Pair<Gradient, INDArray> back = layer.backpropGradient(error, plain);
    final double[][] weights = new double[inputs][outputs];
    final double[] offsets = new double[outputs];
    final double[][][] toInput = new double[BATCH][inputs][SLOTS];
    for (int b = 0; b < BATCH; b++) {
      for (int s = 0; s < SLOTS; s++) {
        final double[] value = inputOf(x, constant, b, s);
        for (int j = 0; j < outputs; j++) {
          final double g = driveGradient(layer, value, error.getDouble(b, j, s), j);
          offsets[j] += g;
          for (int i = 0; i < inputs; i++) {
            weights[i][j] += g * value[i];
            toInput[b][i][constant ? 0 : s] += g * weight(layer, i, j);
          }
        }
      }
    }
    final Gradient gradient = back.getFirst();
    final double scale = ((DeviceLayer) layer.conf().getLayer()).getOffsetScale();
    for (int j = 0; j < outputs; j++) {
      assertEquals(offsets[j] * scale, gradient.getGradientFor("b").getDouble(0, j), 1e-3);
      for (int i = 0; i < inputs; i++) {
        assertEquals(weights[i][j], gradient.getGradientFor("P").getDouble(i, j), 1e-4);
        assertEquals(-weights[i][j], gradient.getGradientFor("M").getDouble(i, j), 1e-4);
      }
    }
    for (int b = 0; b < BATCH; b++) {
      for (int i = 0; i < inputs; i++) {
        for (int s = 0; s < (constant ? 1 : SLOTS); s++) {
          final double got =
              constant ? back.getSecond().getDouble(b, i) : back.getSecond().getDouble(b, i, s);
          assertEquals(toInput[b][i][s], got, 1e-4);
        }
      }
    }
  }

  @Test
  void firstLayerSumsOverBatchAndSlots() {
    check(network().getLayer(0), random(1, BATCH, 2), true);
  }

  @Test
  void laterLayerKeepsSlotsApart() {
    check(network().getLayer(1), random(2, BATCH, 3, SLOTS), false);
  }

  /** The widened slope is the slope of the smoothed mean count: central differences of a sum. */
  @Test
  void surrogateIsTheSlopeOfTheSmoothedMean() {
    final SurrogateTable table = SurrogateTable.of(BANK, WIDTH);
    for (final double at : new double[] {-2, 0, 1.7, 5, 8.3, 11, 13}) {
      final double difference = (smoothed(at + 0.05) - smoothed(at - 0.05)) / 0.1;
      assertEquals(difference, table.at(0, (float) at), 0.004, "drive " + at);
    }
  }

  /** Mean count smoothed by a Gaussian cut at three widths, as the table's is. */
  private static double smoothed(double at) {
    double sum = 0;
    double norm = 0;
    for (int k = -3000; k <= 3000; k++) {
      final double z = k / 1000.0;
      final double p = Math.exp(-0.5 * z * z);
      sum += p * BANK.meanAt(0, (float) (at + z * WIDTH));
      norm += p;
    }
    return sum / norm;
  }
}
