package torqueloom.training.study;

import java.util.List;
import torqueloom.training.data.TaskSplit;
import torqueloom.training.data.TaskTable;
import torqueloom.training.encoding.AmplitudeEncoder;
import torqueloom.training.evaluation.NetworkSettings;
import torqueloom.training.learning.LabeledRows;

/**
 * The task's rows as the network sees them: levels of the encoder times the counts per slot that a
 * full level stands for.
 *
 * @param split raw rows
 * @param encoder fitted on the training rows
 * @param train encoded training rows
 * @param validation encoded validation rows
 * @param test encoded test rows
 */
public record EncodedTask(
    TaskSplit split,
    AmplitudeEncoder encoder,
    LabeledRows train,
    LabeledRows validation,
    LabeledRows test) {

  /** Fits the encoder and encodes all rows. */
  public static EncodedTask of(TaskSplit split, NetworkSettings settings) {
    final AmplitudeEncoder encoder = AmplitudeEncoder.fit(split.train(), settings.inputLevels());
    return new EncodedTask(
        split,
        encoder,
        rows(split.train(), encoder, settings),
        rows(split.validation(), encoder, settings),
        rows(split.test(), encoder, settings));
  }

  /** Class names. */
  public List<String> classes() {
    return split.train().classNames();
  }

  private static LabeledRows rows(
      TaskTable table, AmplitudeEncoder encoder, NetworkSettings settings) {
    final float[] x = encoder.encode(table, settings.slots());
    final float scale = (float) settings.inputFullScale();
    for (int i = 0; i < x.length; i++) {
      x[i] *= scale;
    }
    return new LabeledRows(x, table.labels(), encoder.inputs());
  }
}
