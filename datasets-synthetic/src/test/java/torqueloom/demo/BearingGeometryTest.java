package torqueloom.demo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BearingGeometryTest {
  /**
   * Orders printed with the bearing data of Case Western Reserve University for its 6205 drive-end
   * bearing, four or five digits (from memory): outer 3.5848, inner 5.4152, train 0.39828, rolling
   * element 4.7135, which is twice the spin order.
   */
  @Test
  void ordersOfThe6205MatchThePublishedOnes() {
    final BearingGeometry bearing = BearingGeometry.DEEP_GROOVE_6205;
    assertEquals(3.5848, bearing.outerRaceOrder(), 1e-4);
    assertEquals(5.4152, bearing.innerRaceOrder(), 1e-4);
    assertEquals(0.39828, bearing.cageOrder(), 1e-4);
    assertEquals(4.7135, 2 * bearing.ballSpinOrder(), 1e-4);
  }

  /** Kinematics: the balls pass each race with the cage, and both passings add up to n. */
  @ParameterizedTest
  @CsvSource({"9, 7.94, 39.04, 0", "12, 10, 60, 0.4", "16, 8.4, 71.5, 0.26"})
  void passingOrdersAreThoseOfTheCage(int balls, double ball, double pitch, double angle) {
    final BearingGeometry bearing = new BearingGeometry(balls, ball / 1e3, pitch / 1e3, angle);
    assertEquals(balls * bearing.cageOrder(), bearing.outerRaceOrder(), 1e-12);
    assertEquals(balls * (1 - bearing.cageOrder()), bearing.innerRaceOrder(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource({
    "0, 8, 39, 0",
    "9, 0, 39, 0",
    "9, 40, 39, 0",
    "9, NaN, 39, 0",
    "9, 8, NaN, 0",
    "9, 8, Infinity, 0",
    "9, 8, 39, -0.1",
    "9, 8, 39, 1.6",
    "9, 8, 39, NaN"
  })
  void refusesImpossibleBearings(int balls, double ball, double pitch, double angle) {
    assertThrows(
        IllegalArgumentException.class, () -> new BearingGeometry(balls, ball, pitch, angle));
  }
}
