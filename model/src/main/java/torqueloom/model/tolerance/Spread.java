package torqueloom.model.tolerance;

/**
 * One tolerance: standard deviations of a parameter.
 *
 * @param chip part shared by all devices of a chip, relative to the nominal value (1), &gt;= 0
 * @param device part of each device, relative to the nominal value (1), &gt;= 0
 */
public record Spread(double chip, double device) {
  /** @throws IllegalArgumentException if a part is negative, NaN or above 1 */
  public Spread {
    if (!(chip >= 0 && chip <= 1 && device >= 0 && device <= 1)) {
      throw new IllegalArgumentException(
          "a spread must lie in [0, 1], got chip " + chip + ", device " + device);
    }
  }
}
