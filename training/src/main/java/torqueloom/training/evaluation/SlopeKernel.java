package torqueloom.training.evaluation;

/** Backward kernel of a device layer on plain arrays. */
public final class SlopeKernel {
  private SlopeKernel() {}

  /**
   * Gradient of the loss with respect to the drive before the clip.
   *
   * @param surrogate widened slopes
   * @param neurons the neurons of the forward pass
   * @param drive drive before the clip, [rows][neurons] flattened; rows = batch, or slots * batch
   * @param error gradient with respect to the counts, [slots][batch][neurons] flattened
   * @param slots number of slots
   * @param batch number of samples
   * @param constant whether one drive holds for all slots (rows = batch)
   * @return gradient, same shape as drive
   */
  public static float[] driveGradient(
      SurrogateTable surrogate,
      NeuronLayer neurons,
      float[] drive,
      float[] error,
      int slots,
      int batch,
      boolean constant) {
    final int n = neurons.instance().length;
    final float[] gradient = new float[drive.length];
    for (int i = 0; i < drive.length; i++) {
      final int j = i % n;
      final float factor = neurons.driveFactor()[j];
      float sum = error[i];
      if (constant) {
        for (int s = 1; s < slots; s++) {
          sum += error[s * batch * n + i];
        }
      }
      gradient[i] = sum * factor * surrogate.at(neurons.instance()[j], drive[i] * factor);
    }
    return gradient;
  }
}
