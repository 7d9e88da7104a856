package torqueloom.training.data;

import java.util.List;

/**
 * The three parts of a task. All share feature names and class names, in the same order.
 *
 * @param train rows the network and every scaling are fitted to
 * @param validation rows that choose the epoch and settings
 * @param test rows the reported accuracies are taken on, used for nothing else
 * @param digests the files the rows came from
 */
public record TaskSplit(
    TaskTable train, TaskTable validation, TaskTable test, List<DataDigest> digests) {

  /**
   * @throws IllegalArgumentException if the parts differ in features or classes
   */
  public TaskSplit {
    digests = List.copyOf(digests);
    for (final TaskTable part : List.of(validation, test)) {
      if (!part.featureNames().equals(train.featureNames())
          || !part.classNames().equals(train.classNames())) {
        throw new IllegalArgumentException("the parts of a split must share features and classes");
      }
    }
  }
}
