package torqueloom.training.evaluation;

/** Shares of rows classified rightly. */
public final class Accuracy {
  private Accuracy() {}

  /**
   * @param predicted [rows]
   * @param labels [rows]
   * @return share of equal entries (1); NaN for no rows
   */
  public static double of(int[] predicted, int[] labels) {
    int right = 0;
    for (int i = 0; i < labels.length; i++) {
      if (predicted[i] == labels[i]) {
        right++;
      }
    }
    return labels.length == 0 ? Double.NaN : (double) right / labels.length;
  }
}
