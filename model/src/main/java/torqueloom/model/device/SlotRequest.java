package torqueloom.model.device;

/**
 * One batch of independent slots to simulate at one drive.
 *
 * @param drive amplitude of the pulse (in the kind's drive unit), without the protocol's bias
 * @param previousDrive amplitude of the pulse one slot earlier, or NaN after a quiet slot
 * @param restLevel index of the rest level at the start, 0 for the first
 * @param firstTrial number of the first trial; trial k of a stream is the same whatever the batch
 * @param trials number of slots, &gt; 0
 * @param streamKey key of the random stream, see {@link torqueloom.model.random.Streams}
 */
public record SlotRequest(
    double drive, double previousDrive, int restLevel, int firstTrial, int trials, long streamKey) {

  /** @throws IllegalArgumentException if trials is not positive or an index is negative */
  public SlotRequest {
    if (trials <= 0 || firstTrial < 0 || restLevel < 0) {
      throw new IllegalArgumentException(
          "trials must be positive and indices not negative, got trials "
              + trials
              + ", firstTrial "
              + firstTrial
              + ", restLevel "
              + restLevel);
    }
  }
}
