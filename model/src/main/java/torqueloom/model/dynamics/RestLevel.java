package torqueloom.model.dynamics;

/**
 * A rest of the moment, and the spread of thermal equilibrium about it in harmonic approximation.
 *
 * @param x m_x (1)
 * @param y m_y (1)
 * @param z m_z (1)
 * @param barrier smallest energy per moment needed to leave it (T), &gt;= 0
 */
public record RestLevel(double x, double y, double z, double barrier) {
  /** Stiffness is taken as at least this many thermal fields: spreads end at half a radian. */
  private static final double SOFTEST = 4;

  /** @throws IllegalArgumentException if the direction is not a unit vector or the barrier negative */
  public RestLevel {
    if (!(Math.abs(x * x + y * y + z * z - 1) < 1e-9) || !(barrier >= 0)) {
      throw new IllegalArgumentException(
          "a rest needs a unit vector and a barrier, got "
              + x
              + ", "
              + y
              + ", "
              + z
              + " and "
              + barrier
              + " T");
    }
  }

  /**
   * A direction drawn about the rest.
   *
   * @param first standard normal number along the first tangent
   * @param second standard normal number along the second tangent
   * @return three components, not normalized
   */
  double[] draw(MacrospinParameters spin, double first, double second) {
    final double[][] tangent = tangents();
    final double[] u = tangent[0];
    final double[] w = tangent[1];
    final double a = first * spread(spin, u);
    final double b = second * spread(spin, w);
    return new double[] {x + a * u[0] + b * w[0], y + a * u[1] + b * w[1], z + a * u[2] + b * w[2]};
  }

  /** Stiffness of the softer of the two tangents (T). */
  double smallestStiffness(MacrospinParameters spin) {
    final double[][] tangent = tangents();
    return Math.min(stiffness(spin, tangent[0]), stiffness(spin, tangent[1]));
  }

  /** Tangents along the principal directions of every rest in a plane of the axes: y's first. */
  private double[][] tangents() {
    final double[] axis = Math.abs(y) < 0.9 ? new double[] {0, 1, 0} : new double[] {0, 0, 1};
    final double along = axis[0] * x + axis[1] * y + axis[2] * z;
    final double[] u = unit(axis[0] - along * x, axis[1] - along * y, axis[2] - along * z);
    final double[] w = {u[1] * z - u[2] * y, u[2] * x - u[0] * z, u[0] * y - u[1] * x};
    return new double[][] {u, w};
  }

  /** Stiffness along a tangent e: e.A.e - m.A.m + b.m (T). */
  private double stiffness(MacrospinParameters p, double[] e) {
    return p.excessY() * (e[1] * e[1] - y * y)
        + p.excessZ() * (e[2] * e[2] - z * z)
        + p.fieldX() * x
        + p.fieldY() * y
        + p.fieldZ() * z;
  }

  private double spread(MacrospinParameters p, double[] e) {
    final double thermal = p.thermalField();
    return thermal == 0 ? 0 : Math.sqrt(thermal / Math.max(stiffness(p, e), SOFTEST * thermal));
  }

  private static double[] unit(double a, double b, double c) {
    final double length = Math.sqrt(a * a + b * b + c * c);
    return new double[] {a / length, b / length, c / length};
  }
}
