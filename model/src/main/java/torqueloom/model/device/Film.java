package torqueloom.model.device;

/**
 * Free film of a device, stated at the device's reference temperature. All values are SI.
 *
 * @param saturationMagnetization M_s (A/m), &gt; 0
 * @param thickness t (m), &gt; 0
 * @param interfaceAnisotropy K_i, energy per area that favors the film normal when positive
 *     (J/m²), finite
 * @param damping Gilbert damping alpha (1), in (0, 1]
 * @param exchangeStiffness A (J/m), &gt; 0; used by chains of spins, not by the macrospin
 * @param resistivity of the film (ohm m), &gt; 0
 * @param temperatureLaw how M_s and K_i follow the temperature
 */
public record Film(
    double saturationMagnetization,
    double thickness,
    double interfaceAnisotropy,
    double damping,
    double exchangeStiffness,
    double resistivity,
    TemperatureLaw temperatureLaw) {

  /** @throws IllegalArgumentException naming the first value that is NaN or out of range */
  public Film {
    Require.positive("saturation-magnetization", saturationMagnetization, "A/m");
    Require.positive("thickness", thickness, "m");
    Require.finite("interface-anisotropy", interfaceAnisotropy, "J/m^2");
    Require.above("damping", damping, 0, 1, "1");
    Require.positive("exchange-stiffness", exchangeStiffness, "J/m");
    Require.positive("resistivity", resistivity, "ohm m");
    Require.present("temperature-law", temperatureLaw);
  }
}
