package torqueloom.model.dynamics;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Brown's thermal field: white, with &lt;B_i(t) B_j(t')&gt; = 2 alpha k_B T/(gamma M_s V) delta_ij
 * delta(t - t') inside the Gilbert equation, read in the sense of Stratonovich. Source: W. F. Brown,
 * Phys. Rev. 130, 1677 (1963), from memory.
 */
public final class ThermalNoise {
  private ThermalNoise() {}

  /**
   * Standard deviation of one component, held over a step (T).
   *
   * @param damping alpha (1)
   * @param thermalField k_B T/(M_s V) (T)
   * @param step (s), &gt; 0
   */
  public static double deviation(double damping, double thermalField, double step) {
    return Math.sqrt(2 * damping * thermalField / (PhysicalConstants.GYROMAGNETIC_RATIO * step));
  }
}
