package torqueloom.model.constants;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import torqueloom.model.units.QuantityKind;
import torqueloom.model.units.QuantityParser;

/**
 * Values of CODATA 2022 (arXiv:2409.03787) as the table of scipy 1.17.1 prints them; the SI of 2019
 * (BIPM, SI Brochure, 9th edition) fixes the exact ones.
 */
class PhysicalConstantsTest {

  @Test
  void exactConstantsAreThoseOfTheSi() {
    assertEquals(1.602176634e-19, PhysicalConstants.ELEMENTARY_CHARGE);
    assertEquals(6.62607015e-34, PhysicalConstants.PLANCK);
    assertEquals(1.380649e-23, PhysicalConstants.BOLTZMANN);
    assertRelative(1.0545718176461565e-34, PhysicalConstants.REDUCED_PLANCK, 1e-15);
  }

  @Test
  void adjustedConstantsHaveThePrintedDigits() {
    assertEquals(1.25663706127e-6, PhysicalConstants.VACUUM_PERMEABILITY);
    assertEquals(9.2740100657e-24, PhysicalConstants.BOHR_MAGNETON);
    assertEquals(2.00231930436092, PhysicalConstants.ELECTRON_G_FACTOR);
  }

  /** Printed to twelve digits with a relative uncertainty of 3.1e-10; 28.0249513861 GHz/T. */
  @Test
  void gyromagneticRatioAgreesWithItsOwnEntry() {
    assertRelative(1.76085962784e11, PhysicalConstants.GYROMAGNETIC_RATIO, 3.1e-10);
    assertRelative(28.0249513861e9, PhysicalConstants.GYROMAGNETIC_RATIO / (2 * Math.PI), 3.1e-10);
  }

  /** µ0γ, computed independently to eight digits: half a unit in the last. */
  @Test
  void precessionPerFieldStrength() {
    final double permeability = PhysicalConstants.VACUUM_PERMEABILITY;
    assertRelative(2.2127615e5, permeability * PhysicalConstants.GYROMAGNETIC_RATIO, 3e-8);
    final double gOfTwo = 2 * PhysicalConstants.BOHR_MAGNETON / PhysicalConstants.REDUCED_PLANCK;
    assertRelative(2.2101984e5, permeability * gOfTwo, 3e-8);
  }

  @Test
  void fluxQuantumAndJosephsonConstant() {
    assertRelative(2.0678338484619295e-15, PhysicalConstants.FLUX_QUANTUM, 1e-15);
    assertRelative(483597.8484169836e9, PhysicalConstants.JOSEPHSON, 1e-15);
  }

  /** k_B · 300 K = 4.141947e-21 J exactly, 25.852 meV to five digits. */
  @Test
  void thermalEnergyAtRoomTemperature() {
    final double energy = PhysicalConstants.BOLTZMANN * 300;
    assertRelative(4.141947e-21, energy, 1e-15);
    assertEquals(25.852e-3, energy / PhysicalConstants.ELEMENTARY_CHARGE, 0.5e-6);
  }

  /** The units package keeps a copy of the permeability, since it may not look here. */
  @Test
  void fieldsAreReadWithTheSamePermeability() {
    assertEquals(
        PhysicalConstants.VACUUM_PERMEABILITY, QuantityParser.parse("1 A/m", QuantityKind.FIELD));
    assertEquals(
        PhysicalConstants.ELEMENTARY_CHARGE, QuantityParser.parse("1 eV", QuantityKind.ENERGY));
  }

  private static void assertRelative(double expected, double actual, double tolerance) {
    assertEquals(expected, actual, tolerance * Math.abs(expected));
  }
}
