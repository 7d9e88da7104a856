package torqueloom.training.evaluation;

/** What the electronics does with the counts of the last layer: it averages them over the slots. */
public final class ReadoutKernel {
  private ReadoutKernel() {}

  /**
   * Counts summed over the slots.
   *
   * @param counts [slots][n] flattened
   * @param slots number of slots
   * @param n values a slot
   * @return sums, [n]
   */
  public static float[] summedCounts(float[] counts, int slots, int n) {
    final float[] sum = new float[n];
    for (int s = 0; s < slots; s++) {
      for (int i = 0; i < n; i++) {
        sum[i] += counts[s * n + i];
      }
    }
    return sum;
  }

  /**
   * Scores per mean count and full-scale weight. It grows as the number of senders falls, so that
   * scores of a few nat need a good part of the weights' range whatever the width: a weight that
   * uses its whole range suffers the least from a given write error.
   */
  public static float gain(int senders) {
    return (float) (4 / Math.sqrt(senders));
  }

  /** Scores per mean count of a device output. */
  public static float deviceGain() {
    return 4f;
  }
}
