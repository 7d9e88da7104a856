package torqueloom.training.learning;

import torqueloom.training.data.TaskTable;

/**
 * Multinomial logistic regression with an L2 penalty. With scores s_k = w_k . x + b_k the fit
 * minimizes
 *
 * <pre>  sum over rows of [ln sum_k exp(s_k) - s_label]  +  sum_k |w_k|^2 / (2 C),</pre>
 *
 * where C &gt; 0 is the strength: the larger, the weaker the penalty; intercepts are not penalized.
 * Features are standardized by mean and standard deviation of the fitted rows first; a feature that
 * does not vary is only centered. The objective is convex and is minimized to convergence by {@link
 * LimitedMemoryBfgs}, in double precision and one fixed order, so the result is the same on every
 * machine. Immutable.
 */
public final class LogisticRegression {
  /** Largest derivative per row at which a fit counts as converged. */
  private static final double TOLERANCE = 1e-8;

  private static final int MOST_ITERATIONS = 3000;

  private final double[] mean;
  private final double[] deviation;
  private final double[] parameters;
  private final int classes;
  private final double objective;
  private final boolean converged;

  private LogisticRegression(
      double[] mean, double[] deviation, int classes, LimitedMemoryBfgs.Minimum minimum) {
    this.mean = mean;
    this.deviation = deviation;
    this.classes = classes;
    this.parameters = minimum.point();
    this.objective = minimum.value();
    this.converged = minimum.converged();
  }

  /**
   * Fits to the rows of a table.
   *
   * @param table at least one row
   * @param strength C (1), &gt; 0
   * @throws IllegalArgumentException if there is no row or strength is not positive and finite
   */
  public static LogisticRegression fit(TaskTable table, double strength) {
    if (table.rows() == 0 || !(strength > 0 && strength < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(
          "need a row and a positive finite strength, got " + table.rows() + ", " + strength);
    }
    final double[] mean = mean(table);
    final double[] deviation = deviation(table, mean);
    final double[] rows = standardized(table, mean, deviation);
    final LogisticLoss loss =
        new LogisticLoss(rows, table.labels(), mean.length, table.classCount(), strength);
    final LimitedMemoryBfgs.Minimum minimum =
        LimitedMemoryBfgs.minimize(
            loss, new double[loss.parameters()], TOLERANCE * table.rows(), MOST_ITERATIONS);
    return new LogisticRegression(mean, deviation, table.classCount(), minimum);
  }

  private static double[] mean(TaskTable table) {
    final double[] mean = new double[table.featureCount()];
    for (int row = 0; row < table.rows(); row++) {
      for (int f = 0; f < mean.length; f++) {
        mean[f] += table.feature(row, f) / table.rows();
      }
    }
    return mean;
  }

  private static double[] deviation(TaskTable table, double[] mean) {
    final double[] deviation = new double[mean.length];
    for (int row = 0; row < table.rows(); row++) {
      for (int f = 0; f < mean.length; f++) {
        final double distance = table.feature(row, f) - mean[f];
        deviation[f] += distance * distance / table.rows();
      }
    }
    for (int f = 0; f < mean.length; f++) {
      // What rounding leaves of a constant feature is no spread.
      final double least = 1e-12 * Math.abs(mean[f]);
      deviation[f] = Math.sqrt(deviation[f]) > least ? Math.sqrt(deviation[f]) : 1;
    }
    return deviation;
  }

  private static double[] standardized(TaskTable table, double[] mean, double[] deviation) {
    final int width = mean.length;
    final double[] rows = new double[table.rows() * width];
    for (int row = 0; row < table.rows(); row++) {
      for (int f = 0; f < width; f++) {
        rows[row * width + f] = (table.feature(row, f) - mean[f]) / deviation[f];
      }
    }
    return rows;
  }

  /**
   * The most probable class of each row; the first of several equal ones.
   *
   * @param table rows with the fitted features
   * @throws IllegalArgumentException if the number of features differs
   */
  public int[] predict(TaskTable table) {
    if (table.featureCount() != mean.length) {
      throw new IllegalArgumentException(
          "fitted to " + mean.length + " features, got " + table.featureCount());
    }
    final double[] rows = standardized(table, mean, deviation);
    final int[] predicted = new int[table.rows()];
    final double[] scores = new double[classes];
    for (int row = 0; row < predicted.length; row++) {
      LogisticLoss.scores(rows, row, mean.length, parameters, scores);
      for (int k = 1; k < classes; k++) {
        predicted[row] = scores[k] > scores[predicted[row]] ? k : predicted[row];
      }
    }
    return predicted;
  }

  /**
   * Share of rows whose class is predicted right (1).
   *
   * @throws IllegalArgumentException if there is no row or the number of features differs
   */
  public double accuracy(TaskTable table) {
    if (table.rows() == 0) {
      throw new IllegalArgumentException("the accuracy of no row is undefined");
    }
    final int[] predicted = predict(table);
    int right = 0;
    for (int row = 0; row < predicted.length; row++) {
      right += predicted[row] == table.label(row) ? 1 : 0;
    }
    return (double) right / predicted.length;
  }

  /** Value of the minimized objective, the penalty included. */
  public double objective() {
    return objective;
  }

  /** Whether the largest derivative fell below 1e-8 per row. */
  public boolean converged() {
    return converged;
  }
}
