package torqueloom.training.learning;

/**
 * Encoded rows with labels.
 *
 * @param x counts per slot, [rows][inputs] flattened
 * @param labels class of each row, [rows]
 * @param inputs number of inputs
 */
public record LabeledRows(float[] x, int[] labels, int inputs) {
  /** @throws IllegalArgumentException if the lengths do not fit */
  public LabeledRows {
    if (x.length != labels.length * inputs) {
      throw new IllegalArgumentException(
          "features of " + x.length + " values do not fit " + labels.length + " rows");
    }
  }

  /** Number of rows. */
  public int rows() {
    return labels.length;
  }
}
