package torqueloom.training.learning;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class LimitedMemoryBfgsTest {
  /** Sum of c_i (x_i - i)^2 / 2 with curvatures from 1 to 1e6. */
  private static double stretched(double[] x, double[] gradient) {
    double value = 0;
    for (int i = 0; i < x.length; i++) {
      final double curvature = Math.pow(10, 6.0 * i / (x.length - 1));
      gradient[i] = curvature * (x[i] - i);
      value += 0.5 * curvature * (x[i] - i) * (x[i] - i);
    }
    return value;
  }

  @Test
  void findsTheMinimumOfAStretchedBowl() {
    final LimitedMemoryBfgs.Minimum minimum =
        LimitedMemoryBfgs.minimize(LimitedMemoryBfgsTest::stretched, new double[10], 1e-8, 1000);
    assertTrue(minimum.converged());
    assertArrayEquals(new double[] {0, 1, 2, 3, 4, 5, 6, 7, 8, 9}, minimum.point(), 1e-8);
    assertEquals(0, minimum.value(), 1e-16);
  }

  /** Rosenbrock's valley (Comput. J. 3, 175 (1960), from memory), start (-1.2, 1), minimum (1, 1). */
  @Test
  void followsRosenbrocksValley() {
    final LimitedMemoryBfgs.Minimum minimum =
        LimitedMemoryBfgs.minimize(
            (x, gradient) -> {
              final double bend = x[1] - x[0] * x[0];
              gradient[0] = -400 * x[0] * bend - 2 * (1 - x[0]);
              gradient[1] = 200 * bend;
              return 100 * bend * bend + (1 - x[0]) * (1 - x[0]);
            },
            new double[] {-1.2, 1},
            1e-10,
            200);
    assertTrue(minimum.converged());
    assertArrayEquals(new double[] {1, 1}, minimum.point(), 1e-9);
  }

  @Test
  void saysWhenItDidNotConverge() {
    final LimitedMemoryBfgs.Minimum minimum =
        LimitedMemoryBfgs.minimize(LimitedMemoryBfgsTest::stretched, new double[10], 1e-8, 3);
    assertFalse(minimum.converged());
    assertEquals(3, minimum.iterations());
  }
}
