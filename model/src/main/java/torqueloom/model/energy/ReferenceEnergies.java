package torqueloom.model.energy;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Energies to hold an inference against. The digital figures are those of M. Horowitz, "Computing's
 * energy problem (and what we can do about it)", ISSCC 2014, doi:10.1109/ISSCC.2014.6757323, for 45
 * nm and 0.9 V (from memory): arithmetic only, without fetching the operands from memory, which costs
 * more.
 */
public final class ReferenceEnergies {
  /** 8-bit integer multiply (0.2 pJ) and add (0.03 pJ) (J). */
  public static final double MULTIPLY_ACCUMULATE_INT8 = 0.2e-12 + 0.03e-12;

  /** 32-bit floating multiply (3.7 pJ) and add (0.9 pJ) (J). */
  public static final double MULTIPLY_ACCUMULATE_FLOAT32 = 3.7e-12 + 0.9e-12;

  private ReferenceEnergies() {}

  /**
   * Least energy to erase one bit, k T ln 2 (R. Landauer, IBM J. Res. Dev. 5, 183 (1961), from
   * memory) (J); a count decision settles one bit.
   *
   * @param temperature (K)
   */
  public static double perDecision(double temperature) {
    return PhysicalConstants.BOLTZMANN * temperature * StrictMath.log(2);
  }
}
