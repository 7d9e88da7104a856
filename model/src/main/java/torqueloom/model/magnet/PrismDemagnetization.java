package torqueloom.model.magnet;

/**
 * Magnetometric demagnetizing factors of a rectangular prism that is magnetized uniformly.
 *
 * <p>Source: A. Aharoni, J. Appl. Phys. 83, 3432 (1998), doi:10.1063/1.367113, Eq. (1), with each
 * logarithm ln((r-a)/(r+a)) written as -2 arsinh(a/sqrt(r²-a²)), which does not cancel. Accuracy:
 * error about 1e-13 at an aspect ratio of 1e3 and 1e-11 at 1e5.
 */
public final class PrismDemagnetization {
  private PrismDemagnetization() {}

  /**
   * Factors along the three edges (1), sum 1.
   *
   * @param x full edge along x (any unit, the same for all), &gt; 0
   * @param y full edge along y, &gt; 0
   * @param z full edge along z, &gt; 0
   * @throws IllegalArgumentException if an edge is not positive and finite
   */
  public static double[] factors(double x, double y, double z) {
    Bodies.requireEdges(x, y, z);
    final double scale = Math.max(x, Math.max(y, z));
    final double a = x / scale;
    final double b = y / scale;
    final double c = z / scale;
    return new double[] {
      factorAlongLast(b, c, a), factorAlongLast(c, a, b), factorAlongLast(a, b, c)
    };
  }

  /** Aharoni's D_z with half edges in proportion a : b : c. */
  private static double factorAlongLast(double a, double b, double c) {
    final double ab = Math.sqrt(a * a + b * b);
    final double bc = Math.sqrt(b * b + c * c);
    final double ca = Math.sqrt(c * c + a * a);
    final double abc = Math.sqrt(a * a + b * b + c * c);
    final double logarithms =
        -(b * b - c * c) / (b * c) * Bodies.asinh(a / bc)
            - (a * a - c * c) / (a * c) * Bodies.asinh(b / ca)
            + b / c * Bodies.asinh(a / b)
            + a / c * Bodies.asinh(b / a)
            - c / a * Bodies.asinh(b / c)
            - c / b * Bodies.asinh(a / c);
    final double powers =
        (a * a * a + b * b * b - 2 * c * c * c) / (3 * a * b * c)
            + (a * a + b * b - 2 * c * c) / (3 * a * b * c) * abc
            + c / (a * b) * (ca + bc)
            - (ab * ab * ab + bc * bc * bc + ca * ca * ca) / (3 * a * b * c);
    final double angle = 2 * StrictMath.atan2(a * b, c * abc);
    return (logarithms + angle + powers) / Math.PI;
  }
}
