package torqueloom.model.magnet;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Anisotropy fields of a film along its three axes: the energy density is
 * (M_s/2)(B_x m_x² + B_y m_y² + B_z m_z²), so the axis of the lowest field is the easy one.
 *
 * <p>B_a = mu_0 M_s N_a, and B_z is less by 2 K_i/(M_s t) for an interfacial anisotropy K_i that
 * favors the normal. Easy, middle and hard axis are sorted at zero applied field.
 *
 * @param x B_x (T), finite
 * @param y B_y (T), finite
 * @param z B_z (T), finite
 */
public record AxisFields(double x, double y, double z) {
  private static final String[] NAMES = {"x", "y", "z"};

  /** @throws IllegalArgumentException if a field is not finite */
  public AxisFields {
    if (!Double.isFinite(x + y + z)) {
      throw new IllegalArgumentException(
          "axis fields must be finite, got " + x + ", " + y + ", " + z + " T");
    }
  }

  /**
   * Fields of a film.
   *
   * @param factors demagnetizing factors along x, y, z (1), length 3
   * @param saturationMagnetization M_s (A/m), &gt; 0
   * @param thickness t (m), &gt; 0
   * @param interfaceAnisotropy K_i (J/m²)
   */
  public static AxisFields ofFilm(
      double[] factors,
      double saturationMagnetization,
      double thickness,
      double interfaceAnisotropy) {
    final double full = PhysicalConstants.VACUUM_PERMEABILITY * saturationMagnetization;
    final double normal = 2 * interfaceAnisotropy / (saturationMagnetization * thickness);
    return new AxisFields(full * factors[0], full * factors[1], full * factors[2] - normal);
  }

  /** B_x, B_y, B_z (T), a new array. */
  public double[] toArray() {
    return new double[] {x, y, z};
  }

  /** Imbalance D = B_z - B_x (T). */
  public double imbalance() {
    return z - x;
  }

  /** B_easy: middle less easy (T), &gt;= 0. */
  public double easyField() {
    return field(1) - field(0);
  }

  /** B_hard: hard less middle (T), &gt;= 0. */
  public double hardField() {
    return field(2) - field(1);
  }

  /** "x", "y" or "z". */
  public String easyAxis() {
    return NAMES[order()[0]];
  }

  /** "x", "y" or "z". */
  public String middleAxis() {
    return NAMES[order()[1]];
  }

  /** "x", "y" or "z". */
  public String hardAxis() {
    return NAMES[order()[2]];
  }

  private double field(int rank) {
    return toArray()[order()[rank]];
  }

  /** Axis indices from easy to hard; equal fields keep the order x, y, z. */
  private int[] order() {
    final double[] fields = toArray();
    final int[] order = {0, 1, 2};
    for (int i = 1; i < 3; i++) {
      for (int j = i; j > 0 && fields[order[j]] < fields[order[j - 1]]; j--) {
        final int swap = order[j];
        order[j] = order[j - 1];
        order[j - 1] = swap;
      }
    }
    return order;
  }
}
