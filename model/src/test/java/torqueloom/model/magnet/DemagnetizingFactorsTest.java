package torqueloom.model.magnet;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Numbers computed independently with 40-digit arithmetic from J. A. Osborn, Phys. Rev. 67, 351
 * (1945) for ellipsoids, A. Aharoni, J. Appl. Phys. 83, 3432 (1998) for prisms, and the Fourier
 * shape amplitude of Beleggia and De Graef (from memory) for elliptic cylinders. The tolerance is
 * one in the last printed digit.
 */
class DemagnetizingFactorsTest {
  /** Accuracy of the independent numbers of the elliptic cylinder (a truncated Fourier integral). */
  private static final double CYLINDER = 5e-5;

  @ParameterizedTest(name = "ellipsoid {0} : {1} : {2}")
  @CsvSource({
    "2, 1, 1, .1735640, .4132180, .4132180, 1e-7",
    "2, 2, 1, .2363999, .2363999, .5272003, 1e-7",
    "3, 2, 1, .1563007, .2671540, .5765453, 1e-7",
    "10, 5, 1, .0543549, .1461682, .7994770, 1e-7",
    "150, 30, .75, .0020228588, .0236054331, .9743717081, 1e-8",
    "1, 1, 1, .3333333333333, .3333333333333, .3333333333333, 1e-13"
  })
  void ellipsoid(double a, double b, double c, double na, double nb, double nc, double tolerance) {
    assertArrayEquals(
        new double[] {na, nb, nc}, EllipsoidDemagnetization.factors(a, b, c), tolerance);
  }

  @Test
  void spheroidsAlongTheirPolarAxis() {
    assertEquals(.0202858803, EllipsoidDemagnetization.factors(1, 1, 10)[2], 1e-9);
    assertEquals(.8608042765, EllipsoidDemagnetization.factors(10, 10, 1)[2], 1e-9);
  }

  @ParameterizedTest(name = "prism {0} x {1} x {2}, last axis")
  @CsvSource({
    "1, 1, 1, .33333333333333, 1e-10",
    "1, 1, 2, .1983161528, 1e-9",
    "1, 1, 10, .0457311924, 1e-9",
    "2, 2, 1, .4959220380, 1e-9",
    "10, 10, 1, .8050776336, 1e-9",
    "100, 100, 1, .9660395822, 1e-9"
  })
  void prismLastAxis(double a, double b, double c, double n, double tolerance) {
    assertEquals(n, PrismDemagnetization.factors(a, b, c)[2], tolerance);
  }

  @ParameterizedTest(name = "prism {0} x {1} x {2}")
  @CsvSource({
    "60, 300, 1.5, .0397930204, .0076245778, .9525824017",
    "300, 100, 5, .0214343152, .0667734334, .9117922514",
    "120, 40, 2, .0214343152, .0667734334, .9117922514"
  })
  void prism(double a, double b, double c, double na, double nb, double nc) {
    assertArrayEquals(new double[] {na, nb, nc}, PrismDemagnetization.factors(a, b, c), 1e-8);
  }

  @ParameterizedTest(name = "elliptic cylinder {0} x {1} x {2}")
  @CsvSource({"300, 60, 1.5, .004683, .047336, .947980", "100, 50, 5, .047033, .121125, .831842"})
  void ellipticCylinder(double a, double b, double t, double na, double nb, double nc) {
    assertArrayEquals(
        new double[] {na, nb, nc}, EllipticCylinderDemagnetization.factors(a, b, t), CYLINDER);
  }

  @Test
  void disc() {
    assertEquals(.796675, EllipticCylinderDemagnetization.factors(100, 100, 10)[2], CYLINDER);
  }

  /**
   * N_z = (2/T) [4/(3 pi) - integral of J_1(k)² exp(-k T)/k² dk], T = height over radius, from the
   * potential of a charged disc; computed with 20 digits by mpmath.
   */
  @ParameterizedTest(name = "disc, height over radius {0}")
  @CsvSource({"0.2, .79667648247808673668", "2, .31157739267962331368"})
  void discByBesselFunctions(double ratio, double n) {
    assertEquals(n, EllipticCylinderDemagnetization.factors(2, 2, ratio)[2], 1e-13);
  }

  @Test
  void theShapeMatters() {
    // Same outline 300 x 60 x 1.5: N_width - N_length by shape (computed independently).
    assertEquals(.0322, difference(PrismDemagnetization.factors(300, 60, 1.5)), 5e-5);
    assertEquals(.0427, difference(EllipticCylinderDemagnetization.factors(300, 60, 1.5)), 5e-5);
    assertEquals(.0216, difference(EllipsoidDemagnetization.factors(300, 60, 1.5)), 5e-5);
  }

  private static double difference(double[] factors) {
    return factors[1] - factors[0];
  }

  @ParameterizedTest(name = "1 : {0} : {1}")
  @CsvSource({"1, 1", "0.3, 0.02", "0.25, 0.02", "0.05, 0.3", "0.9, 0.005", "1, 5", "0.02, 2"})
  void factorsSumToOneAndFollowPermutationAndScale(double b, double c) {
    final double[] prism = PrismDemagnetization.factors(1, b, c);
    final double[] ellipsoid = EllipsoidDemagnetization.factors(1, b, c);
    final double[] cylinder = EllipticCylinderDemagnetization.factors(1, b, c);
    assertEquals(1, prism[0] + prism[1] + prism[2], 1e-12);
    assertEquals(1, ellipsoid[0] + ellipsoid[1] + ellipsoid[2], 1e-12);
    // All three integrals of the cylinder are independent, so the sum tests their accuracy.
    assertEquals(1, cylinder[0] + cylinder[1] + cylinder[2], 1e-11);
    final double[] turned = PrismDemagnetization.factors(c * 7e-9, 7e-9, b * 7e-9);
    assertArrayEquals(new double[] {prism[2], prism[0], prism[1]}, turned, 1e-12);
    final double[] rolled = EllipsoidDemagnetization.factors(c * 7e-9, 7e-9, b * 7e-9);
    assertArrayEquals(new double[] {ellipsoid[2], ellipsoid[0], ellipsoid[1]}, rolled, 1e-12);
    final double[] swapped = EllipticCylinderDemagnetization.factors(b * 7e-9, 7e-9, c * 7e-9);
    assertArrayEquals(new double[] {cylinder[1], cylinder[0], cylinder[2]}, swapped, 1e-12);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
  void badEdgesAreRefused(double edge) {
    assertThrows(IllegalArgumentException.class, () -> PrismDemagnetization.factors(1, edge, 1));
    assertThrows(
        IllegalArgumentException.class, () -> EllipsoidDemagnetization.factors(edge, 1, 1));
    final IllegalArgumentException refusal =
        assertThrows(
            IllegalArgumentException.class,
            () -> EllipticCylinderDemagnetization.factors(1, 1, edge));
    assertTrue(refusal.getMessage().contains("positive"));
  }
}
