package torqueloom.training.learning;

/**
 * Objective of {@link LogisticRegression} with its gradient. Parameters are [classes][features + 1]
 * flat, the intercept last.
 */
final class LogisticLoss implements LimitedMemoryBfgs.Objective {
  private final double[] rows;
  private final int[] labels;
  private final int features;
  private final int classes;
  private final double strength;

  LogisticLoss(double[] rows, int[] labels, int features, int classes, double strength) {
    this.rows = rows;
    this.labels = labels;
    this.features = features;
    this.classes = classes;
    this.strength = strength;
  }

  int parameters() {
    return classes * (features + 1);
  }

  @Override
  public double valueAndGradient(double[] parameters, double[] gradient) {
    double value = penalty(parameters, gradient);
    final double[] scores = new double[classes];
    for (int row = 0; row < labels.length; row++) {
      scores(rows, row, features, parameters, scores);
      final double labelScore = scores[labels[row]];
      value += toProbabilities(scores) - labelScore;
      scores[labels[row]] -= 1;
      addOuter(row, scores, gradient);
    }
    return value;
  }

  /** Sets the gradient to that of the penalty and returns the penalty. */
  private double penalty(double[] parameters, double[] gradient) {
    double sum = 0;
    for (int i = 0; i < parameters.length; i++) {
      final boolean intercept = i % (features + 1) == features;
      gradient[i] = intercept ? 0 : parameters[i] / strength;
      sum += intercept ? 0 : parameters[i] * parameters[i];
    }
    return sum / (2 * strength);
  }

  static void scores(double[] rows, int row, int features, double[] parameters, double[] scores) {
    for (int k = 0; k < scores.length; k++) {
      final int weights = k * (features + 1);
      double sum = parameters[weights + features];
      for (int f = 0; f < features; f++) {
        sum += parameters[weights + f] * rows[row * features + f];
      }
      scores[k] = sum;
    }
  }

  /** Replaces scores by probabilities and returns ln sum exp(score). */
  private static double toProbabilities(double[] scores) {
    double greatest = scores[0];
    for (final double score : scores) {
      greatest = Math.max(greatest, score);
    }
    double sum = 0;
    for (int k = 0; k < scores.length; k++) {
      scores[k] = StrictMath.exp(scores[k] - greatest);
      sum += scores[k];
    }
    for (int k = 0; k < scores.length; k++) {
      scores[k] /= sum;
    }
    return greatest + StrictMath.log(sum);
  }

  private void addOuter(int row, double[] errors, double[] gradient) {
    for (int k = 0; k < classes; k++) {
      final int weights = k * (features + 1);
      for (int f = 0; f < features; f++) {
        gradient[weights + f] += errors[k] * rows[row * features + f];
      }
      gradient[weights + features] += errors[k];
    }
  }
}
