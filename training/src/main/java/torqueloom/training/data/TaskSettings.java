package torqueloom.training.data;

import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Path;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Where a task's rows stand and how they are split. Exactly one of three forms: one CSV file
 * ({@code data}), one file of features and one of labels (IDX or NPY), or fixed training and test
 * CSV files ({@code train}, {@code test}), where validation rows are taken from the training file.
 *
 * @param data CSV file
 * @param features IDX or NPY file
 * @param labels IDX or NPY file
 * @param train CSV file
 * @param test CSV file
 * @param label name of the label column; null means {@value #DEFAULT_LABEL}
 * @param trainShare share of each class's rows for training (1), in (0, 1); unused with fixed files
 * @param validationShare share for validation (1), in (0, 1); with fixed files the share of the
 *     training file
 * @param testShare share for test (1), in (0, 1); unused with fixed files
 */
public record TaskSettings(
    Optional<Path> data,
    Optional<Path> features,
    Optional<Path> labels,
    Optional<Path> train,
    Optional<Path> test,
    String label,
    double trainShare,
    double validationShare,
    double testShare) {

  /** Label column where the study names none. */
  public static final String DEFAULT_LABEL = "label";

  /** Share of a fixed training file that validates where the study names none (1). */
  public static final double DEFAULT_VALIDATION_SHARE = 0.2;

  private static final Optional<Path> NONE = Optional.empty();

  /**
   * @throws IllegalArgumentException if not exactly one form is given, or a share is out of range,
   *     or the three shares do not add up to 1
   */
  public TaskSettings {
    label = label == null ? DEFAULT_LABEL : label;
    requirePair("features", features.isPresent(), "labels", labels.isPresent());
    requirePair("train", train.isPresent(), "test", test.isPresent());
    final long forms = Stream.of(data, features, train).filter(Optional::isPresent).count();
    if (forms != 1) {
      throw new IllegalArgumentException(
          "task: found "
              + forms
              + " of data, features with labels, train with test; one is needed");
    }
    requireShare("validation", validationShare);
    if (train.isEmpty()) {
      requireShare("train", trainShare);
      requireShare("test", testShare);
      final double sum = trainShare + validationShare + testShare;
      if (Math.abs(sum - 1) > 1e-9) {
        throw new IllegalArgumentException(
            "task.split: the shares add up to " + percent(sum) + "; they must add up to 100 %");
      }
    }
  }

  /** One CSV file, split by shares. */
  public static TaskSettings csv(
      Path data, String label, double trainShare, double validationShare, double testShare) {
    return new TaskSettings(
        Optional.of(data), NONE, NONE, NONE, NONE, label, trainShare, validationShare, testShare);
  }

  /** Files of features and labels, split by shares. */
  public static TaskSettings arrays(
      Path features, Path labels, double trainShare, double validationShare, double testShare) {
    return new TaskSettings(
        NONE,
        Optional.of(features),
        Optional.of(labels),
        NONE,
        NONE,
        null,
        trainShare,
        validationShare,
        testShare);
  }

  /** Fixed training and test files; a fifth of the training rows validates. */
  public static TaskSettings fixed(Path train, Path test, String label) {
    return new TaskSettings(
        NONE,
        NONE,
        NONE,
        Optional.of(train),
        Optional.of(test),
        label,
        1 - DEFAULT_VALIDATION_SHARE,
        DEFAULT_VALIDATION_SHARE,
        0);
  }

  private static void requirePair(String one, boolean first, String other, boolean second) {
    if (first != second) {
      throw new IllegalArgumentException(
          "task: found "
              + (first ? one : other)
              + " without "
              + (first ? other : one)
              + "; both are needed");
    }
  }

  private static void requireShare(String name, double share) {
    if (!(share > 0 && share < 1)) {
      throw new IllegalArgumentException(
          "task.split." + name + ": found " + percent(share) + "; between 0 % and 100 % is needed");
    }
  }

  private static String percent(double share) {
    return Double.isFinite(share)
        ? new BigDecimal(share * 100).round(new MathContext(6)).stripTrailingZeros().toPlainString()
            + " %"
        : Double.toString(share);
  }
}
