package torqueloom.model.device;

/**
 * Gate that tunes the interfacial anisotropy, apart from the read path. A positive voltage lowers
 * K_i by xi V/t_gate.
 *
 * @param dielectricThickness t_gate (m), &gt; 0
 * @param voltageCoefficient xi (J/(V m)), &gt; 0
 * @param breakdownField of the dielectric (V/m), &gt; 0
 */
public record Gate(double dielectricThickness, double voltageCoefficient, double breakdownField) {
  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public Gate {
    Require.positive("dielectric-thickness", dielectricThickness, "m");
    Require.positive("voltage-coefficient", voltageCoefficient, "J/(V m)");
    Require.positive("breakdown-field", breakdownField, "V/m");
  }

  /** Voltage that shifts K_i by an amount in J/m² (V); opposite in sign. */
  public double voltageFor(double anisotropyShift) {
    return -anisotropyShift * dielectricThickness / voltageCoefficient;
  }
}
