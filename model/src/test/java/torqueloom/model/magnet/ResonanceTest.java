package torqueloom.model.magnet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.constants.PhysicalConstants;

/** C. Kittel, Phys. Rev. 73, 155 (1948); numbers computed independently from his formula. */
class ResonanceTest {
  private static final double ONE_TESLA = 1 / PhysicalConstants.VACUUM_PERMEABILITY;

  @Test
  void sphere() {
    assertEquals(2.802495e9, frequency(new AxisFields(1. / 3, 1. / 3, 1. / 3), .1), 1e3);
  }

  @Test
  void filmMagnetizedInItsPlane() {
    assertEquals(9.294825e9, frequency(new AxisFields(0, 0, 1), .1), 1e3);
  }

  @ParameterizedTest
  @CsvSource({"0, 14.012476e9", "0.4, 25.222456e9"})
  void filmMagnetizedAlongItsNormal(double anisotropyField, double expected) {
    // The normal is called x here; the anisotropy lowers its field.
    assertEquals(expected, frequency(new AxisFields(1 - anisotropyField, 0, 0), 1.5), 1e3);
  }

  @Test
  void ellipsoidAlongItsLength() {
    final AxisFields fields =
        AxisFields.ofFilm(EllipsoidDemagnetization.factors(100, 50, 5), ONE_TESLA, 5e-9, 0);
    assertEquals(7.026768e9, frequency(fields, 20e-3), 1e3);
  }

  @Test
  void biaxial() {
    assertEquals(.2816473e9, frequency(new AxisFields(0, .101, .001), 0), 1e2);
  }

  private static double frequency(AxisFields fields, double applied) {
    final double[] stiffness = Resonance.stiffnessAlongX(fields, applied);
    return Resonance.frequency(stiffness[0], stiffness[1]);
  }

  /** Exact roots of the damped motion, B1 = 1 mT, B2 = 101 mT. */
  @ParameterizedTest
  @CsvSource({".01, .0897949e9, .2812704e9", ".1, .889147e9, .241897e9"})
  void dampedRoots(double damping, double decay, double frequency) {
    assertEquals(decay, Resonance.slowestDecayRate(damping, 1e-3, 101e-3), 1e-6 * decay);
    assertEquals(frequency, Resonance.dampedFrequency(damping, 1e-3, 101e-3), 2e-6 * frequency);
  }

  @Test
  void creepingMotionHasTwoRealRoots() {
    final double slow =
        Resonance.slowestDecayRate(.5, 1e-3, .2) / PhysicalConstants.GYROMAGNETIC_RATIO;
    final double left = 1.25 * slow * slow - .5 * .201 * slow + 2e-4;
    assertEquals(0, left, 1e-12);
    assertEquals(0, Resonance.dampedFrequency(.5, 1e-3, .2));
  }

  @Test
  void linewidth() {
    assertEquals(7.136498e-3, Resonance.linewidth(.01, 10e9), 1e-9);
  }
}
