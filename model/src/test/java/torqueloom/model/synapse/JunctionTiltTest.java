package torqueloom.model.synapse;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import torqueloom.model.constants.PhysicalConstants;

class JunctionTiltTest {
  private static final double KT = PhysicalConstants.BOLTZMANN * 300;

  /** Without a perpendicular anisotropy <mx> is the Langevin function coth x - 1/x. */
  @ParameterizedTest
  @CsvSource({"0.5", "2", "20", "400"})
  void isTheLangevinFunctionWithoutAnisotropy(double x) {
    final double expected = 1 / Math.tanh(x) - 1 / x;
    assertEquals(expected, JunctionTilt.meanProjection(0, x * KT, 1, 300), 1e-12);
  }

  /**
   * Computed independently by numpy with scipy.special.ive (the azimuth as a Bessel function,
   * 200001 trapezoids over mx): 80 nm x 1.6 nm, 1 MA/m, bias field 60 mT, 300 K.
   */
  @ParameterizedTest
  @CsvSource({"0.1, 0.6052100142102483"})
  void matchesTheBesselForm(double anisotropyField, double expected) {
    assertEquals(
        expected,
        JunctionTilt.meanProjection(anisotropyField, 0.06, JunctionSamples.DEMO.moment(), 300),
        1e-8);
  }

  /**
   * Derived here: for a cold moment the average is the rest tilt B_f/B_k, and 1 past saturation.
   */
  @Test
  void tendsToTheRestTilt() {
    assertEquals(0.6, JunctionTilt.meanProjection(0.1, 0.06, 8e-18, 1), 1e-3);
    assertEquals(1, JunctionTilt.meanProjection(0.05, 0.06, 8e-18, 1), 1e-3);
    assertEquals(0.6, JunctionTilt.restProjection(0.1, 0.06));
    assertEquals(1, JunctionTilt.restProjection(0.06, 0.06));
  }

  /** Without bias field both wells cancel. */
  @Test
  void vanishesWithoutBiasField() {
    assertEquals(0, JunctionTilt.meanProjection(0.1, 0, 8e-18, 300), 1e-12);
  }
}
