package torqueloom.model.magnet;

import torqueloom.model.constants.PhysicalConstants;

/**
 * Small motion about an equilibrium whose two stiffness fields are B1 and B2: undamped frequency
 * gamma sqrt(B1 B2), and the exact roots with Gilbert damping.
 *
 * <p>Sources (from memory): C. Kittel, Phys. Rev. 73, 155 (1948); J. Smit, H. G. Beljers, Philips
 * Res. Rep. 10, 113 (1955). The damped roots solve
 * (1 + a²) L² + a gamma (B1 + B2) L + gamma² B1 B2 = 0, from the linearized equation of motion.
 */
public final class Resonance {
  private Resonance() {}

  /** Undamped frequency (Hz), NaN where the equilibrium is unstable; fields in tesla. */
  public static double frequency(double b1, double b2) {
    return PhysicalConstants.GYROMAGNETIC_RATIO * Math.sqrt(b1 * b2) / (2 * Math.PI);
  }

  /**
   * Kittel's stiffness fields of a body magnetized along x with an applied field along x.
   *
   * @param fields anisotropy fields of the three axes
   * @param applied field along x (T)
   * @return stiffness toward y and toward z (T)
   */
  public static double[] stiffnessAlongX(AxisFields fields, double applied) {
    return new double[] {applied + fields.y() - fields.x(), applied + fields.z() - fields.x()};
  }

  /**
   * Decay rate of the slowest mode (1/s), negative when the equilibrium is unstable.
   *
   * @param damping alpha (1), &gt; 0
   * @param b1 stiffness field (T)
   * @param b2 stiffness field (T)
   */
  public static double slowestDecayRate(double damping, double b1, double b2) {
    final double square = 1 + damping * damping;
    final double half = 0.5 * damping * (b1 + b2);
    final double discriminant = half * half - square * b1 * b2;
    final double gamma = PhysicalConstants.GYROMAGNETIC_RATIO;
    if (discriminant <= 0) {
      return gamma * half / square;
    }
    // The small root by the product of the roots, which does not cancel.
    final double large = half + Math.copySign(Math.sqrt(discriminant), half);
    final double product = b1 * b2;
    return gamma * Math.min(product / large, large / square);
  }

  /** Frequency of the damped motion (Hz), 0 when it creeps; arguments as above. */
  public static double dampedFrequency(double damping, double b1, double b2) {
    final double square = 1 + damping * damping;
    final double half = 0.5 * damping * (b1 + b2);
    final double discriminant = square * b1 * b2 - half * half;
    return discriminant <= 0
        ? 0
        : PhysicalConstants.GYROMAGNETIC_RATIO * Math.sqrt(discriminant) / square / (2 * Math.PI);
  }

  /** Full width at half maximum of the resonance line, 2 alpha omega/gamma (T); frequency in Hz. */
  public static double linewidth(double damping, double frequency) {
    return 2 * damping * 2 * Math.PI * frequency / PhysicalConstants.GYROMAGNETIC_RATIO;
  }
}
