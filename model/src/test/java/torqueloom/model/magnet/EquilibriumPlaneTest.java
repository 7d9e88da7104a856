package torqueloom.model.magnet;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Closed forms against a fine scan of the energy (D/2) sin² phi - B_b cos phi itself. */
class EquilibriumPlaneTest {
  private static final int SCAN = 200_000;

  @ParameterizedTest(name = "D = {0} T, B_b = {1} T")
  @CsvSource({
    "4e-3, 0",
    "4e-3, 1e-3",
    "4e-3, 4e-3",
    "4e-3, 9e-3",
    "0, 4e-3",
    "-0.2e-3, 4e-3",
    "-4e-3, 4e-3",
    "-9e-3, 4e-3",
    "-9e-3, 0",
    "4e-3, -1e-3",
    "-9e-3, -4e-3",
    "6e-3, -4e-3"
  })
  void closedFormsAgreeWithAScan(double d, double b) {
    final EquilibriumPlane plane = new EquilibriumPlane(d, b);
    double lowest = Double.POSITIVE_INFINITY;
    double steepest = 0;
    for (int i = 0; i < SCAN; i++) {
      final double phi = 2 * Math.PI * i / SCAN;
      lowest = Math.min(lowest, plane.energy(phi));
      steepest = Math.max(steepest, d / 2 * Math.sin(2 * phi) + b * Math.sin(phi));
    }
    assertEquals(lowest, plane.energy(plane.restAngle()), 1e-12);
    assertEquals(steepest, plane.threshold(), 1e-11);
    assertEquals(scannedBarrier(plane), plane.barrier(), 1e-11);
    for (final double angle : plane.restAngles()) {
      assertTrue(plane.energy(angle) <= plane.energy(angle + 1e-3) + 1e-15);
      assertTrue(plane.energy(angle) <= plane.energy(angle - 1e-3) + 1e-15);
      final double h = 1e-4;
      final double curvature =
          (plane.energy(angle + h) - 2 * plane.energy(angle) + plane.energy(angle - h)) / (h * h);
      assertEquals(curvature, plane.planeStiffness(angle), 1e-9);
    }
  }

  /** Climb from the first rest to either side until the energy falls again; a flat top is one. */
  private static double scannedBarrier(EquilibriumPlane plane) {
    return Math.min(climb(plane, 1), climb(plane, -1)) - plane.energy(plane.restAngle());
  }

  private static double climb(EquilibriumPlane plane, int side) {
    double top = plane.energy(plane.restAngle());
    for (int i = 1; i < SCAN; i++) {
      final double next = plane.energy(plane.restAngle() + side * 2 * Math.PI * i / SCAN);
      if (next < top - 1e-14) {
        return top;
      }
      top = Math.max(top, next);
    }
    return top;
  }

  @Test
  void restsInOrder() {
    assertArrayEquals(new double[] {0, Math.PI}, new EquilibriumPlane(4e-3, 1e-3).restAngles());
    assertArrayEquals(new double[] {Math.PI, 0}, new EquilibriumPlane(4e-3, -1e-3).restAngles());
    assertArrayEquals(new double[] {0}, new EquilibriumPlane(4e-3, 5e-3).restAngles());
    final double tilt = Math.acos(4. / 9);
    assertArrayEquals(
        new double[] {tilt, -tilt}, new EquilibriumPlane(-9e-3, 4e-3).restAngles(), 1e-12);
  }

  @Test
  void poleStiffnessFollowsTheTilt() {
    final EquilibriumPlane plane = new EquilibriumPlane(-9e-3, 4e-3);
    final double mz = Math.sin(plane.restAngle());
    assertEquals(
        74e-3 + 9e-3 * mz * mz + 4e-3 * 4 / 9,
        plane.poleStiffness(plane.restAngle(), 74e-3),
        1e-12);
  }
}
