package torqueloom.training.learning;

/**
 * How the network is trained.
 *
 * @param epochs most passes over the training rows, &gt;= 1, or 0 for automatic
 * @param batch rows per step, &gt;= 1
 * @param learningRate step of the updater (1), &gt; 0
 * @param variationAware whether each step draws new device instances and write errors
 * @param surrogateWidth width (drive over unit drive) by which the response's derivative is
 *     widened, NaN for automatic
 * @param patience epochs without a better validation accuracy before training stops, &gt;= 1
 */
public record TrainingSettings(
    int epochs,
    int batch,
    double learningRate,
    boolean variationAware,
    double surrogateWidth,
    int patience) {
  private static final int AUTOMATIC_STEPS = 4000;
  private static final int FEWEST_EPOCHS = 60;
  private static final int MOST_EPOCHS = 400;

  /**
   * @throws IllegalArgumentException naming the first value out of range
   */
  public TrainingSettings {
    if (epochs < 0 || batch < 1 || patience < 1) {
      throw new IllegalArgumentException(
          "epochs must not be negative, batch and patience at least 1, got "
              + epochs
              + ", "
              + batch
              + ", "
              + patience);
    }
    if (!(learningRate > 0)) {
      throw new IllegalArgumentException("learningRate must be positive, got " + learningRate);
    }
  }

  /** Most passes over a number of training rows: small sets take more, to make enough steps. */
  public int epochs(int rows) {
    if (epochs > 0) {
      return epochs;
    }
    final int steps = Math.max(1, (rows + batch - 1) / batch);
    return Math.max(FEWEST_EPOCHS, Math.min(MOST_EPOCHS, AUTOMATIC_STEPS / steps));
  }
}
