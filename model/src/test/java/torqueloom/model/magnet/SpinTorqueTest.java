package torqueloom.model.magnet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Numbers computed independently from B_DL = hbar theta J/(2 e M_s t) and Bloch's law. */
class SpinTorqueTest {

  @Test
  void fieldOfAStrip() {
    assertEquals(3.29106e-3, SpinTorque.fieldPerCurrentDensity(.1, 1e6, 1e-9) * 1e11, 5e-9);
  }

  @Test
  void criticalCurrentOfAnEasyPlane() {
    // J_c = e M_s t B_a/(hbar theta): M_s = 600 kA/m, t = 5 nm, theta = 0.1, B_a = 0.33 mT.
    assertEquals(1.504e10, .165e-3 / SpinTorque.fieldPerCurrentDensity(.1, 6e5, 5e-9), 5e6);
  }

  @Test
  void magnetizationFallsByBlochsLaw() {
    assertEquals(1, TemperatureScaling.bloch(300, 300, 1100), 0);
    final double expected = (1 - Math.pow(310. / 1100, 1.5)) / (1 - Math.pow(300. / 1100, 1.5));
    assertEquals(expected, TemperatureScaling.bloch(310, 300, 1100), 1e-15);
    assertThrows(IllegalArgumentException.class, () -> TemperatureScaling.bloch(0, 300, 1100));
    final IllegalArgumentException refusal =
        assertThrows(
            IllegalArgumentException.class, () -> TemperatureScaling.bloch(1200, 300, 1100));
    assertTrue(refusal.getMessage().contains("Curie"));
  }
}
