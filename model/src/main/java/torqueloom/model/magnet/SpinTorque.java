package torqueloom.model.magnet;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Damping-like torque of a spin current and thermal stability.
 *
 * <p>B_DL = hbar theta J/(2 e M_s t), with theta the spin Hall angle of a strip or the spin
 * polarization of a junction (J. C. Slonczewski, J. Magn. Magn. Mater. 159, L1 (1996), for the
 * junction; L. Liu et al., Science 336, 555 (2012), for the strip; both from memory). A positive
 * field pulls the moment toward the polarization +p.
 */
public final class SpinTorque {
  private SpinTorque() {}

  /**
   * Torque field per current density (T per A/m²).
   *
   * @param efficiency theta (1)
   * @param saturationMagnetization M_s (A/m), &gt; 0
   * @param thickness t (m), &gt; 0
   */
  public static double fieldPerCurrentDensity(
      double efficiency, double saturationMagnetization, double thickness) {
    return PhysicalConstants.REDUCED_PLANCK
        * efficiency
        / (2 * PhysicalConstants.ELEMENTARY_CHARGE * saturationMagnetization * thickness);
  }

  /**
   * Thermal energy per moment, k_B T/(M_s V) (T): the scale of all thermal effects.
   *
   * @param temperature T (K)
   * @param saturationMagnetization M_s (A/m), &gt; 0
   * @param volume V (m³), &gt; 0
   */
  public static double thermalField(
      double temperature, double saturationMagnetization, double volume) {
    return PhysicalConstants.BOLTZMANN * temperature / (saturationMagnetization * volume);
  }
}
