package torqueloom.model.magnet;

/**
 * Magnetometric demagnetizing factors of an elliptic cylinder (flat faces, upright walls).
 *
 * <p>The factor along axis i is -1/(4 pi V) times the integral of G(r) d²/dx_i² (1/r), where G is the
 * body's overlap with itself shifted by r. The overlap of two ellipses is an affine image of the
 * overlap of two unit discs, 2 arccos(s/2) - (s/2) sqrt(4 - s²), which leaves one integral for the
 * axis of the cylinder (the angular one is an arithmetic-geometric mean) and two for the axes of the
 * ellipse. Derived here; the same factors follow from the Fourier shape amplitude of M. Beleggia, M.
 * De Graef, Y. T. Millev, Phil. Mag. 86, 2451 (2006). The integrals are taken numerically to about
 * 1e-12, all three independently, so their sum tests them.
 */
public final class EllipticCylinderDemagnetization {
  /** Panels of the radial integral grow by this factor away from the axis. */
  private static final double GROWTH = 3;

  /** Digits of the angular rule: its error is exp(-ANGULAR). */
  private static final double ANGULAR = 36;

  private EllipticCylinderDemagnetization() {}

  /**
   * Factors along the ellipse's x and y axes and along the cylinder (1), sum 1.
   *
   * @param x full axis of the ellipse along x (any unit, the same for all), &gt; 0
   * @param y full axis of the ellipse along y, &gt; 0
   * @param height full height along z, &gt; 0
   * @throws IllegalArgumentException if a length is not positive and finite
   */
  public static double[] factors(double x, double y, double height) {
    Bodies.requireEdges(x, y, height);
    final double scale = Math.max(x, y) / 2;
    final double a = x / 2 / scale;
    final double b = y / 2 / scale;
    final double t = height / scale;
    final double[] inPlane = new double[2];
    double along = 0;
    // s = 2 sin(theta) takes the root singularity of sqrt(4 - s²) away; panels grow from t/4 on.
    double from = 0;
    double to = Math.min(Math.PI / 2, t / 4);
    while (from < Math.PI / 2) {
      for (int i = 0; i < GaussLegendre.POINTS; i++) {
        final double theta = from + (to - from) * 0.5 * (1 + GaussLegendre.node(i));
        final double weight = 0.5 * (to - from) * GaussLegendre.weight(i);
        along += weight * axialIntegrand(theta, a, b, t);
        addInPlane(inPlane, weight, theta, a, b, t);
      }
      from = to;
      to = Math.min(Math.PI / 2, to * GROWTH);
    }
    final double factor = a * b * t / (2 * Math.PI * Math.PI);
    return new double[] {factor * inPlane[0], factor * inPlane[1], a * b / (Math.PI * t) * along};
  }

  /** s D(s) [1/(s M(a, b)) - 1/M(sqrt(s²a²+t²), sqrt(s²b²+t²))] ds/dtheta, M the mean. */
  private static double axialIntegrand(double theta, double a, double b, double t) {
    final double s = 2 * StrictMath.sin(theta);
    final double cosine = StrictMath.cos(theta);
    final double overlap = Math.PI - 2 * theta - s * cosine;
    final double near = arithmeticGeometricMean(a, b);
    final double far =
        arithmeticGeometricMean(Math.sqrt(s * s * a * a + t * t), Math.sqrt(s * s * b * b + t * t));
    return overlap * (1 / near - s / far) * 2 * cosine;
  }

  /** Adds the angular integrals of cos² and sin² over R² (sqrt(s²R²+t²) + sR), R² = a²cos² + b²sin². */
  private static void addInPlane(
      double[] sums, double weight, double theta, double a, double b, double t) {
    final double s = 2 * StrictMath.sin(theta);
    final double cosine = StrictMath.cos(theta);
    final double radial = weight * 4 * cosine * cosine;
    final int points = (int) Math.ceil(ANGULAR / (4 * Bodies.asinh(Math.min(a, b)))) + 2;
    final double[] squares = AngularSquares.cosines(points);
    double alongX = 0;
    double alongY = 0;
    for (final double cos2 : squares) {
      final double r2 = a * a * cos2 + b * b * (1 - cos2);
      final double r = Math.sqrt(r2);
      final double value = 1 / (r2 * (Math.sqrt(s * s * r2 + t * t) + s * r));
      alongX += cos2 * value;
      alongY += (1 - cos2) * value;
    }
    final double step = 2 * Math.PI / points;
    sums[0] += radial * step * alongX;
    sums[1] += radial * step * alongY;
  }

  private static double arithmeticGeometricMean(double first, double second) {
    double p = first;
    double q = second;
    while (Math.abs(p - q) > 1e-15 * p) {
      final double mean = 0.5 * (p + q);
      q = Math.sqrt(p * q);
      if (mean == p) {
        break;
      }
      p = mean;
    }
    return 0.5 * (p + q);
  }
}
