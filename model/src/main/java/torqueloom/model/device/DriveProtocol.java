package torqueloom.model.device;

/**
 * How a neuron is driven in one slot. All values are SI.
 *
 * @param bias continuous current density in the strip (A/m²), finite
 * @param bipolar whether negative drives are calibrated too; false for a unipolar input stage
 * @param maximumDrive largest current density of a pulse (A/m²), &gt; 0; larger sums are clipped
 * @param pulse pulse length (s), &gt; 0
 * @param slot slot length (s), at least the pulse
 */
public record DriveProtocol(
    double bias, boolean bipolar, double maximumDrive, double pulse, double slot) {

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public DriveProtocol {
    if (!Double.isFinite(bias)) {
      throw new IllegalArgumentException("bias must be finite, got " + bias + " A/m²");
    }
    if (!(maximumDrive > 0 && Double.isFinite(maximumDrive))) {
      throw new IllegalArgumentException(
          "maximumDrive must be positive, got " + maximumDrive + " A/m²");
    }
    if (!(pulse > 0 && Double.isFinite(pulse))) {
      throw new IllegalArgumentException("pulse must be positive, got " + pulse + " s");
    }
    if (!(slot >= pulse && Double.isFinite(slot))) {
      throw new IllegalArgumentException(
          "slot must be at least the pulse, got " + slot + " s for a pulse of " + pulse + " s");
    }
  }
}
