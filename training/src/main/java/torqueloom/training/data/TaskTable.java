package torqueloom.training.data;

import java.util.List;
import java.util.Objects;

/**
 * Labeled rows of a classification task. Features are dimensionless numbers as they stand in the
 * data, stored flat and row by row: feature f of row r is at {@code r * featureCount() + f}. Labels
 * are indices into the class names. Immutable.
 */
public final class TaskTable {
  private final float[] features;
  private final int[] labels;
  private final List<String> featureNames;
  private final List<String> classNames;

  private TaskTable(
      float[] features, int[] labels, List<String> featureNames, List<String> classNames) {
    this.features = features;
    this.labels = labels;
    this.featureNames = featureNames;
    this.classNames = classNames;
  }

  /**
   * A table of copies of the given arrays.
   *
   * @param features finite numbers, [rows][features] flat
   * @param labels class of each row, from 0
   * @param featureNames one name a feature, at least one
   * @param classNames one name a class
   * @throws IllegalArgumentException if the lengths do not fit, a feature is not finite, or a label
   *     names no class
   */
  public static TaskTable of(
      float[] features, int[] labels, List<String> featureNames, List<String> classNames) {
    return owning(features.clone(), labels.clone(), featureNames, classNames);
  }

  /** As {@link #of}, but keeps the arrays; for readers that hand over what they just built. */
  static TaskTable owning(
      float[] features, int[] labels, List<String> featureNames, List<String> classNames) {
    final int width = featureNames.size();
    if (width == 0 || (long) labels.length * width != features.length) {
      throw new IllegalArgumentException(
          features.length + " features are not " + labels.length + " rows of " + width);
    }
    for (final float feature : features) {
      if (!Float.isFinite(feature)) {
        throw new IllegalArgumentException("features must be finite, got " + feature);
      }
    }
    for (final int label : labels) {
      Objects.checkIndex(label, Math.max(classNames.size(), 0));
    }
    return new TaskTable(features, labels, List.copyOf(featureNames), List.copyOf(classNames));
  }

  /** Number of rows. */
  public int rows() {
    return labels.length;
  }

  /** Number of features of a row. */
  public int featureCount() {
    return featureNames.size();
  }

  /** Number of classes, those without a row in this table included. */
  public int classCount() {
    return classNames.size();
  }

  /** Names of the features, in column order. */
  public List<String> featureNames() {
    return featureNames;
  }

  /** Names of the classes: sorted as text, or by value where all are numbers. */
  public List<String> classNames() {
    return classNames;
  }

  /** One feature of one row. */
  public float feature(int row, int feature) {
    return features[row * featureNames.size() + Objects.checkIndex(feature, featureNames.size())];
  }

  /** Class of one row. */
  public int label(int row) {
    return labels[row];
  }

  /** A copy of all features, [rows][features] flat. */
  public float[] features() {
    return features.clone();
  }

  /** A copy of all labels. */
  public int[] labels() {
    return labels.clone();
  }

  /** Number of rows of each class. */
  public int[] classCounts() {
    final int[] counts = new int[classNames.size()];
    for (final int label : labels) {
      counts[label]++;
    }
    return counts;
  }

  /**
   * The chosen rows, in the given order.
   *
   * @throws IndexOutOfBoundsException if a row does not exist
   */
  public TaskTable select(int[] rows) {
    final int width = featureNames.size();
    final float[] chosen = new float[rows.length * width];
    final int[] chosenLabels = new int[rows.length];
    for (int i = 0; i < rows.length; i++) {
      final int row = Objects.checkIndex(rows[i], labels.length);
      System.arraycopy(features, row * width, chosen, i * width, width);
      chosenLabels[i] = labels[row];
    }
    return new TaskTable(chosen, chosenLabels, featureNames, classNames);
  }
}
