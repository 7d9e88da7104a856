package torqueloom.model.response;

/**
 * How finely responses are calibrated.
 *
 * @param instances number of device instances, the nominal one included, &gt;= 1
 * @param drives number of drives from 0 to the largest, &gt;= 2
 * @param halfWidth wanted half-width of the 95 % interval of each P(n) (1), in (0, 0.5)
 * @param maximumTrials most trials at one drive, &gt;= 1
 */
public record CalibrationSettings(int instances, int drives, double halfWidth, int maximumTrials) {
  /** @throws IllegalArgumentException naming the first value out of range */
  public CalibrationSettings {
    if (instances < 1 || drives < 2 || maximumTrials < 1) {
      throw new IllegalArgumentException(
          "instances and maximumTrials must be at least 1 and drives at least 2, got "
              + instances
              + ", "
              + maximumTrials
              + ", "
              + drives);
    }
    if (!(halfWidth > 0 && halfWidth < 0.5)) {
      throw new IllegalArgumentException("halfWidth must lie in (0, 0.5), got " + halfWidth);
    }
  }
}
