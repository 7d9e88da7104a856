package torqueloom.training.learning;

import java.util.ArrayList;
import java.util.List;
import org.deeplearning4j.nn.multilayer.MultiLayerNetwork;
import org.nd4j.linalg.api.buffer.DataType;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.dataset.DataSet;
import org.nd4j.linalg.factory.Nd4j;
import org.nd4j.linalg.learning.config.Adam;
import org.nd4j.linalg.schedule.ExponentialSchedule;
import org.nd4j.linalg.schedule.ScheduleType;
import torqueloom.model.random.Purpose;
import torqueloom.model.random.Streams;
import torqueloom.training.evaluation.Accuracy;
import torqueloom.training.evaluation.CountKernel;
import torqueloom.training.evaluation.ForwardPass;
import torqueloom.training.evaluation.PairLayer;
import torqueloom.training.evaluation.TrainedNetwork;
import torqueloom.training.layer.NetworkBuilder;

/**
 * Trains a device network with surrogate gradients through the deep-learning library's updater
 * (Adam: D. P. Kingma, J. Ba, arXiv:1412.6980). The step falls tenfold over the epochs; the weights
 * of the best epoch on the validation rows are kept, and training stops early when it waits too
 * long for a better one. One thread, fixed order: the same study gives the same bits.
 */
public final class SurrogateTrainer {
  private static final double FINAL_STEP = 0.1;

  /** Draws of the thermal noise over the validation rows, so that noise seldom picks the epoch. */
  private static final int VALIDATION_PASSES = 4;

  private final NetworkBuilder builder;
  private final TrainingSettings settings;

  /** Receives the course of a training. */
  @FunctionalInterface
  public interface EpochListener {
    /**
     * @param epoch number of the epoch that ended, from 0
     * @param record its record
     */
    void ended(int epoch, TrainingHistory.Epoch record);
  }

  /**
   * What a training gives.
   *
   * @param network the kept network as plain values
   * @param model the same as a network of the deep-learning library, ready to be saved
   * @param history course
   */
  public record Result(TrainedNetwork network, MultiLayerNetwork model, TrainingHistory history) {}

  /**
   * @param builder makes the network
   * @param settings how to train
   */
  public SurrogateTrainer(NetworkBuilder builder, TrainingSettings settings) {
    this.builder = builder;
    this.settings = settings;
  }

  /**
   * Trains a new network.
   *
   * @param train training rows
   * @param validation rows that choose the epoch
   * @param listener told after each epoch
   */
  public Result train(LabeledRows train, LabeledRows validation, EpochListener listener) {
    final List<PairLayer> start =
        StartWeights.of(
            builder.settings(),
            train.x(),
            builder.inputs(),
            builder.classes(),
            builder.bank(),
            builder.seed());
    final int most = settings.epochs(train.rows());
    final double decay = StrictMath.pow(FINAL_STEP, 1.0 / most);
    final MultiLayerNetwork model =
        builder.build(
            start,
            new Adam(new ExponentialSchedule(ScheduleType.EPOCH, settings.learningRate(), decay)));
    final List<TrainingHistory.Epoch> epochs = new ArrayList<>();
    INDArray best = model.params().dup();
    double bestAccuracy = -1;
    int bestEpoch = 0;
    for (int epoch = 0; epoch < most; epoch++) {
      if (Thread.currentThread().isInterrupted()) {
        throw new java.util.concurrent.CancellationException("training was interrupted");
      }
      final double loss = runEpoch(model, train, epoch);
      model.incrementEpochCount();
      final TrainingHistory.Epoch record = measure(model, train, validation, epoch, loss);
      epochs.add(record);
      listener.ended(epoch, record);
      // Of equal epochs the later one: its steps were smaller.
      if (record.validationAccuracy() >= bestAccuracy) {
        bestAccuracy = record.validationAccuracy();
        bestEpoch = epoch;
        best = model.params().dup();
      } else if (epoch - bestEpoch >= settings.patience()) {
        break;
      }
    }
    model.setParams(best);
    return new Result(
        NetworkBuilder.plain(model, builder.settings()),
        model,
        new TrainingHistory(List.copyOf(epochs), bestEpoch));
  }

  private double runEpoch(MultiLayerNetwork model, LabeledRows train, int epoch) {
    final int[] order =
        Streams.permutation(Streams.key(builder.seed(), Purpose.EPOCH_ORDER, epoch), train.rows());
    double loss = 0;
    for (int from = 0; from < order.length; from += settings.batch()) {
      final int size = Math.min(settings.batch(), order.length - from);
      model.fit(batch(train, order, from, size));
      loss += model.score() * size;
    }
    return loss / order.length;
  }

  private DataSet batch(LabeledRows rows, int[] order, int from, int size) {
    final int inputs = rows.inputs();
    final float[] x = new float[size * inputs];
    final INDArray y = Nd4j.zeros(DataType.FLOAT, size, builder.classes());
    for (int r = 0; r < size; r++) {
      final int row = order[from + r];
      System.arraycopy(rows.x(), row * inputs, x, r * inputs, inputs);
      y.putScalar(r, rows.labels()[row], 1f);
    }
    return new DataSet(Nd4j.create(x, new long[] {size, inputs}, 'c'), y);
  }

  private TrainingHistory.Epoch measure(
      MultiLayerNetwork model, LabeledRows train, LabeledRows validation, int epoch, double loss) {
    final TrainedNetwork network = NetworkBuilder.plain(model, builder.settings());
    final ForwardPass ideal = ForwardPass.ideal(builder.bank(), network, builder.clip());
    final CountKernel.Tally[] tallies = ideal.tallies();
    final long key = Streams.key(builder.seed(), Purpose.IDEAL_COUNTS, -1, epoch);
    final double trained =
        Accuracy.of(
            ideal.predict(train.x(), train.rows(), Streams.subKey(key, 0), tallies),
            train.labels());
    final float[] drive = ideal.firstDrive(validation.x(), validation.rows());
    double validated = 0;
    for (int pass = 1; pass <= VALIDATION_PASSES; pass++) {
      final int[] predicted =
          ideal.predictFrom(drive, validation.rows(), Streams.subKey(key, pass), tallies);
      validated += Accuracy.of(predicted, validation.labels()) / VALIDATION_PASSES;
    }
    return new TrainingHistory.Epoch(
        loss, trained, validated, CountKernel.Tally.clippedShare(tallies));
  }
}
