package torqueloom.model.magnet;

/**
 * Demagnetizing factors of a general ellipsoid: N_a = (abc/3) R_D(b², c², a²) with semi-axes a, b, c.
 *
 * <p>Sources: J. A. Osborn, Phys. Rev. 67, 351 (1945), doi:10.1103/PhysRev.67.351, for the factors;
 * B. C. Carlson, Numer. Algorithms 10, 13 (1995), for the symmetric elliptic integral R_D and its
 * computation by duplication (from memory). Accuracy: relative error below 1e-14.
 */
public final class EllipsoidDemagnetization {
  /** Duplication stops when the spread of the arguments is this small; the series error is its 6th power. */
  private static final double SPREAD = 1e-3;

  private EllipsoidDemagnetization() {}

  /**
   * Factors along the three axes (1), sum 1.
   *
   * @param x axis along x, full or half (any unit, the same for all), &gt; 0
   * @param y axis along y, &gt; 0
   * @param z axis along z, &gt; 0
   * @throws IllegalArgumentException if an axis is not positive and finite
   */
  public static double[] factors(double x, double y, double z) {
    Bodies.requireEdges(x, y, z);
    final double scale = Math.max(x, Math.max(y, z));
    final double a = x / scale;
    final double b = y / scale;
    final double c = z / scale;
    final double third = a * b * c / 3;
    return new double[] {
      third * carlsonRd(b * b, c * c, a * a),
      third * carlsonRd(c * c, a * a, b * b),
      third * carlsonRd(a * a, b * b, c * c)
    };
  }

  /** R_D(x, y, z) = (3/2) integral over t from 0 of dt / (sqrt(t+x) sqrt(t+y) (t+z)^(3/2)). */
  static double carlsonRd(double x0, double y0, double z0) {
    double x = x0;
    double y = y0;
    double z = z0;
    double sum = 0;
    double power = 1;
    double mean = (x + y + 3 * z) / 5;
    while (Math.max(Math.abs(mean - x), Math.max(Math.abs(mean - y), Math.abs(mean - z)))
        > SPREAD * mean) {
      final double root = Math.sqrt(x * y) + Math.sqrt(y * z) + Math.sqrt(z * x);
      sum += power / (Math.sqrt(z) * (z + root));
      power /= 4;
      x = (x + root) / 4;
      y = (y + root) / 4;
      z = (z + root) / 4;
      mean = (x + y + 3 * z) / 5;
    }
    return 3 * sum
        + power * series((mean - x) / mean, (mean - y) / mean) / (mean * Math.sqrt(mean));
  }

  /** Taylor series about equal arguments, through fifth order (Carlson 1995). */
  private static double series(double dx, double dy) {
    final double dz = -(dx + dy) / 3;
    final double e2 = dx * dy - 6 * dz * dz;
    final double e3 = (3 * dx * dy - 8 * dz * dz) * dz;
    final double e4 = 3 * (dx * dy - dz * dz) * dz * dz;
    final double e5 = dx * dy * dz * dz * dz;
    return 1
        - 3 * e2 / 14
        + e3 / 6
        + 9 * e2 * e2 / 88
        - 3 * e4 / 22
        - 9 * e2 * e3 / 52
        + 3 * e5 / 26;
  }
}
