package torqueloom.training.learning;

import java.util.List;

/**
 * Course of a training.
 *
 * @param epochs one entry an epoch
 * @param bestEpoch index of the epoch whose weights were kept
 */
public record TrainingHistory(List<Epoch> epochs, int bestEpoch) {
  /**
   * One epoch.
   *
   * @param loss mean cross-entropy over the epoch's batches (nat)
   * @param trainAccuracy accuracy of the nominal network on the training rows after the epoch (1)
   * @param validationAccuracy accuracy on the validation rows after the epoch (1)
   * @param clippedShare share of pulses clipped at the maximum drive (1)
   */
  public record Epoch(
      double loss, double trainAccuracy, double validationAccuracy, double clippedShare) {}
}
