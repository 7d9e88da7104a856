package torqueloom.model.magnet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import torqueloom.model.constants.PhysicalConstants;

/** Numbers derived independently from t* = 2 K_i/(mu_0 M_s² [N_z - N_x]). */
class CompensationTest {

  @Test
  void filmLimit() {
    assertEquals(1.591549e-9, Compensation.filmLimit(1e-3, 1e6), 1e-15);
    final double ms = 1.58 / PhysicalConstants.VACUUM_PERMEABILITY;
    assertEquals(1.308787e-9, Compensation.filmLimit(1.3e-3, ms), 1e-15);
  }

  @Test
  void effectiveAnisotropyFieldOfAThinnerFilm() {
    final AxisFields fields = AxisFields.ofFilm(new double[] {0, 0, 1}, 1e6, 1.3e-9, 1e-3);
    assertEquals(.281824, -fields.imbalance(), 1e-6);
    assertEquals("z", fields.easyAxis());
  }

  @Test
  void prismOfTwoHundredByFifty() {
    final double thickness =
        Compensation.thickness(t -> PrismDemagnetization.factors(200e-9, 50e-9, t), 1e-3, 6e5)
            .orElseThrow();
    assertEquals(5.37118e-9, thickness, 1e-14);
    final AxisFields fields = fieldsAt(thickness, 1e-3);
    assertEquals(68.898e-3, fields.hardField(), 1e-6);
    // One per cent of thickness and of K_i, by central differences.
    final double byThickness =
        (fieldsAt(thickness * 1.005, 1e-3).imbalance()
            - fieldsAt(thickness * .995, 1e-3).imbalance());
    assertEquals(5.25e-3, byThickness, 0.01e-3);
    final double byAnisotropy =
        fieldsAt(thickness, 1.005e-3).imbalance() - fieldsAt(thickness, .995e-3).imbalance();
    assertEquals(-6.21e-3, byAnisotropy, 0.01e-3);
  }

  private static AxisFields fieldsAt(double thickness, double anisotropy) {
    return AxisFields.ofFilm(
        PrismDemagnetization.factors(200e-9, 50e-9, thickness), 6e5, thickness, anisotropy);
  }

  @Test
  void noCompensationForAStrongAnisotropyOrNone() {
    assertTrue(
        Compensation.thickness(t -> PrismDemagnetization.factors(20e-9, 20e-9, t), 1e-2, 6e5)
            .isEmpty());
    assertTrue(
        Compensation.thickness(t -> PrismDemagnetization.factors(20e-9, 20e-9, t), 0, 6e5)
            .isEmpty());
  }
}
