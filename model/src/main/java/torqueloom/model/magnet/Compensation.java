package torqueloom.model.magnet;

import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import torqueloom.model.constants.PhysicalConstants;

/**
 * Thickness at which the interfacial anisotropy compensates the shape: D = B_z - B_x = 0, that is
 * t [N_z(t) - N_x(t)] = 2 K_i/(mu_0 M_s²). In the limit of a wide film t = 2 K_i/(mu_0 M_s²).
 * Derived from the energy of {@link AxisFields}.
 */
public final class Compensation {
  /** Where the scan starts, in units of the film limit (1). */
  private static final double SCAN_FROM = 0.9;

  /** Ratio of neighboring thicknesses of the scan (1). */
  private static final double SCAN_STEP = 1.05;

  private Compensation() {}

  /** The film limit 2 K_i/(mu_0 M_s²) (m); K_i in J/m², M_s in A/m. */
  public static double filmLimit(double interfaceAnisotropy, double saturationMagnetization) {
    return 2
        * interfaceAnisotropy
        / (PhysicalConstants.VACUUM_PERMEABILITY
            * saturationMagnetization
            * saturationMagnetization);
  }

  /**
   * The smallest compensation thickness of an outline (m), or empty when the shape has none.
   *
   * @param factorsAt demagnetizing factors (N_x, N_y, N_z) for a thickness in meters
   * @param interfaceAnisotropy K_i (J/m²)
   * @param saturationMagnetization M_s (A/m), &gt; 0
   */
  public static OptionalDouble thickness(
      DoubleFunction<double[]> factorsAt,
      double interfaceAnisotropy,
      double saturationMagnetization) {
    final double target = filmLimit(interfaceAnisotropy, saturationMagnetization);
    if (!(target > 0)) {
      return OptionalDouble.empty();
    }
    final DoubleUnaryOperator excess =
        t -> {
          final double[] n = factorsAt.apply(t);
          return t * (n[2] - n[0]) - target;
        };
    // N_z - N_x < 1, so the root lies above the film limit; t (N_z - N_x) rises, then falls.
    double low = target * SCAN_FROM;
    double before = excess.applyAsDouble(low);
    for (double high = low * SCAN_STEP; high < 100 * target; high *= SCAN_STEP) {
      final double value = excess.applyAsDouble(high);
      if (value >= 0) {
        return OptionalDouble.of(bisect(excess, low, high));
      }
      if (value < before) {
        return OptionalDouble.empty();
      }
      low = high;
      before = value;
    }
    return OptionalDouble.empty();
  }

  private static double bisect(DoubleUnaryOperator function, double from, double to) {
    double low = from;
    double high = to;
    for (int i = 0; i < 60 && high - low > 1e-15 * high; i++) {
      final double middle = 0.5 * (low + high);
      if (function.applyAsDouble(middle) < 0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return 0.5 * (low + high);
  }
}
