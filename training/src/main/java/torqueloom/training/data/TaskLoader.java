package torqueloom.training.data;

import java.util.ArrayList;
import java.util.List;

/** Reads a task's files and splits their rows. */
public final class TaskLoader {
  /** More classes than this are taken for a mistaken label column. */
  private static final int MOST_CLASSES = 1000;

  private TaskLoader() {}

  /**
   * Reads and splits.
   *
   * @param settings files and shares
   * @param seed study seed; the split depends on nothing else
   * @return the parts, with the digests of the files
   * @throws TaskDataException with a message for the user if a file cannot serve
   */
  public static TaskSplit load(TaskSettings settings, long seed) {
    return settings.train().isEmpty() ? loadWhole(settings, seed) : loadFixed(settings, seed);
  }

  private static TaskSplit loadWhole(TaskSettings settings, long seed) {
    final List<DataDigest> digests = new ArrayList<>();
    final TaskTable table;
    final String name;
    if (settings.data().isPresent()) {
      final DataFile file = DataFile.read(settings.data().orElseThrow());
      name = file.name();
      table = CsvTaskReader.read(file, settings.label());
      digests.add(file.digest("data", table.rows()));
    } else {
      final DataFile features = DataFile.read(settings.features().orElseThrow());
      final DataFile labels = DataFile.read(settings.labels().orElseThrow());
      name = labels.name();
      table = ArrayTaskReader.read(features, labels);
      digests.add(features.digest("features", table.rows()));
      digests.add(labels.digest("labels", table.rows()));
    }
    requireClasses(name, table);
    final double[] shares = {
      settings.trainShare(), settings.validationShare(), settings.testShare()
    };
    final int[][] rows = split(name, table, shares, seed, "training", "validation", "test");
    return new TaskSplit(
        table.select(rows[0]), table.select(rows[1]), table.select(rows[2]), digests);
  }

  private static TaskSplit loadFixed(TaskSettings settings, long seed) {
    final DataFile trainFile = DataFile.read(settings.train().orElseThrow());
    final DataFile testFile = DataFile.read(settings.test().orElseThrow());
    final TaskTable train = CsvTaskReader.read(trainFile, settings.label());
    final TaskTable test = matched(testFile, CsvTaskReader.read(testFile, settings.label()), train);
    requireClasses(trainFile.name(), train);
    final double[] shares = {1 - settings.validationShare(), settings.validationShare()};
    final int[][] rows = split(trainFile.name(), train, shares, seed, "training", "validation");
    return new TaskSplit(
        train.select(rows[0]),
        train.select(rows[1]),
        test,
        List.of(trainFile.digest("train", train.rows()), testFile.digest("test", test.rows())));
  }

  private static int[][] split(
      String file, TaskTable table, double[] shares, long seed, String... names) {
    try {
      return StratifiedSplit.rows(table, shares, names, seed);
    } catch (TaskDataException e) {
      throw new TaskDataException(e.faults().stream().map(fault -> file + ": " + fault).toList());
    }
  }

  private static void requireClasses(String file, TaskTable table) {
    if (table.classCount() < 2) {
      throw new TaskDataException(
          file
              + ": found one class only, \""
              + table.classNames().get(0)
              + "\"; at least two classes are needed");
    }
    if (table.classCount() > MOST_CLASSES) {
      throw new TaskDataException(
          file
              + ": found "
              + table.classCount()
              + " different labels; at most "
              + MOST_CLASSES
              + " classes are allowed. Is the label column the right one?");
    }
  }

  /** The test rows with the class numbers of the training rows. */
  private static TaskTable matched(DataFile file, TaskTable test, TaskTable train) {
    if (!test.featureNames().equals(train.featureNames())) {
      throw new TaskDataException(
          file.name() + ": " + firstDifference(test.featureNames(), train.featureNames()));
    }
    final int[] indexInTrain = new int[test.classCount()];
    for (int c = 0; c < indexInTrain.length; c++) {
      indexInTrain[c] = train.classNames().indexOf(test.classNames().get(c));
      if (indexInTrain[c] < 0) {
        throw new TaskDataException(
            file.name()
                + ": found class \""
                + test.classNames().get(c)
                + "\", which has no training row; the classes are "
                + String.join(", ", train.classNames()));
      }
    }
    final int[] labels = test.labels();
    for (int row = 0; row < labels.length; row++) {
      labels[row] = indexInTrain[labels[row]];
    }
    return TaskTable.owning(test.features(), labels, train.featureNames(), train.classNames());
  }

  private static String firstDifference(List<String> found, List<String> needed) {
    final int common = Math.min(found.size(), needed.size());
    for (int i = 0; i < common; i++) {
      if (!found.get(i).equals(needed.get(i))) {
        return "found feature column \""
            + found.get(i)
            + "\" where the training file has \""
            + needed.get(i)
            + "\"; both files need the same columns in the same order";
      }
    }
    return "found "
        + found.size()
        + " feature columns where the training file has "
        + needed.size()
        + "; both files need the same columns";
  }
}
