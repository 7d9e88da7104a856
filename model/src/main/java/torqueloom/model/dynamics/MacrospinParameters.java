package torqueloom.model.dynamics;

/**
 * One macrospin: everything in its equation of motion but the drive. Fields are in tesla. The energy
 * per moment is (Y/2) m_y² + (D/2) m_z² - b . m: only differences of the three axis fields count.
 *
 * @param damping alpha (1), in (0, 1] (0 is allowed for undamped reference runs)
 * @param excessY Y = B_y - B_x (T)
 * @param excessZ D = B_z - B_x (T)
 * @param fieldX applied field along x (T)
 * @param fieldY applied field along y (T)
 * @param fieldZ applied field along z (T)
 * @param thermalField k_B T/(M_s V) (T), &gt;= 0
 */
public record MacrospinParameters(
    double damping,
    double excessY,
    double excessZ,
    double fieldX,
    double fieldY,
    double fieldZ,
    double thermalField) {

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public MacrospinParameters {
    if (!(damping >= 0 && damping <= 1)) {
      throw new IllegalArgumentException("damping must lie in [0, 1], got " + damping);
    }
    if (!Double.isFinite(excessY + excessZ + fieldX + fieldY + fieldZ)) {
      throw new IllegalArgumentException("fields must be finite");
    }
    if (!(thermalField >= 0 && Double.isFinite(thermalField))) {
      throw new IllegalArgumentException(
          "thermalField must be zero or positive, got " + thermalField + " T");
    }
  }

  /** Energy per moment (T) of a direction. */
  public double energy(double mx, double my, double mz) {
    return 0.5 * (excessY * my * my + excessZ * mz * mz)
        - (fieldX * mx + fieldY * my + fieldZ * mz);
  }

  /** A bound of the effective field that turns the moment (T). */
  double largestField() {
    final double axes =
        Math.max(Math.max(Math.abs(excessY), Math.abs(excessZ)), Math.abs(excessY - excessZ));
    return axes + Math.abs(fieldX) + Math.abs(fieldY) + Math.abs(fieldZ);
  }
}
