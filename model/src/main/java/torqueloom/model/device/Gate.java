package torqueloom.model.device;

/**
 * Gate of a tunable layer. All values are SI.
 *
 * @param dielectricThickness (m), &gt; 0
 * @param voltageCoefficient xi in ΔK_i = xi V/t_gate (J/(V m)), &gt; 0
 * @param breakdownField (V/m), &gt; 0
 */
public record Gate(double dielectricThickness, double voltageCoefficient, double breakdownField) {
  /** @throws IllegalArgumentException naming the first value that is not positive */
  public Gate {
    check("dielectric-thickness", dielectricThickness);
    check("voltage-coefficient", voltageCoefficient);
    check("breakdown-field", breakdownField);
  }

  /** Gate voltage for a shift of the interfacial anisotropy (V): V = ΔK_i t_gate/xi. */
  public double voltage(double interfaceAnisotropyShift) {
    return interfaceAnisotropyShift * dielectricThickness / voltageCoefficient;
  }

  private static void check(String name, double value) {
    if (!(value > 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(name + " must be positive, got " + value);
    }
  }
}
