package torqueloom.training.learning;

import torqueloom.training.data.TaskSplit;

/**
 * The plain classifier that a device network must beat to be worth building: multinomial logistic
 * regression on the same split, fitted to the training rows alone, its strength chosen by accuracy
 * on the validation rows. The network sees the same rows for the same purposes.
 *
 * @param strength chosen C of {@link LogisticRegression} (1)
 * @param validationAccuracy accuracy on the validation rows (1)
 * @param testAccuracy accuracy on the test rows (1)
 * @param converged whether every fit converged
 */
public record LogisticBaseline(
    double strength, double validationAccuracy, double testAccuracy, boolean converged) {

  private static final double[] STRENGTHS = {0.01, 0.1, 1, 10};

  /**
   * Fits with each strength of 0.01, 0.1, 1 and 10 and keeps the one of highest validation
   * accuracy, of equal ones the smallest (the strongest penalty).
   *
   * @param split parts of at least one row each
   */
  public static LogisticBaseline of(TaskSplit split) {
    LogisticBaseline best = new LogisticBaseline(Double.NaN, -1, Double.NaN, true);
    boolean converged = true;
    for (final double strength : STRENGTHS) {
      final LogisticRegression model = LogisticRegression.fit(split.train(), strength);
      converged &= model.converged();
      final double accuracy = model.accuracy(split.validation());
      if (accuracy > best.validationAccuracy) {
        best = new LogisticBaseline(strength, accuracy, model.accuracy(split.test()), converged);
      }
    }
    return new LogisticBaseline(
        best.strength, best.validationAccuracy, best.testAccuracy, converged);
  }
}
