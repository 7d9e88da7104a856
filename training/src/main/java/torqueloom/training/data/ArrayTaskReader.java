package torqueloom.training.data;

import java.util.ArrayList;
import java.util.List;

/**
 * Joins a file of features and a file of labels, each IDX or NPY (told apart by their first bytes).
 * The first axis of the features counts the cases; the others are flattened, the last fastest. Class
 * names are the label numbers.
 */
final class ArrayTaskReader {
  private ArrayTaskReader() {}

  /**
   * @throws TaskDataException if a file is of neither kind, the numbers of cases differ, a feature
   *     is not finite, or a label is no whole number
   */
  static TaskTable read(DataFile featureFile, DataFile labelFile) {
    final NumberArray features = array(featureFile);
    final NumberArray labels = array(labelFile);
    if (labels.width() != 1) {
      throw new TaskDataException(
          labelFile.name() + ": has " + labels.width() + " numbers a case; labels need just one");
    }
    if (features.cases() != labels.cases()) {
      throw new TaskDataException(
          labelFile.name()
              + ": has "
              + labels.cases()
              + " labels where "
              + featureFile.name()
              + " has "
              + features.cases()
              + " cases; the numbers must agree");
    }
    final List<String> labelTexts = labelTexts(labelFile, labels);
    final ClassNames classes = ClassNames.of(labelTexts);
    return TaskTable.owning(
        floats(featureFile, features),
        classes.indices(labelTexts),
        featureNames(features.width()),
        classes.names());
  }

  private static NumberArray array(DataFile file) {
    if (NpyReader.accepts(file)) {
      return NpyReader.read(file);
    }
    if (IdxReader.accepts(file)) {
      return IdxReader.read(file);
    }
    throw new TaskDataException(
        file.name() + ": is neither an NPY nor an IDX file (plain or gzipped)");
  }

  private static List<String> labelTexts(DataFile file, NumberArray labels) {
    final List<String> texts = new ArrayList<>(labels.cases());
    for (int i = 0; i < labels.cases(); i++) {
      final double value = labels.values()[i];
      if (value != Math.rint(value) || Math.abs(value) > 1e9) {
        throw new TaskDataException(
            TaskDataException.fault(
                file.name(),
                "label of case " + i,
                Double.toString(value),
                "a whole number is needed"));
      }
      texts.add(Long.toString((long) value));
    }
    return texts;
  }

  private static float[] floats(DataFile file, NumberArray features) {
    final double[] values = features.values();
    final float[] result = new float[values.length];
    for (int i = 0; i < result.length; i++) {
      result[i] = (float) values[i];
      if (!Float.isFinite(result[i])) {
        throw new TaskDataException(
            TaskDataException.fault(
                file.name(),
                "feature " + i % features.width() + " of case " + i / features.width(),
                Double.toString(values[i]),
                "a finite number up to 3.4e38 is needed"));
      }
    }
    return result;
  }

  private static List<String> featureNames(int width) {
    final List<String> names = new ArrayList<>(width);
    for (int i = 0; i < width; i++) {
      names.add("x" + i);
    }
    return names;
  }
}
