package torqueloom.model.device;

/**
 * Heavy-metal strip that drives the film by the spin Hall effect. All values are SI.
 *
 * @param spinHallAngle effective damping-like efficiency theta_SH, interface included (1), nonzero,
 *     in [-10, 10]
 * @param fieldLikeRatio field-like over damping-like torque (1), finite
 * @param stripThickness (m), &gt; 0
 * @param stripWidth (m), &gt; 0
 * @param stripLength between the contacts (m), &gt; 0
 * @param stripResistivity (ohm m), &gt; 0
 * @param contactResistance of both contacts together (ohm), &gt;= 0
 * @param supplyVoltage that delivers the current (V), &gt; 0
 * @param thermalResistance from the device to the heat sink (K/W), &gt;= 0
 */
public record StripDrive(
    double spinHallAngle,
    double fieldLikeRatio,
    double stripThickness,
    double stripWidth,
    double stripLength,
    double stripResistivity,
    double contactResistance,
    double supplyVoltage,
    double thermalResistance) {

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public StripDrive {
    if (!(Math.abs(spinHallAngle) <= 10) || spinHallAngle == 0) {
      throw new IllegalArgumentException(
          "spin-hall-angle must not be zero and must lie within -10 and 10, got " + spinHallAngle);
    }
    Require.finite("field-like-ratio", fieldLikeRatio, "1");
    Require.positive("strip-thickness", stripThickness, "m");
    Require.positive("strip-width", stripWidth, "m");
    Require.positive("strip-length", stripLength, "m");
    Require.positive("strip-resistivity", stripResistivity, "ohm m");
    Require.notNegative("contact-resistance", contactResistance, "ohm");
    Require.positive("supply-voltage", supplyVoltage, "V");
    Require.notNegative("thermal-resistance", thermalResistance, "K/W");
  }

  /** Cross-section of the strip (m²). */
  public double crossSection() {
    return stripThickness * stripWidth;
  }
}
