package torqueloom.model.tolerance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.junit.jupiter.api.Test;
import torqueloom.model.device.EasyPlaneFerromagnet;
import torqueloom.model.device.Film;
import torqueloom.model.device.Gate;
import torqueloom.model.device.Outline;
import torqueloom.model.device.Readout;
import torqueloom.model.device.Shape;
import torqueloom.model.device.StripDrive;
import torqueloom.model.device.TemperatureLaw;
import torqueloom.model.random.Purpose;

class TolerancesTest {
  private static final EasyPlaneFerromagnet NOMINAL =
      new EasyPlaneFerromagnet(
          300,
          new Film(
              0.8e6,
              4e-9,
              1.379e-3,
              0.1,
              12e-12,
              150e-8,
              new TemperatureLaw(TemperatureLaw.Magnetization.BLOCH, 1100, 2.2)),
          new Outline(Shape.RECTANGLE, 200e-9, 50e-9),
          4e-3,
          new StripDrive(0.25, 0, 5e-9, 50e-9, 200e-9, 200e-8, 500, 0.8, 3.2e6),
          Readout.tunnelJunction(
              100e-12, 1.2, 0.6, 0.1, 1.4e-9, 2e9, 50, 300, 5e-15, -0.3, 0.3, 1e-12),
          new Gate(2e-9, 60e-15, 1e9));

  private static EasyPlaneFerromagnet draw(Map<String, Spread> spreads, long chip, long column) {
    return (EasyPlaneFerromagnet)
        new Tolerances(spreads).draw(NOMINAL, 7, Purpose.CHIP_NEURON, chip, 0, column);
  }

  private static double damping(Map<String, Spread> spreads, long chip, long column) {
    return draw(spreads, chip, column).film().damping() / 0.1 - 1;
  }

  /** Chance of a false alarm with correct draws: 5 standard errors of a deviation, below 1e-6. */
  @Test
  void drawsHaveTheStatedSpread() {
    final Map<String, Spread> spreads = Map.of("damping", new Spread(0.03, 0.04));
    final int n = 2000;
    double all = 0;
    double within = 0;
    for (int chip = 0; chip < n; chip++) {
      final double a = damping(spreads, chip, 0);
      final double b = damping(spreads, chip, 1);
      all += a * a;
      within += (a - b) * (a - b) / 2;
      assertTrue(Math.abs(a) <= 4 * 0.07 + 1e-6);
    }
    final double relativeError = 5 / Math.sqrt(2.0 * n);
    assertEquals(0.05, Math.sqrt(all / n), 0.05 * relativeError);
    assertEquals(0.04, Math.sqrt(within / n), 0.04 * relativeError);
  }

  @Test
  void chipPartIsShared() {
    final Map<String, Spread> spreads = Map.of("damping", new Spread(0.03, 0));
    assertEquals(damping(spreads, 3, 0), damping(spreads, 3, 9));
    assertNotEquals(damping(spreads, 3, 0), damping(spreads, 4, 0));
  }

  /** Adding a tolerance moves no other draw; doubling a width doubles the deviation. */
  @Test
  void comparisonsArePaired() {
    final Map<String, Spread> one = Map.of("damping", new Spread(0.03, 0.04));
    final Map<String, Spread> two =
        Map.of("damping", new Spread(0.03, 0.04), "bias-field", new Spread(0.1, 0.1));
    final Map<String, Spread> wide = Map.of("damping", new Spread(0.06, 0.08));
    for (int column = 0; column < 20; column++) {
      assertEquals(damping(one, 2, column), damping(two, 2, column));
      assertEquals(2 * damping(one, 2, column), damping(wide, 2, column), 1e-12);
    }
  }

  /** Derived here: a level lies within half a step, 2 x 0.03 mJ/m² over 63, of what is wanted. */
  @Test
  void trimBringsTheImbalanceBack() {
    final Trim trim = new Trim(0.03e-3, 64, 300, true);
    final double target = NOMINAL.imbalance(300);
    final double halfStep = 0.03e-3 / 63;
    int inRange = 0;
    for (int chip = 0; chip < 50; chip++) {
      final EasyPlaneFerromagnet drawn =
          draw(Map.of("interface-anisotropy", new Spread(0.006, 0.002)), chip, 0);
      for (final double temperature : new double[] {290, 300, 310}) {
        final double left =
            trim.apply(drawn, temperature, target).balancingShift(temperature, target);
        if (Math.abs(drawn.balancingShift(temperature, target)) < 0.03e-3) {
          assertTrue(Math.abs(left) <= halfStep * (1 + 1e-9), "left " + left + " J/m²");
          inRange++;
        }
      }
    }
    assertTrue(inRange > 100, "within reach: " + inRange);
  }

  @Test
  void trimEndsAtItsRange() {
    final Trim trim = new Trim(0.03e-3, 64, 300, true);
    final EasyPlaneFerromagnet far = NOMINAL.scaled("interface-anisotropy", 0.9);
    final double shift = trim.shift(far, 300, NOMINAL.imbalance(300));
    assertEquals(0.03e-3, Math.abs(shift), 1e-18);
  }

  /** A trim made once keeps its shift where the temperature moves the balance. */
  @Test
  void trimMadeOnceDoesNotFollowTheTemperature() {
    final double target = NOMINAL.imbalance(300);
    final Trim once = new Trim(0.03e-3, 64, 300, false);
    final Trim anew = new Trim(0.03e-3, 64, 300, true);
    assertEquals(once.shift(NOMINAL, 300, target), once.shift(NOMINAL, 310, target));
    assertNotEquals(anew.shift(NOMINAL, 300, target), anew.shift(NOMINAL, 310, target));
  }

  @Test
  void refusesNonsense() {
    assertThrows(IllegalArgumentException.class, () -> new Spread(-0.1, 0));
    assertThrows(IllegalArgumentException.class, () -> new Spread(0, Double.NaN));
    assertThrows(IllegalArgumentException.class, () -> new Trim(0, 64, 300, true));
    assertThrows(IllegalArgumentException.class, () -> new Trim(1e-5, 1, 300, true));
    assertThrows(
        IllegalArgumentException.class,
        () -> draw(Map.of("no-such-parameter", new Spread(0, 0.1)), 0, 0));
  }
}
